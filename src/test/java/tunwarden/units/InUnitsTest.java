package tunwarden.units;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Quantities inside sentences; psi and °F by their definitions, 1 vol = 1.9768 g/L. */
class InUnitsTest {
  @Test
  void turnsEveryQuantityAndNothingElse() {
    assertEquals(
        "from 16.0 to 12.3 psi g in 20 min, 4 % of set, V12 at 75.2 °F",
        InUnits.of("from 1.10 to 0.85 bar g in 20 min, 4 % of set, V12 at 24 °C", Display.US));
    assertEquals("2.64 vol, -2.0 kPa", InUnits.of("5.22 g/L, -20 mbar", Display.SI));
    assertEquals(
        "0.98 g/L/h, 351 kg/h and 12.1 psi an hour",
        InUnits.of("0.98 g/L/h, 351 kg/h and 0.835 bar an hour", Display.US));
  }

  @Test
  void leavesTextInTheChosenUnitsAsItWasWritten() {
    assertEquals("0.06 bar left at 24 °C", InUnits.of("0.06 bar left at 24 °C", Display.METRIC));
    assertEquals("20 mbar off", InUnits.of("20 mbar off", Display.METRIC));
    assertEquals("9.1 psi at 75 °F", InUnits.of("9.1 psi at 75 °F", Display.US));
  }

  @Test
  void turnsBackWhatWasWrittenInOtherUnits() {
    assertEquals("0.63 bar g at 23.9 °C", InUnits.of("9.1 psi g at 75 °F", Display.METRIC));
    assertEquals("5.14 g/L", InUnits.of("2.60 vol", Display.METRIC));
  }

  @Test
  void aDifferenceIsNoReading() {
    assertEquals(
        "Warming by 9.0 °F to 86.0 °F leaves no headspace.",
        InUnits.of("Warming by 5.0 °C to 30.0 °C leaves no headspace.", Display.US));
    assertEquals("9.1 ± 0.4 psi above", InUnits.of("0.63 ± 0.03 bar above", Display.US));
    assertEquals("39.2 ± 0.9 °F", InUnits.of("4.0 ± 0.5 °C", Display.US));
    assertEquals(
        "±0.15 becomes about ±0.05 vol", InUnits.of("±0.30 becomes about ±0.10 g/L", Display.US));
  }

  @Test
  void aRateOfBarPerDegreeTurnsBothItsUnits() {
    assertEquals(
        "gains about 5.6 to 13.7 psi per °F",
        InUnits.of("gains about 0.7 to 1.7 bar per °C", Display.US));
    assertEquals(
        "gains about 70.0 to 170.0 kPa per °C",
        InUnits.of("gains about 0.7 to 1.7 bar per °C", Display.SI));
  }
}

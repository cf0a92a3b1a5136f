package tunwarden.units;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Conversion factors against their definitions. */
class UnitTest {
  /**
   * Pressure factors: bar, mbar, kPa, MPa by definition; psi = 0.45359237 kg × 9.80665 m/s² over
   * (0.0254 m)², all exact by the 1959 yard and pound agreement; atm exact (10th CGPM).
   */
  @ParameterizedTest
  @CsvSource({"PA,1", "BAR,1e5", "MBAR,100", "KPA,1000", "MPA,1e6", "ATM,101325"})
  void pressureUnitsFollowTheirDefinition(Unit unit, double pascal) {
    assertEquals(pascal, unit.toSi(1), 0);
  }

  @Test
  void thePsiFollowsFromThePoundAndTheInch() {
    assertEquals(0.45359237 * 9.80665 / (0.0254 * 0.0254), Unit.PSI.toSi(1), 1e-9);
  }

  /** Fixed points: ice point 0 °C = 32 °F = 273.15 K; 100 °C = 212 °F; −40 is the same on both. */
  @ParameterizedTest
  @CsvSource({"0,32,273.15", "100,212,373.15", "-40,-40,233.15"})
  void temperatureScalesMeetAtTheirFixedPoints(double celsius, double fahrenheit, double kelvin) {
    assertEquals(kelvin, Unit.CELSIUS.toSi(celsius), 1e-10);
    assertEquals(kelvin, Unit.FAHRENHEIT.toSi(fahrenheit), 1e-10);
    assertEquals(fahrenheit, Unit.FAHRENHEIT.fromSi(kelvin), 1e-10);
  }

  @ParameterizedTest
  @EnumSource(Unit.class)
  void thereAndBackIsTheSame(Unit unit) {
    for (double value : new double[] {-3.5, 0, 0.1, 1, 250}) {
      assertEquals(value, unit.fromSi(unit.toSi(value)), 1e-9);
      assertEquals(value, unit.differenceFromSi(unit.differenceToSi(value)), 1e-9);
    }
  }

  /** A difference of one degree Fahrenheit is 5/9 K, whatever the zero of the scale. */
  @Test
  void aDifferenceKnowsNoZero() {
    assertEquals(5.0 / 9, Unit.FAHRENHEIT.differenceToSi(1), 1e-15);
  }

  /**
   * One volume of CO2: real gas at 0 °C and 1 atm 1.9768 g/L, ideal 44.0095/22.414 = 1.9635 g/L
   * (reference solubility notes, computed from Span and Wagner 1996).
   */
  @Test
  void aVolumeOfCarbonationIsTheRealGas() {
    assertEquals(1.97681, Unit.VOLUMES.toSi(1), 5e-6);
    assertEquals(44.0095 / 22.414, Constants.CO2_IDEAL_VOLUME_KG_PER_M3, 5e-5);
  }
}

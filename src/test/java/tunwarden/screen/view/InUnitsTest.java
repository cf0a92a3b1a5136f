package tunwarden.screen.view;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import tunwarden.units.Display;

/** Quantities inside sentences; psi and °F by their definitions. */
class InUnitsTest {
  @Test
  void turnsEveryQuantityAndNothingElse() {
    assertEquals(
        "from 16.0 to 12.3 psi g in 20 min, 4 % of set, V12 at 75.2 °F",
        InUnits.of("from 1.10 to 0.85 bar g in 20 min, 4 % of set, V12 at 24 °C", Display.US));
    assertEquals("2.64 vol, -2.0 kPa", InUnits.of("5.22 g/L, -20 mbar", Display.SI));
  }

  @Test
  void leavesMetricTextAlone() {
    assertEquals("0.06 bar left", InUnits.of("0.06 bar left", Display.METRIC));
  }
}

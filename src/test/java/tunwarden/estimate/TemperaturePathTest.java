package tunwarden.estimate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class TemperaturePathTest {
  private static final double NOW_K = 278;
  private static final double KELVIN_PER_HOUR = 1.0 / 3600;

  @Test
  void whatHardlyMovesStays() {
    for (TemperaturePath path :
        TemperaturePath.all(NOW_K, 0.05 * KELVIN_PER_HOUR, OptionalDouble.of(297))) {
      assertEquals(NOW_K, path.at(86_400));
    }
  }

  /**
   * Newton's law: dT/dt = (ambient − T)/τ, so the path starts at the rate and ends at the ambient.
   */
  @Test
  void warmingTowardsAStatedAmbientFollowsNewtonsLaw() {
    TemperaturePath likely = TemperaturePath.all(NOW_K, KELVIN_PER_HOUR, OptionalDouble.of(298))[1];
    assertEquals(NOW_K + 60 * KELVIN_PER_HOUR, likely.at(60), 1e-4);
    assertEquals(298 - 20 * Math.exp(-1), likely.at(20 * 3600), 1e-9);
    assertEquals(298, likely.at(1e7), 1e-9);
  }

  @Test
  void thePathsBoundEachOtherWhetherItWarmsOrCools() {
    for (double rate : new double[] {1, -1}) {
      TemperaturePath[] paths =
          TemperaturePath.all(NOW_K, rate * KELVIN_PER_HOUR, OptionalDouble.empty());
      for (double hours = 0; hours <= 48; hours += 4) {
        double seconds = 3600 * hours;
        assertTrue(paths[0].at(seconds) <= paths[1].at(seconds) + 1e-9);
        assertTrue(paths[1].at(seconds) <= paths[2].at(seconds) + 1e-9);
      }
    }
  }

  @Test
  void anAmbientOnTheOtherSideIsNotTheRest() {
    TemperaturePath[] paths = TemperaturePath.all(NOW_K, -KELVIN_PER_HOUR, OptionalDouble.of(297));
    assertTrue(paths[1].at(86_400) < NOW_K);
  }
}

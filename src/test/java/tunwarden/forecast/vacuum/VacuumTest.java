package tunwarden.forecast.vacuum;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.units.Constants;

/** Validation against the vacuum figures of the reference notes, all computed there. */
class VacuumTest {
  private static final double ATMOSPHERE = Constants.STANDARD_ATMOSPHERE_PA;
  private static final double COLD_K = 20 + Constants.ZERO_CELSIUS_K;

  @ParameterizedTest
  @CsvSource({"60, 274", "80, 542", "90, 739", "100, 979"})
  void coolingSaturatedGasToTwentyDegrees(double hotC, double vacuumMbar) {
    double after = Vacuum.afterCooling(ATMOSPHERE, hotC + Constants.ZERO_CELSIUS_K, COLD_K);
    double allowed = hotC == 100 ? 12 : 1; // at 100 °C the last per cent of dry air decides
    assertEquals(vacuumMbar, (ATMOSPHERE - after) / 100, allowed);
  }

  @Test
  void causticThatBindsAQuarterOfPureCo2() {
    assertEquals(0.76e5, Vacuum.afterCaustic(ATMOSPHERE, 1, 0.25), 0.001e5);
  }

  @Test
  void causticThatBindsAllOfItLeavesNothing() {
    assertEquals(0, Vacuum.afterCaustic(ATMOSPHERE, 1, 1), 1e-9);
  }

  /** 1 m³ of CO2 at 20 °C and 1 atm is 1.839 kg and needs 3.34 kg NaOH (computed). */
  @Test
  void aCubicMetreOfCo2NeedsThreeAndAThirdKilogramsOfCausticSoda() {
    assertEquals(3.34, Vacuum.causticKg(1.839), 0.005);
  }

  /** Worked example E9: published as 0.19 and 0.39 MPa/K. */
  @ParameterizedTest
  @CsvSource({"100, 0.1933, 0.19", "10, 0.3867, 0.39"})
  void aFullVesselGainsBarsPerKelvin(double ratio, double recomputed, double published) {
    double rise = new LiquidFull(210e-6, 4e-4 / 1e6).risePaPerK(ratio) / 1e6;
    assertEquals(recomputed, rise, 5e-5);
    assertEquals(published, rise, 5e-3);
  }

  @Test
  void nearTheDensityMaximumWarmingLowersThePressure() {
    assertEquals(-1, Math.signum(new LiquidFull(0, 5e-10).risePaPerK(100)));
  }
}

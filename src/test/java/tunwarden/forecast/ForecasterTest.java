package tunwarden.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.estimate.Mode;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.Constants;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

class ForecasterTest {
  private static final double BAR = 1e5;
  private static final double COLD_K = 4 + Constants.ZERO_CELSIUS_K;
  private static final double WARM_K = 24 + Constants.ZERO_CELSIUS_K;

  private static Vessel tank(double fillM3) {
    Vessel plain = Vessel.plain("FV2", 2, fillM3, Liquid.of(LiquidKind.BEER));
    return new Vessel(
        plain.id(),
        plain.title(),
        plain.volumeM3(),
        fillM3,
        plain.contents(),
        plain.closure(),
        new Limits(
            Optional.of(ReliefSetting.stated(1.5 * BAR, 0.1 * BAR)),
            OptionalDouble.of(2 * BAR),
            OptionalDouble.of(0)),
        plain.orifice(),
        plain.site(),
        OptionalDouble.of(WARM_K),
        plain.accuracy(),
        plain.prospects());
  }

  private static Present believed(double bar, double dissolved, double u95, Mode mode) {
    return new Present(
        tank(1.8),
        Instant.parse("2026-03-02T08:00:00Z"),
        bar * BAR,
        COLD_K,
        COLD_K,
        Optional.of(new Uncertain(dissolved, u95)),
        Uncertain.exactly(0),
        new Present.Activity(mode, new Spread(1e-6, 5e-6, 2.5e-5), 0));
  }

  @Test
  void aVesselAtRestStaysWhereItIs() {
    Outlook outlook = Forecaster.outlook(Present.atRest(tank(1.8), 0.88 * BAR, COLD_K));
    Projection trend = outlook.projection(Scenario.TREND).orElseThrow();
    assertEquals(0.88 * BAR, trend.paGauge(), 5);
    assertTrue(trend.lowPaGauge() < 0.88 * BAR && trend.highPaGauge() > 0.88 * BAR);
    assertTrue(outlook.timeToLift().isEmpty());
  }

  @Test
  void warmingIsOrderedAroundTheLiftTemperature() {
    Outlook outlook = Forecaster.outlook(Present.atRest(tank(1.8), 0.5 * BAR, COLD_K));
    double liftK = outlook.liftTemperatureK().orElseThrow();
    World world = Ensemble.of(Present.atRest(tank(1.8), 0.5 * BAR, COLD_K)).middle();
    assertEquals(1.4 * BAR, world.restPaGauge(liftK), 0.002 * BAR);
    Projection warm = outlook.projection(Scenario.WARM).orElseThrow();
    assertEquals("warmed to 24 °C", warm.words());
    assertEquals(warm.paGauge() > 1.4 * BAR, liftK < WARM_K);
    assertTrue(warm.lowPaGauge() < warm.paGauge() && warm.paGauge() < warm.highPaGauge());
  }

  @Test
  void lostCoolingThatLiftsTheValveIsSaidGravely() {
    Outlook hot = Forecaster.outlook(Present.atRest(tank(1.8), 0.88 * BAR, COLD_K));
    assertTrue(
        hot.cautions().stream().anyMatch(c -> c.grave() && c.text().contains("24 °C")),
        hot.cautions().toString());
    Outlook safe = Forecaster.outlook(Present.atRest(tank(1.8), 0.05 * BAR, COLD_K));
    assertTrue(safe.cautions().stream().noneMatch(c -> c.text().contains("24 °C")));
  }

  @Test
  void chillingALowVesselBreaksTheVacuumLimit() {
    Present low = Present.atRest(tank(1.8), 0.02 * BAR, WARM_K);
    Outlook outlook = Forecaster.outlook(low);
    Projection chill = outlook.projection(Scenario.CHILL).orElseThrow();
    assertTrue(chill.paGauge() < 0);
    assertTrue(outlook.cautions().stream().anyMatch(c -> c.text().contains("vacuum limit")));
  }

  @Test
  void supersaturatedLiquidDrivesThePressureUpToTheValve() {
    World world = Ensemble.of(Present.atRest(tank(1.8), 1.8 * BAR, COLD_K)).middle();
    Outlook outlook = Forecaster.outlook(believed(0.5, world.dissolvedKgPerM3(), 0.2, Mode.SEALED));
    TimeRange time = outlook.timeToLift().orElseThrow();
    assertTrue(time.low().compareTo(time.middle()) < 0, time.toString());
    assertTrue(time.middle().compareTo(Duration.ofHours(48)) < 0);
    assertTrue(outlook.cautions().stream().anyMatch(c -> c.text().contains("foams")));
  }

  @Test
  void theTrendIsTheExactRelaxationOfTheLinearModel() {
    Present present = believed(0.5, 4.9, 0.2, Mode.SEALED);
    Ensemble ensemble = Ensemble.of(present);
    Spread rest = ensemble.range(w -> w.restPaGauge(COLD_K));
    double rate = 5e-6 * (1 + ensemble.middle().capacityRatio());
    double after8h = rest.middle() + (0.5 * BAR - rest.middle()) * Math.exp(-rate * 8 * 3600);
    Outlook outlook = Forecaster.outlook(present);
    assertEquals(after8h, outlook.projection(Scenario.TREND).orElseThrow().paGauge(), 1e-6 * BAR);
    assertEquals(97, outlook.trend().size());
  }

  @Test
  void heldPressureStaysAndTheLevelThatKeepsTheGasIsNamed() {
    Outlook outlook = Forecaster.outlook(believed(0.5, 3.0, 0.5, Mode.HELD));
    assertEquals(0.5 * BAR, outlook.projection(Scenario.TREND).orElseThrow().paGauge(), 1e-6);
    double hold = outlook.projection(Scenario.HOLD).orElseThrow().paGauge();
    World world = Ensemble.of(believed(0.5, 3.0, 0.5, Mode.HELD)).middle();
    assertEquals(3.0, world.equilibriumKgPerM3(hold + world.ambientPa()), 1e-6);
  }

  @Test
  void aNearlyFullVesselNamesTheTemperatureAtWhichItIsFull() {
    Vessel nearlyFull = tank(1.996);
    Present present = Present.atRest(nearlyFull, 0.5 * BAR, COLD_K);
    double fullK = Forecaster.outlook(present).liquidFullK().orElseThrow();
    World world = Ensemble.of(present).middle();
    assertTrue(world.isFullAt(fullK) && !world.isFullAt(fullK - 0.02));
    assertTrue(
        Forecaster.outlook(present).cautions().stream()
            .anyMatch(c -> c.text().contains("fills the vessel")));
    assertTrue(
        Forecaster.outlook(Present.atRest(tank(1.8), 0.5 * BAR, COLD_K)).liquidFullK().isEmpty());
  }

  @Test
  void aVesselThatWarmsFullSaysSoInsteadOfThousandsOfBar() {
    Present present = Present.atRest(tank(1.996), 0.5 * BAR, COLD_K);
    Projection warm = Forecaster.outlook(present).projection(Scenario.WARM).orElseThrow();
    assertEquals("warmed to 24 °C, full: over", warm.words());
    assertEquals(10 * BAR, warm.paGauge(), 1e-6);
    assertTrue(warm.highPaGauge() <= 10 * BAR + 1e-6);
  }

  @Test
  void nothingIsForecastForAnEmptyOrImpossibleVessel() {
    assertEquals(Outlook.NONE, Forecaster.outlook(Present.atRest(tank(1.8), -2 * BAR, COLD_K)));
    assertFalse(Forecaster.outlook(Present.atRest(tank(1.8), 0.1 * BAR, COLD_K)).trend().isEmpty());
  }

  @Test
  void aBetterKnownLiquidNarrowsAWiderKnownOneWidens() {
    double at =
        Ensemble.of(Present.atRest(tank(1.8), 0.88 * BAR, COLD_K)).middle().dissolvedKgPerM3();
    double lab = width(believed(0.88, at, 0.02, Mode.SEALED));
    double usual = width(believed(0.88, at, 0.15, Mode.SEALED));
    double poor = width(believed(0.88, at, 1.0, Mode.HELD));
    assertTrue(usual < poor, usual + " " + poor);
    assertTrue(lab < poor);
  }

  private static double width(Present present) {
    Spread warm = Ensemble.of(present).range(w -> w.restPaGauge(WARM_K));
    return warm.high() - warm.low();
  }
}

package tunwarden.forecast.seal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Present;
import tunwarden.forecast.World;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

class SealTest {
  private static final double BAR = 1e5;
  private static final double WARM_K = 291.15;
  private static final double COLD_K = 275.15;
  private static final Vessel TANK =
      Vessel.plain("FV", 2, 1.6, Liquid.of(LiquidKind.BEER))
          .withLimits(
              new Limits(
                  Optional.of(ReliefSetting.stated(2 * BAR, 0.1 * BAR)),
                  OptionalDouble.empty(),
                  OptionalDouble.empty()));

  private static Ensemble at(double bar) {
    return Ensemble.of(Present.atRest(TANK, bar * BAR, WARM_K));
  }

  private static SealQuestion from(double now, double end) {
    return new SealQuestion(
        now, end, OptionalDouble.of(12), FermentationRate.stated(2), Optional.empty());
  }

  /** Balance by hand: trade equation for the liquid, tabulated density for the headspace. */
  @Test
  void thePressureClosesTheBalance() {
    SealAnswer answer = Seal.of(at(0.5), from(4, 3));
    double perBar = 1.6 * 10 * Math.exp(-10.73797 + 2617.25 / WARM_K) + 0.4 * 1.84;
    double gain = 1.6 * answer.toComeKgPerM3().middle() / perBar;
    assertEquals((0.5 + gain) * BAR, answer.paGauge().middle(), 0.02 * gain * BAR);
    assertTrue(answer.paGauge().low() < answer.paGauge().middle());
  }

  @Test
  void aLotOfExtractLiftsTheValveAndALittleDoesNot() {
    SealAnswer much = Seal.of(at(0.5), from(6, 3));
    assertTrue(much.lifts().orElseThrow());
    assertTrue(much.cautions().stream().anyMatch(c -> c.grave()));
    SealAnswer little = Seal.of(at(0.5), from(3.2, 3));
    assertFalse(little.lifts().orElseThrow());
    assertTrue(little.untilLift().isEmpty());
  }

  @Test
  void timeToLiftIsTheGasItTakesOverTheRate() {
    SealAnswer answer = Seal.of(at(0.5), from(6, 3));
    World world = at(0.5).middle();
    double seconds = answer.untilLift().orElseThrow().middle().toSeconds();
    double made = seconds * FermentationRate.ofDrop(2);
    assertEquals(1.9 * BAR, world.restPaGauge(WARM_K, made), 0.001 * BAR);
    assertTrue(
        answer.untilLift().orElseThrow().low().toSeconds() < seconds,
        answer.untilLift().toString());
  }

  @Test
  void nothingLeftChangesNothing() {
    SealAnswer answer = Seal.of(at(0.5), from(3, 3));
    assertEquals(0.5 * BAR, answer.paGauge().middle(), 5);
    assertEquals(0, answer.toComeKgPerM3().middle(), 1e-12);
  }

  /** Fermented out at the level found, shut and cooled, the liquid holds what was wanted. */
  @Test
  void theHoldingLevelLandsOnTheCarbonationWanted() {
    Ensemble ensemble = at(0.2);
    Spread hold = Seal.hold(ensemble, new SealQuestion.Wanted(5.0, COLD_K));
    World rested = ensemble.middle().restedUnderCo2(hold.middle());
    assertEquals(5.0, rested.restDissolvedKgPerM3(COLD_K), 2e-3);
    assertTrue(hold.low() < hold.middle() && hold.middle() < hold.high());
  }

  @Test
  void heldAtTheSameTemperatureTheLevelIsPlainEquilibrium() {
    Spread hold = Seal.hold(at(0.2), new SealQuestion.Wanted(3.0, WARM_K));
    double perBar = 10 * Math.exp(-10.73797 + 2617.25 / WARM_K);
    assertEquals((3.0 / perBar - 1.01325) * BAR, hold.middle(), 0.005 * BAR);
  }

  @Test
  void tooLittleExtractForTheTargetIsSaid() {
    SealQuestion question =
        new SealQuestion(
            3.05,
            3,
            OptionalDouble.of(12),
            FermentationRate.UNKNOWN,
            Optional.of(new SealQuestion.Wanted(6, COLD_K)));
    SealAnswer answer = Seal.of(at(0.2), question);
    assertFalse(answer.reachesWanted().orElseThrow());
    assertTrue(answer.cautions().stream().anyMatch(c -> c.text().contains("extract left")));
  }

  @Test
  void exchangedGravitiesAreAnsweredInOneSentence() {
    assertTrue(from(3, 4).fault().orElseThrow().contains("above the present"));
    assertTrue(from(13, 4).fault().orElseThrow().contains("original"));
    assertTrue(from(4, 3).fault().isEmpty());
  }
}

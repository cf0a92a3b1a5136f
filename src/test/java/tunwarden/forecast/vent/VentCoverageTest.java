package tunwarden.forecast.vent;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Present;
import tunwarden.simulate.VentTrial;
import tunwarden.vessel.ReliefOrifice;

/**
 * Vessels simulated by other code, vented as forecast: the truth lies in the stated 95 % range.
 * Gauge, thermometer, fill, atmosphere and solubility are off by draws from their stated
 * uncertainties.
 */
class VentCoverageTest {
  private static final int TRIALS = 200;
  private static final double LEAST_COVERED = 0.95;

  @Test
  void vesselsVentedAsForecastLandWithinTheRange() {
    var trials = LongStream.range(0, TRIALS).mapToObj(VentTrial::run).toList();
    int once = 0;
    int rebound = 0;
    int held = 0;
    int seconds = 0;
    double reboundWidth = 0;
    for (VentTrial trial : trials) {
      VentAnswer answer = forecast(trial);
      once += holds(answer.once().kg(), trial.onceKg());
      rebound += holds(answer.reboundPaGauge(), trial.reboundPaGauge());
      held += holds(answer.followsKg(), trial.heldKg());
      seconds += holds(answer.blowdownS().orElseThrow(), trial.seconds());
      reboundWidth += answer.reboundPaGauge().high() - answer.reboundPaGauge().low();
    }
    String found =
        String.format(
            "of %d: at once %d, rebound %d (mean width %.0f Pa), held %d, time %d",
            TRIALS, once, rebound, reboundWidth / TRIALS, held, seconds);
    assertTrue(once >= LEAST_COVERED * TRIALS, found);
    assertTrue(rebound >= LEAST_COVERED * TRIALS, found);
    assertTrue(held >= LEAST_COVERED * TRIALS, found);
    assertTrue(seconds >= LEAST_COVERED * TRIALS, found);
  }

  private static VentAnswer forecast(VentTrial trial) {
    Present present = Present.atRest(trial.vessel(), trial.readPaGauge(), trial.readK());
    double diameter = Math.sqrt(4 * trial.areaM2() / Math.PI);
    return Vent.of(
        Ensemble.of(present),
        new VentQuestion(
            trial.toPaGauge(), Optional.of(new ReliefOrifice(diameter, 1)), Optional.empty(), 0.5));
  }

  private static int holds(Spread spread, double truth) {
    return truth >= spread.low() && truth <= spread.high() ? 1 : 0;
  }
}

package tunwarden.bench;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.time.Instant;
import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleFunction;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.ForwardPoint;
import tunwarden.estimate.State;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Forecaster;
import tunwarden.forecast.Hindsight;
import tunwarden.forecast.Present;
import tunwarden.forecast.whatif.Foresight;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.vessel.Vessel;

/**
 * The whole set of forecasts of one vessel of which everything is told, by processor time of the
 * thread, for a machine that is busy with other work: an estimator's state that has seen a day, the
 * temperature still (one forward run) or rising (three). Median and best of twelve rounds. A
 * program to run by hand.
 */
public final class ForecastCpuTime {
  private static final int CALLS = 100;
  private static final int ROUNDS = 12;
  private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  private ForecastCpuTime() {}

  /** Prints ms per call. */
  public static void main(String[] args) {
    for (double kelvinPerHour : new double[] {0, 0.4}) {
      Vessel vessel = ForecastBench.described();
      State state = watched(vessel, kelvinPerHour);
      Hindsight seen = ForecastBench.hindsight();
      String name = kelvinPerHour == 0 ? "still" : "warming";
      List<ForwardPoint> ahead = Forecaster.ahead(state);
      Present present = Present.of(vessel, state.estimate().orElseThrow());
      measure(name + ": forward run", i -> Forecaster.ahead(state).get(48).paGauge());
      measure(name + ": ensemble", i -> Ensemble.of(present).middle().paGauge());
      measure(
          name + ": trend and ladder",
          i -> Forecaster.outlook(Ensemble.of(present), ahead, seen.rise()).projections().size());
      measure(
          name + ": all but the run",
          i -> Foresight.outlook(present, ahead, seen).whatIfs().size());
      measure(
          name + ": the whole set", i -> Foresight.outlook(vessel, state, seen).whatIfs().size());
    }
  }

  private static State watched(Vessel vessel, double kelvinPerHour) {
    Estimator estimator = Estimators.standard();
    State state = estimator.begin(vessel);
    for (int s = 0; s < 86_400; s += 60) {
      Instant at = START.plusSeconds(s);
      double warmed = kelvinPerHour * Math.max(0, s - 18 * 3600) / 3600.0;
      double pa = 0.9e5 + 4_000 * warmed + 60 * Math.sin(s);
      state =
          estimator
              .step(state, Reading.good(at, vessel.id(), Quantity.TEMPERATURE, 277.15 + warmed))
              .next();
      state = estimator.step(state, Reading.good(at, vessel.id(), Quantity.PRESSURE, pa)).next();
    }
    return state;
  }

  private static void measure(String name, ToDoubleFunction<Integer> call) {
    double[] ms = new double[ROUNDS];
    double sum = 0;
    for (int round = 0; round < ROUNDS; round++) {
      long before = THREADS.getCurrentThreadCpuTime();
      for (int i = 0; i < CALLS; i++) {
        sum += call.applyAsDouble(i);
      }
      ms[round] = (THREADS.getCurrentThreadCpuTime() - before) / 1e6 / CALLS;
    }
    java.util.Arrays.sort(ms);
    System.out.printf(
        Locale.ROOT,
        "%-28s median %6.3f ms, best %6.3f ms  (%.6g)%n",
        name,
        ms[ROUNDS / 2],
        ms[0],
        sum);
  }
}

package tunwarden.estimate;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.simulate.Incident;
import tunwarden.simulate.Row;
import tunwarden.simulate.Simulation;

/** Figures of merit over simulated logs, each log counting the same. */
final class Score {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final double NEAR_S = 90;
  private static final Set<EventKind> FLOWS =
      Set.of(EventKind.VENT, EventKind.LIFT, EventKind.CHARGE, EventKind.LEAK, EventKind.SPIKE);

  private int logs;
  private double covered;
  private double error;
  private double plainError;
  private double halfWidth;
  private int found;
  private int missed;
  private int invented;
  private final List<Double> gasErrors = new ArrayList<>();

  /** Runs both estimators over one log. */
  void add(Simulation log) {
    Estimator estimator = new BankEstimator();
    Estimator plain = new PlainEstimator();
    State state = estimator.begin(log.vessel());
    State plainState = plain.begin(log.vessel());
    List<Event> events = new ArrayList<>();
    double[] sums = new double[5];
    for (Row row : log.rows()) {
      state = feed(estimator, state, row, log.laboratoryU95(), events);
      plainState = feed(plain, plainState, row, log.laboratoryU95(), new ArrayList<>());
      tally(sums, row, log, state.estimate().orElseThrow(), plainState.estimate().orElseThrow());
    }
    logs++;
    covered += sums[0] / log.rows().size();
    error += sums[1] / sums[4];
    plainError += sums[2] / sums[4];
    halfWidth += sums[3] / sums[4];
    match(log, events);
  }

  private static void tally(
      double[] sums, Row row, Simulation log, Estimate estimate, Estimate plain) {
    double truth = row.truth().dissolved();
    double off = Math.abs(estimate.dissolvedKgPerM3() - truth);
    sums[0] += off <= estimate.dissolvedU95KgPerM3() ? 1 : 0;
    if (row.seconds() >= log.judgedFrom()) {
      sums[1] += off / truth;
      sums[2] += Math.abs(plain.dissolvedKgPerM3() - truth) / truth;
      sums[3] += estimate.dissolvedU95KgPerM3() / truth;
      sums[4]++;
    }
  }

  static State feed(Estimator estimator, State from, Row row, double labU95, List<Event> events) {
    Instant at = START.plusMillis(Math.round(row.seconds() * 1000));
    State state = from;
    List<Reading> readings = new ArrayList<>();
    readings.add(Reading.good(at, "T1", Quantity.TEMPERATURE, row.kelvin()));
    if (!Double.isNaN(row.laboratory())) {
      readings.add(
          new Reading(at, "T1", Quantity.DISSOLVED, row.laboratory(), labU95, Quality.GOOD));
    }
    readings.add(Reading.good(at, "T1", Quantity.PRESSURE, row.paGauge()));
    for (Reading reading : readings) {
      Step step = estimator.step(state, reading);
      if (step.outcome() == Outcome.MODEL_FAILED) {
        throw new AssertionError(step.reason());
      }
      state = step.next();
      step.events().stream().filter(e -> !e.open()).forEach(events::add);
    }
    return state;
  }

  private void match(Simulation log, List<Event> events) {
    List<Event> left = new ArrayList<>(events);
    left.removeIf(e -> !FLOWS.contains(e.kind()));
    for (Incident incident : log.incidents()) {
      Event match = null;
      for (Event event : left) {
        double at = Duration.between(START, event.time()).toMillis() / 1000.0;
        boolean near = Math.abs(at - incident.from()) <= NEAR_S;
        if (match == null && near && event.kind().word().equals(incident.kind())) {
          match = event;
        }
      }
      if (match == null) {
        missed++;
      } else {
        found++;
        left.remove(match);
        gasErrors.add(Math.abs(match.gasKg() - incident.gasKg()) / Math.abs(incident.gasKg()));
      }
    }
    invented += left.size();
  }

  double coverage() {
    return covered / logs;
  }

  double error() {
    return error / logs;
  }

  double plainError() {
    return plainError / logs;
  }

  double halfWidth() {
    return halfWidth / logs;
  }

  /** F1 of the flow events; one where there was nothing to find and nothing was invented. */
  double f1() {
    return found + missed + invented == 0 ? 1 : 2.0 * found / (2.0 * found + missed + invented);
  }

  double medianGasError() {
    Collections.sort(gasErrors);
    return gasErrors.isEmpty() ? 0 : gasErrors.get(gasErrors.size() / 2);
  }

  /** As a row of the table in the developers' documentation. */
  String row(String name) {
    return String.format(
        Locale.ROOT,
        "| %s | %d | %.3f | %.2f %% | %.2f %% | %.2f | %.1f %% | %.3f (%d) | %.0f %% |",
        name.toLowerCase(Locale.ROOT),
        logs,
        coverage(),
        100 * error(),
        100 * plainError(),
        error() / plainError(),
        100 * halfWidth(),
        f1(),
        found + missed,
        100 * medianGasError());
  }
}

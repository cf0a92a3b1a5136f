package tunwarden.report;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.State;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.LogRow;
import tunwarden.report.analysis.Analyst;
import tunwarden.report.analysis.ReportRow;
import tunwarden.report.hindsight.Smoother;
import tunwarden.simulate.Row;
import tunwarden.simulate.Simulation;

/** Error and coverage of the look back over simulated logs, each log counting the same. */
final class SmootherScore {
  private static final Instant START = Instant.parse("2026-03-02T00:00:00Z");

  /** Sums over the rows of one log, or over logs. */
  private record Figures(double error, double running, double plain, double inside, double width) {}

  private final List<Figures> logs = new ArrayList<>();
  private int none;
  private final StringBuilder each = new StringBuilder();

  /** Reads one log forwards, then looks back. */
  void add(String name, Simulation simulation) {
    Analyst analyst = new Analyst(simulation.vessel(), Estimators.standard());
    Estimator plain = Estimators.plain();
    State plainState = plain.begin(simulation.vessel());
    List<ReportRow> forward = new ArrayList<>();
    List<Double> plainRead = new ArrayList<>();
    for (Row row : simulation.rows()) {
      LogRow read = logRow(row, simulation.vessel().id(), simulation.laboratoryU95());
      forward.add(analyst.take(read));
      for (var sample : read.samples()) {
        plainState = plain.step(plainState, sample).next();
      }
      plainRead.add(plainState.estimate().orElseThrow().dissolvedKgPerM3());
    }
    Optional<Smoother> smoother = Smoother.over(analyst.finish());
    none += smoother.isEmpty() ? 1 : 0;
    double[] sums = new double[5];
    int rows = 0;
    for (int i = 0; i < forward.size(); i++) {
      ReportRow running = forward.get(i);
      if (!Double.isNaN(running.dissolvedKgPerM3())) {
        ReportRow known = smoother.map(s -> s.smooth(running)).orElse(running);
        double truth = simulation.rows().get(i).truth().dissolved();
        double off = Math.abs(known.dissolvedKgPerM3() - truth);
        rows++;
        sums[0] += off;
        sums[1] += Math.abs(running.dissolvedKgPerM3() - truth);
        sums[2] += Math.abs(plainRead.get(i) - truth);
        sums[3] += off <= known.u95KgPerM3() ? 1 : 0;
        sums[4] += known.u95KgPerM3();
      }
    }
    Figures one =
        new Figures(sums[0] / rows, sums[1] / rows, sums[2] / rows, sums[3] / rows, sums[4] / rows);
    logs.add(one);
    each.append(line(name + (smoother.isEmpty() ? " (none)" : ""), one)).append('\n');
  }

  static LogRow logRow(Row row, String id, double laboratoryU95) {
    Instant time = START.plusMillis((long) (1000 * row.seconds()));
    List<Sample> samples = new ArrayList<>();
    samples.add(Reading.good(time, id, Quantity.TEMPERATURE, row.kelvin()));
    if (!Double.isNaN(row.laboratory())) {
      double value = row.laboratory();
      samples.add(new Reading(time, id, Quantity.DISSOLVED, value, laboratoryU95, Quality.GOOD));
    }
    samples.add(Reading.good(time, id, Quantity.PRESSURE, row.paGauge()));
    return new LogRow(0, time, id, samples);
  }

  /** Mean error over the plain reading's. */
  double ratio() {
    return mean().error() / mean().plain();
  }

  /** Logs without a look back. */
  int none() {
    return none;
  }

  /** Share of rows inside the interval. */
  double coverage() {
    return mean().inside();
  }

  private Figures mean() {
    double[] sums = new double[5];
    for (Figures one : logs) {
      sums[0] += one.error();
      sums[1] += one.running();
      sums[2] += one.plain();
      sums[3] += one.inside();
      sums[4] += one.width();
    }
    int n = logs.size();
    return new Figures(sums[0] / n, sums[1] / n, sums[2] / n, sums[3] / n, sums[4] / n);
  }

  /** A line for every log. */
  String each() {
    return each.toString();
  }

  /** As a row of the table in the pages on reports. */
  String row(String name) {
    return line(name, mean());
  }

  private static String line(String name, Figures f) {
    return String.format(
        Locale.ROOT,
        "| %s | %.3f | %.3f | %.3f | %.2f | %.3f | %.3f |",
        name,
        f.error(),
        f.running(),
        f.plain(),
        f.error() / f.plain(),
        f.inside(),
        f.width());
  }
}

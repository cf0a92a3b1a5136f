package tunwarden.report;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimators;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.replay.LogRow;
import tunwarden.report.analysis.Analyst;
import tunwarden.report.analysis.ReportRow;
import tunwarden.report.analysis.Smoother;
import tunwarden.simulate.Row;
import tunwarden.simulate.Scenario;
import tunwarden.simulate.Simulation;

/** Held on a supply or held open for days, then shut: what the liquid held is known afterwards. */
class SmootherTest {
  private static final Instant START = Instant.parse("2026-03-02T00:00:00Z");
  private static final double SPACING_S = 120;

  private double error;
  private double plainError;
  private long inside;
  private long rows;

  @Test
  void theBackwardLookHalvesTheErrorOnAFewLogs() {
    judge(2);
  }

  @Test
  @Tag("long")
  void theBackwardLookHalvesTheErrorOnManyLogs() {
    judge(20);
  }

  private void judge(int seeds) {
    for (long seed = 1; seed <= seeds; seed++) {
      read(Scenario.SUPPLY.run(seed));
      read(Scenario.OPENED.run(seed));
    }
    String figures =
        "error "
            + error / rows
            + ", plain "
            + plainError / rows
            + ", inside "
            + inside / (double) rows;
    assertTrue(error <= 0.5 * plainError, figures);
    assertTrue(inside >= 0.90 * rows, figures);
  }

  private void read(Simulation simulation) {
    Analyst analyst = new Analyst(simulation.vessel(), Estimators.standard());
    List<Row> used = new ArrayList<>();
    List<ReportRow> forward = new ArrayList<>();
    double next = 0;
    for (Row row : simulation.rows()) {
      if (row.seconds() >= next) {
        next = row.seconds() + SPACING_S;
        used.add(row);
        forward.add(analyst.take(logRow(row, simulation.vessel().id())));
      }
    }
    Optional<Smoother> smoother = Smoother.over(analyst.finish());
    for (int i = 0; i < used.size(); i++) {
      ReportRow running = forward.get(i);
      if (!Double.isNaN(running.dissolvedKgPerM3())) {
        ReportRow known = smoother.map(s -> s.smooth(running)).orElse(running);
        compare(used.get(i).truth(), known);
      }
    }
  }

  private static LogRow logRow(Row row, String id) {
    Instant time = START.plusMillis((long) (1000 * row.seconds()));
    return new LogRow(
        0,
        time,
        id,
        List.of(
            Reading.good(time, id, Quantity.TEMPERATURE, row.kelvin()),
            Reading.good(time, id, Quantity.PRESSURE, row.paGauge())));
  }

  private void compare(Row.Truth truth, ReportRow known) {
    double off = Math.abs(known.dissolvedKgPerM3() - truth.dissolved());
    rows++;
    error += off;
    inside += off <= known.u95KgPerM3() ? 1 : 0;
    plainError += Math.abs(truth.equilibrium() - truth.dissolved());
  }
}

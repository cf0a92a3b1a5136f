package tunwarden.estimate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.Test;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.simulate.Row;
import tunwarden.simulate.Scenario;
import tunwarden.simulate.Simulation;

class ForwardRunTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  @Test
  void theReboundAfterAVentIsForeseenWithinItsBand() {
    int inside = 0;
    int seeds = 5;
    for (int seed = 1; seed <= seeds; seed++) {
      Simulation log = Scenario.VENTED.run(seed);
      Estimator estimator = new BankEstimator();
      State state = estimator.begin(log.vessel());
      double cut = log.incidents().get(0).until() + 3 * 3600;
      List<ForwardPoint> ahead = List.of();
      double last = 0;
      for (Row row : log.rows()) {
        Instant at = START.plusMillis(Math.round(row.seconds() * 1000));
        if (row.seconds() > cut) {
          last = row.seconds();
          continue;
        }
        state = feed(estimator, state, at, row);
      }
      ahead = ForwardRun.run(state, Duration.ofHours(6), Duration.ofMinutes(30));
      assertEquals(13, ahead.size());
      Row then = at(log, cut + 6 * 3600);
      ForwardPoint end = ahead.get(12);
      assertTrue(end.lowPaGauge() <= end.paGauge() && end.paGauge() <= end.highPaGauge());
      double slack = 1500;
      if (then.paGauge() > end.lowPaGauge() - slack && then.paGauge() < end.highPaGauge() + slack) {
        inside++;
      }
      assertTrue(last > cut);
    }
    assertTrue(inside >= seeds - 1, inside + " of " + seeds);
  }

  private static State feed(Estimator estimator, State state, Instant at, Row row) {
    State warm =
        estimator.step(state, Reading.good(at, "T1", Quantity.TEMPERATURE, row.kelvin())).next();
    return estimator.step(warm, Reading.good(at, "T1", Quantity.PRESSURE, row.paGauge())).next();
  }

  private static Row at(Simulation log, double seconds) {
    for (Row row : log.rows()) {
      if (row.seconds() >= seconds) {
        return row;
      }
    }
    return log.rows().get(log.rows().size() - 1);
  }
}

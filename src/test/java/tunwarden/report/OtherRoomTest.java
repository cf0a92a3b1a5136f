package tunwarden.report;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimators;
import tunwarden.report.analysis.Analyst;
import tunwarden.report.hindsight.OtherRoom;
import tunwarden.simulate.Row;
import tunwarden.simulate.Scenario;
import tunwarden.simulate.Simulation;
import tunwarden.vessel.Vessel;

/** A vessel stated emptier than it is, and what can be told of it. */
class OtherRoomTest {
  @Test
  void aVesselStatedTooEmptyIsNoticedWhenItWasWarmedOrVented() {
    int noticed = 0;
    for (long seed = 400; seed < 404; seed++) {
      noticed += share(Scenario.SETTLED.run(seed, 120), 0.6).orElse(1) < 0.7 ? 1 : 0;
      noticed += share(Scenario.OPENED.run(seed, 120), 0.6).orElse(1) < 0.7 ? 1 : 0;
    }
    assertTrue(noticed >= 4, noticed + " of 8");
  }

  @Test
  void theRightSizeIsSeldomDoubted() {
    int doubted = 0;
    for (long seed = 400; seed < 404; seed++) {
      doubted += share(Scenario.SETTLED.run(seed, 120), 0).isPresent() ? 1 : 0;
      doubted += share(Scenario.OPENED.run(seed, 120), 0).isPresent() ? 1 : 0;
    }
    assertTrue(doubted <= 1, doubted + " of 8");
  }

  private static OptionalDouble share(Simulation simulation, double filled) {
    Vessel right = simulation.vessel();
    Vessel stated = filled == 0 ? right : filled(right, filled * right.volumeM3());
    Analyst analyst = new Analyst(stated, Estimators.standard());
    for (Row row : simulation.rows()) {
      analyst.take(SmootherScore.logRow(row, stated.id(), simulation.laboratoryU95()));
    }
    return OtherRoom.share(analyst.finish());
  }

  private static Vessel filled(Vessel right, double fillM3) {
    return new Vessel(
        right.id(),
        right.title(),
        right.volumeM3(),
        fillM3,
        right.contents(),
        right.closure(),
        right.limits(),
        right.orifice(),
        right.site(),
        right.warmToK(),
        right.accuracy(),
        right.prospects());
  }
}

package tunwarden.report;

import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Events over many drawn days: found within 90 s of the truth, with the gas they moved. */
class IncidentDaysTest {
  @Test
  void eventsAreFoundOnAFewDays() {
    DayScore score = new DayScore();
    for (long seed = 1; seed <= 3; seed++) {
      score.add(new IncidentDay(seed).run());
    }
    judge(score);
  }

  @Test
  void eventsAreFoundOnAFewRoughDays() {
    DayScore score = new DayScore();
    for (long seed = 3000; seed < 3010; seed++) {
      score.add(new RoughDay(seed).run());
    }
    judge(score, 0.92); // ten days hold few events: the long run demands more
  }

  @Test
  @Tag("long")
  void eventsAreFoundOnManyRoughDays() {
    DayScore score = new DayScore();
    for (long seed = 3000; seed < 3040; seed++) {
      score.add(new RoughDay(seed).run());
    }
    judge(score);
  }

  @Test
  @Tag("long")
  void eventsAreFoundOnManyDays() {
    DayScore score = new DayScore();
    for (long seed = 1; seed <= 60; seed++) {
      score.add(new IncidentDay(seed).run());
    }
    judge(score);
  }

  private static void judge(DayScore score) {
    judge(score, 0.95);
  }

  private static void judge(DayScore score, double least) {
    assertTrue(score.f1() >= least, score.table() + score.faults(12));
    assertTrue(score.medianGasError() <= 0.15, score.table());
  }
}

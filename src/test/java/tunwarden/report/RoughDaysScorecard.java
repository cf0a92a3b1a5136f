package tunwarden.report;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Prints the table of {@code report.md} on events: {@code mvn -o -q test -Plong
 * -Dtest=RoughDaysScorecard -Dseeds=40}.
 */
class RoughDaysScorecard {
  @Test
  @Tag("long")
  void printTheTable() {
    long first = Long.getLong("first", 2000);
    int seeds = Integer.getInteger("seeds", 40);
    DayScore score = new DayScore();
    for (long seed = first; seed < first + seeds; seed++) {
      score.add(new RoughDay(seed).run());
    }
    System.out.print(score.table());
    System.out.print(score.faults(Integer.getInteger("faults", 0)));
  }
}

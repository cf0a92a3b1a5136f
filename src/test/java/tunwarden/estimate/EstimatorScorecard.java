package tunwarden.estimate;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import tunwarden.simulate.Scenario;

/**
 * Prints the table of {@code estimator.md}: {@code mvn -o -q test -Plong -Dtest=EstimatorScorecard
 * -Dseeds=20}.
 */
class EstimatorScorecard {
  @Test
  @Tag("long")
  void printTheTable() {
    int seeds = Integer.getInteger("seeds", 20);
    long first = Long.getLong("first", 5000);
    double interval = Integer.getInteger("interval", 10);
    System.out.println(
        "| situation | logs | coverage | error | plain | ratio | half-width | F1 (events) | gas |");
    System.out.println("| --- | --- | --- | --- | --- | --- | --- | --- | --- |");
    for (Scenario scenario : Scenario.values()) {
      Score score = new Score();
      for (long seed = first; seed < first + seeds; seed++) {
        score.add(scenario.run(seed, interval));
      }
      System.out.println(score.row(scenario.name()));
    }
  }
}

package tunwarden.report;

import java.util.Locale;
import java.util.function.LongFunction;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import tunwarden.simulate.Hold;
import tunwarden.simulate.Scenario;
import tunwarden.simulate.Simulation;

/**
 * Prints the table of {@code report.md} on the look back: {@code mvn -o -q test -Plong
 * -Dtest=SmootherScorecard -Dseeds=20 -Dinterval=60}.
 */
class SmootherScorecard {
  private final int seeds = Integer.getInteger("seeds", 20);
  private final long first = Long.getLong("first", 2000);
  private final double interval = Integer.getInteger("interval", 60);

  @Test
  @Tag("long")
  void vesselsHeldForDaysAndThenShut() {
    head();
    for (Hold hold : Hold.values()) {
      print(hold.name(), seed -> hold.run(seed, interval));
    }
  }

  @Test
  @Tag("long")
  void otherVessels() {
    head();
    for (Scenario scenario : Scenario.values()) {
      print(scenario.name(), seed -> scenario.run(seed, interval));
    }
  }

  private static void head() {
    System.out.println("| held | error, g/L | running | plain | ratio | coverage | half-width |");
    System.out.println("| --- | --- | --- | --- | --- | --- | --- |");
  }

  private void print(String name, LongFunction<Simulation> logs) {
    if (!System.getProperty("only", name).contains(name)) {
      return;
    }
    SmootherScore score = new SmootherScore();
    for (long seed = first; seed < first + seeds; seed++) {
      score.add(name + " " + seed, logs.apply(seed));
    }
    System.out.print(Boolean.getBoolean("each") ? score.each() : "");
    System.out.println(score.row(name.toLowerCase(Locale.ROOT)));
  }
}

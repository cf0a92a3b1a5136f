package tunwarden.report;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import tunwarden.simulate.Hold;
import tunwarden.simulate.Scenario;

/** Held on a supply or held open for days, then shut: what the liquid held is known afterwards. */
class SmootherTest {
  @Test
  void theBackwardLookHalvesTheErrorOnAFewLogs() {
    SmootherScore score = new SmootherScore();
    for (long seed = 1; seed <= 2; seed++) {
      score.add("supply " + seed, Hold.SUPPLY.run(seed, 300));
      score.add("opened " + seed, Hold.OPENED.run(seed, 300));
      score.add("keg " + seed, Hold.KEG.run(seed, 300));
    }
    judge(score);
  }

  @Test
  @Tag("long")
  void theBackwardLookHalvesTheErrorOnManyLogs() {
    for (Hold hold : List.of(Hold.SUPPLY, Hold.OPENED, Hold.STEPPED, Hold.SEVERAL, Hold.KEG)) {
      SmootherScore score = new SmootherScore();
      for (long seed = 5000; seed < 5020; seed++) {
        score.add(hold + " " + seed, hold.run(seed, 60));
      }
      judge(score);
    }
  }

  /** Where much air or a ferment explains the log better, nothing is looked back on. */
  @Test
  void airAndFermentationAreLeftToTheRunningEstimate() {
    SmootherScore score = new SmootherScore();
    score.add("unpurged", Scenario.UNPURGED.run(3, 300));
    score.add("fermenting", Scenario.FERMENTING.run(3, 300));
    assertTrue(score.none() == 2, score.each());
  }

  private static void judge(SmootherScore score) {
    assertTrue(score.ratio() <= 0.5 && score.coverage() >= 0.90, score.each());
  }
}

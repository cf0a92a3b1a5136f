package tunwarden.estimate;

import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.simulate.Scenario;

/**
 * The scorecard's figures on the first logs of its table, thinned to a row a minute so that the
 * build stays quick; the full table comes from {@link EstimatorScorecard}. A few logs scatter, so
 * coverage is held to a little less than the long run reaches.
 */
class EstimatorFiguresTest {
  private static final long FIRST = 5000;
  private static final int SEEDS = 3;
  private static final double INTERVAL_S = 60;
  private static final double LEAST_COVERAGE = 0.85;
  private static final double GOOD_ENOUGH = 0.02;

  /** Situation and the most its error may be, as a multiple of the plain reading's. */
  @ParameterizedTest
  @CsvSource({
    "SETTLED, 1.0",
    "VENTED, 1.0",
    "SUPPLY, 1.0",
    "FERMENTING, 0.7",
    "UNPURGED, 0.35",
    "OPENED, 1.0",
    "KEG, 1.0",
    "LABORATORY, 1.0"
  })
  void theIntervalCoversAndTheErrorIsNoWorseThanThePlainReadings(
      Scenario scenario, double mostRatio) {
    Score score = new Score();
    for (long seed = FIRST; seed < FIRST + SEEDS; seed++) {
      score.add(scenario.run(seed, INTERVAL_S));
    }
    assertTrue(score.coverage() >= LEAST_COVERAGE, score.row(scenario.name()));
    boolean close = score.error() <= GOOD_ENOUGH;
    boolean better = score.error() <= mostRatio * score.plainError();
    assertTrue(close || better, score.row(scenario.name()));
  }
}

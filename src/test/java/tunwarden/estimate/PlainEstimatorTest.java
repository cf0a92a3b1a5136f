package tunwarden.estimate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import org.junit.jupiter.api.Test;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.vessel.Vessel;

class PlainEstimatorTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  private final Estimator estimator = new PlainEstimator();
  private State state = estimator.begin(Vessel.plain("T1", 2, 1.8, Liquid.of(LiquidKind.BEER)));

  private Step feed(int second, Quantity quantity, double value) {
    Step step =
        estimator.step(state, Reading.good(START.plusSeconds(second), "T1", quantity, value));
    state = step.next();
    return step;
  }

  @Test
  void theEuropeanEquationComesBack() {
    assertEquals(Outcome.WAITING, feed(0, Quantity.TEMPERATURE, 277.15).outcome());
    assertEquals(Outcome.ACCEPTED, feed(0, Quantity.PRESSURE, 1e5).outcome());
    Estimate estimate = state.estimate().orElseThrow();
    double european = 10 * 2.01325 * Math.exp(-10.73797 + 2617.25 / 277.15);
    assertEquals(european, estimate.dissolvedKgPerM3(), 0.005 * european);
    assertTrue(estimate.dissolvedU95KgPerM3() > 0.02 * european);
  }

  @Test
  void badReadingsChangeNothingThatIsBelieved() {
    feed(0, Quantity.TEMPERATURE, 277.15);
    feed(0, Quantity.PRESSURE, 1e5);
    Estimate before = state.estimate().orElseThrow();
    assertEquals(Quality.OUT_OF_RANGE, feed(1, Quantity.PRESSURE, 90e5).quality());
    assertEquals(Quality.OUT_OF_ORDER, feed(-5, Quantity.PRESSURE, 1e5).quality());
    assertEquals(Quality.OUT_OF_ORDER, feed(0, Quantity.PRESSURE, 1e5).quality());
    assertEquals(Quality.TOO_FAST, feed(1, Quantity.PRESSURE, 9e5).quality());
    assertSame(before, state.estimate().orElseThrow());
  }
}

package tunwarden.estimate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import org.junit.jupiter.api.Test;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Vessel;

class BankEstimatorTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  private final Estimator estimator = new BankEstimator();
  private final Vessel vessel =
      Vessel.plain("T1", 2, 1.8, Liquid.of(LiquidKind.BEER)).withClosure(Closure.SEALED);
  private State state = estimator.begin(vessel);

  private Step feed(double second, Quantity quantity, double value) {
    Instant time = START.plusMillis(Math.round(second * 1000));
    Step step = estimator.step(state, Reading.good(time, "T1", quantity, value));
    state = step.next();
    return step;
  }

  private void row(double second, double paGauge, double kelvin) {
    feed(second, Quantity.TEMPERATURE, kelvin);
    feed(second, Quantity.PRESSURE, paGauge);
  }

  @Test
  void aSealedVesselAtRestReadsAsThePlainRelationSays() {
    for (int i = 0; i < 3600; i += 10) {
      row(i, 1e5 + 20 * (i % 3), 277.15);
    }
    double european = 10 * 2.01325 * Math.exp(-10.73797 + 2617.25 / 277.15);
    Estimate estimate = state.estimate().orElseThrow();
    assertEquals(european, estimate.dissolvedKgPerM3(), 0.01 * european);
    assertTrue(estimate.dissolvedU95KgPerM3() < 0.07 * european);
    assertEquals(Mode.SEALED, estimate.mode());
  }

  @Test
  void aStepThatThrowsLeavesTheStateThatWasThere() {
    row(0, 1e5, 277.15);
    row(10, 1e5, 277.15);
    BankState broken =
        new BankState(
            null,
            ((BankState) state).senses(),
            ((BankState) state).front(),
            ((BankState) state).bank(),
            Watch.NEW,
            EventBook.EMPTY,
            state.estimate());
    Step step =
        estimator.step(broken, Reading.good(START.plusSeconds(20), "T1", Quantity.PRESSURE, 1e5));
    assertEquals(Outcome.MODEL_FAILED, step.outcome());
    assertSame(broken, step.next());
  }

  @Test
  void theSameLogGivesTheSameBelief() {
    State[] ends = new State[2];
    for (int round = 0; round < 2; round++) {
      state = estimator.begin(vessel);
      for (int i = 0; i < 2000; i += 10) {
        row(i, 1e5 + 130 * Math.sin(i), 277.15 + 1e-4 * i);
      }
      ends[round] = state;
    }
    assertEquals(ends[0].estimate(), ends[1].estimate());
  }

  @Test
  void oneOddReadingIsASpikeAndAFallThatStaysIsAVent() {
    for (int i = 0; i < 600; i += 10) {
      row(i, 1e5 + 20 * (i % 3), 277.15);
    }
    feed(600, Quantity.PRESSURE, 1.3e5);
    Step back = feed(610, Quantity.PRESSURE, 1e5);
    assertEquals(EventKind.SPIKE, back.events().get(0).kind());
    feed(620, Quantity.PRESSURE, 0.6e5);
    for (int i = 630; i < 700; i += 10) {
      Step step = feed(i, Quantity.PRESSURE, 0.5e5 + 20 * (i % 3));
      if (!step.events().isEmpty()) {
        Event vent = step.events().get(0);
        assertEquals(EventKind.VENT, vent.kind());
        assertTrue(vent.gasKg() > 0.1 && vent.gasKg() < 0.4, vent.toString());
        return;
      }
    }
    throw new AssertionError("no vent was found");
  }
}

package tunwarden.estimate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Vessel;

/** The slow watches: each is shown a course that only it can name. */
class WatchesTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final double KELVIN = 277.15;

  private final Estimator estimator = new BankEstimator();
  private final Random random = new Random(7);
  private final List<Event> events = new ArrayList<>();
  private State state = estimator.begin(vessel(Closure.SEALED));

  private static Vessel vessel(Closure closure) {
    return Vessel.plain("T1", 2, 1.8, Liquid.of(LiquidKind.WATER)).withClosure(closure);
  }

  private void feed(double second, Quantity quantity, double value, Quality quality) {
    Instant time = START.plusMillis(Math.round(second * 1000));
    Step step = estimator.step(state, new Reading(time, "T1", quantity, value, 0, quality));
    state = step.next();
    events.addAll(step.events());
  }

  private void row(double second, double paGauge, double kelvin) {
    feed(second, Quantity.TEMPERATURE, kelvin + 0.02 * random.nextGaussian(), Quality.GOOD);
    feed(second, Quantity.PRESSURE, paGauge + 60 * random.nextGaussian(), Quality.GOOD);
  }

  private Event first(EventKind kind) {
    return events.stream()
        .filter(e -> e.kind() == kind)
        .findFirst()
        .orElseThrow(() -> new AssertionError("no " + kind + " in " + events));
  }

  @Test
  void aSteadyFallOfAClosedVesselIsALeakWithItsSize() {
    for (int i = 0; i < 8 * 60; i++) {
      row(60 * i, 1e5 - 60e2 * Math.max(0, i / 60.0 - 2), KELVIN);
    }
    Event leak = first(EventKind.LEAK);
    assertTrue(leak.open() && leak.gasKg() > 0 && leak.confidence() >= 0.9, leak.toString());
  }

  @Test
  void aPressureThatNoDissolvedGasExplainsIsSaid() {
    for (int i = 0; i < 8 * 60; i++) {
      double swing = i < 60 ? 0 : 4e3 * Math.sin((i - 60) / 15.0);
      row(60 * i, 1e5 + swing, KELVIN);
    }
    Event odd = first(EventKind.UNEXPLAINED);
    assertTrue(odd.why().contains("no dissolved gas"), odd.why());
  }

  @Test
  void warmingAndThenLostCoolingAreTold() {
    for (int i = 0; i < 10 * 60; i++) {
      double warmed = 0.6 * i / 60.0;
      row(60 * i, 1e5 + 4_500 * warmed, KELVIN + warmed);
    }
    assertTrue(first(EventKind.WARMING).time().isBefore(first(EventKind.COOLING_FAILURE).until()));
  }

  @Test
  void twoSensorsThatDifferAreOneEventUntilTheyAgreeAgain() {
    for (int i = 0; i < 40; i++) {
      feed(10 * i, Quantity.TEMPERATURE, KELVIN, Quality.GOOD);
      Quality quality = i >= 20 && i < 30 ? Quality.DISAGREES : Quality.GOOD;
      feed(10 * i, Quantity.PRESSURE, 1e5 + 50 * (i % 3), quality);
    }
    List<Event> drifts = events.stream().filter(e -> e.kind() == EventKind.DRIFT).toList();
    assertEquals(2, drifts.size(), drifts.toString());
    assertEquals(START.plusSeconds(200), drifts.get(1).time());
    assertEquals(START.plusSeconds(300), drifts.get(1).until());
    assertFalse(drifts.get(1).open());
  }

  @Test
  void aPressureHeldFromOutsideIsSaidToTellNothingAndAnExperimentIsProposed() {
    state = estimator.begin(vessel(Closure.SUPPLY));
    for (int i = 0; i < 120; i++) {
      row(60 * i, 1e5, KELVIN);
    }
    Estimate estimate = state.estimate().orElseThrow();
    assertEquals(Mode.HELD, estimate.mode());
    assertTrue(estimate.ignorance().contains("carries no news of the liquid"));
    assertTrue(estimate.ignorance().matches(".*±\\S+ becomes about ±\\S+ g/L\\."));
  }

  @Test
  void whateverAStateHoldsAStepLeavesItAsItWasWhenItFails() {
    row(0, 1e5, KELVIN);
    row(60, 1e5, KELVIN);
    BankState good = (BankState) state;
    List<BankState> broken =
        List.of(
            new BankState(
                null,
                good.senses(),
                good.front(),
                good.bank(),
                good.watch(),
                good.book(),
                good.estimate()),
            new BankState(
                good.medium(),
                good.senses(),
                null,
                good.bank(),
                good.watch(),
                good.book(),
                good.estimate()),
            new BankState(
                good.medium(),
                good.senses(),
                good.front(),
                good.bank(),
                null,
                good.book(),
                good.estimate()),
            new BankState(
                good.medium(),
                good.senses(),
                good.front(),
                good.bank(),
                good.watch(),
                null,
                good.estimate()));
    for (BankState bad : broken) {
      Reading reading = Reading.good(START.plusSeconds(120), "T1", Quantity.PRESSURE, 1e5);
      Step step = estimator.step(bad, reading);
      assertEquals(Outcome.MODEL_FAILED, step.outcome());
      assertSame(bad, step.next());
    }
  }
}

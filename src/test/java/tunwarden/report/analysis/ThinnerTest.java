package tunwarden.report.analysis;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.State;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.vessel.Vessel;

/** The estimator is stepped seldom while nothing happens, and at once when something does. */
class ThinnerTest {
  private static final double TELLING_PA = 350;
  private static final Vessel VESSEL = Vessel.plain("T", 2.0, 1.8, Liquid.of(LiquidKind.BEER));

  private static Reading pressure(long second, double pa) {
    return Reading.good(Instant.ofEpochSecond(second), "T", Quantity.PRESSURE, pa);
  }

  private static Reading temperature(long second, double kelvin) {
    return Reading.good(Instant.ofEpochSecond(second), "T", Quantity.TEMPERATURE, kelvin);
  }

  private final Estimator estimator = Estimators.wordless();
  private final Thinner thinner = new Thinner();
  private final List<Reading> pressures = new ArrayList<>();
  private State state = estimator.begin(VESSEL);

  private void row(long second, double pa) {
    thinner.beside(temperature(second, 277.15));
    thinner.pressure(pressure(second, pa), TELLING_PA);
    follow();
  }

  private void follow() {
    for (Reading reading : thinner.take()) {
      state = estimator.step(state, reading).next();
      if (reading.quantity() == Quantity.PRESSURE) {
        pressures.add(reading);
      }
    }
  }

  private void finish() {
    thinner.flush();
    follow();
  }

  @Test
  void calmSecondsBecomeMinutes() {
    Random random = new Random(5);
    for (int t = 0; t < 6 * 3600; t++) {
      row(t, 1e5 + 60 * random.nextGaussian());
    }
    finish();
    int steps = pressures.size();
    assertTrue(steps >= 180 && steps < 400, "steps " + steps);
    pressures.stream().skip(20).forEach(mean -> assertEquals(1e5, mean.value(), 60));
  }

  @Test
  void aFallIsPassedOnRowByRow() {
    for (int t = 0; t < 3600; t++) {
      row(t, t < 3000 ? 1e5 : Math.max(2e4, 1e5 - 4e3 * (t - 3000)));
    }
    List<Long> falling =
        pressures.stream()
            .map(reading -> reading.time().getEpochSecond())
            .filter(t -> t > 3000 && t <= 3020)
            .toList();
    assertEquals(20, falling.size());
    assertTrue(
        pressures.stream().anyMatch(r -> r.time().getEpochSecond() == 3000),
        "what came before is passed on up to the last row");
  }

  @Test
  void slowRowsArePassedOnAsTheyAre() {
    for (int t = 0; t < 36_000; t += 60) {
      row(t, 1e5 + t % 100);
    }
    assertEquals(600, pressures.size());
    assertEquals(1e5 + 60, pressures.get(1).value());
  }

  /** Thinned or not, the belief comes to the same. */
  @Test
  void theBeliefIsThatOfAllRows() {
    Random random = new Random(8);
    State all = estimator.begin(VESSEL);
    for (int t = 0; t < 4 * 3600; t++) {
      double pa = (t < 7200 ? 1e5 : 8e4 + 1e4 * -Math.expm1(-(t - 7200) / 2000.0));
      pa += 50 * random.nextGaussian();
      row(t, pa);
      all = estimator.step(all, temperature(t, 277.15)).next();
      all = estimator.step(all, pressure(t, pa)).next();
    }
    finish();
    Estimate full = all.estimate().orElseThrow();
    Optional<Estimate> thin = state.estimate();
    double off = thin.orElseThrow().dissolvedKgPerM3() - full.dissolvedKgPerM3();
    assertTrue(Math.abs(off) < 0.5 * full.dissolvedU95KgPerM3(), "off by " + off);
    assertEquals(
        full.dissolvedU95KgPerM3(),
        thin.get().dissolvedU95KgPerM3(),
        0.35 * full.dissolvedU95KgPerM3());
  }
}

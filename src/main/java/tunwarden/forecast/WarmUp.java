package tunwarden.forecast;

import java.time.Duration;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.estimate.Estimate.Spread;

/**
 * Cooling lost at this moment: the vessel warms as T = Ta − (Ta − T0) exp(−t/τ), and its pressure
 * follows in two parts. Gas and vapour heat at once; gas that warming drives out of the liquid
 * comes at the rate kLa (1 + capacity ratio): p' = (∂p/∂T without transfer) T' + rate (p at rest −
 * p).
 *
 * @param world the vessel
 * @param toK what it warms to, K
 * @param constantS time constant τ, s
 */
public record WarmUp(World world, double toK, double constantS) {
  private static final int TEMPERATURES = 40;
  private static final int STEPS_PER_CONSTANT = 120;
  private static final double CONSTANTS = 5;

  /** Time to a pressure with its range from the transfer rate; empty: not within five constants. */
  public Optional<TimeRange> until(double paGauge, Spread transferPerS) {
    return until(world, toK, new Spread(constantS, constantS, constantS), paGauge, transferPerS);
  }

  /**
   * Time to a pressure where the time constant is a range too: soonest is quick warming with quick
   * transfer, latest slow warming with slow transfer.
   *
   * @param constantS time constant, s
   * @param paGauge pressure to reach, Pa gauge
   * @param transferPerS transfer rate, 1/s
   */
  public static Optional<TimeRange> until(
      World world, double toK, Spread constantS, double paGauge, Spread transferPerS) {
    WarmUp likely = new WarmUp(world, toK, constantS.middle());
    double[] rest = likely.atRest();
    OptionalDouble middle = likely.seconds(paGauge, transferPerS.middle(), rest);
    OptionalDouble soonest =
        new WarmUp(world, toK, constantS.low()).seconds(paGauge, transferPerS.high(), rest);
    if (middle.isEmpty() || soonest.isEmpty()) {
      return Optional.empty();
    }
    OptionalDouble latest =
        new WarmUp(world, toK, constantS.high()).seconds(paGauge, transferPerS.low(), rest);
    return Optional.of(
        new TimeRange(
            duration(middle.getAsDouble()),
            duration(Math.min(middle.getAsDouble(), soonest.getAsDouble())),
            latest.isPresent() ? Optional.of(duration(latest.getAsDouble())) : Optional.empty()));
  }

  private double[] atRest() {
    double[] rest = new double[TEMPERATURES + 1];
    for (int i = 0; i <= TEMPERATURES; i++) {
      rest[i] = world.restPaGauge(kelvin(i));
    }
    return rest;
  }

  private double kelvin(double index) {
    return world.temperatureK() + (toK - world.temperatureK()) * index / TEMPERATURES;
  }

  private OptionalDouble seconds(double paGauge, double transferPerS, double[] rest) {
    double rate = transferPerS * (1 + world.capacityRatio());
    double step = constantS / STEPS_PER_CONSTANT;
    double kept = Math.exp(-rate * step);
    double felt = rate > 0 ? (1 - kept) / (rate * step) : 1; // a steady push within the step
    double lag = world.paGauge() - rest[0];
    double before = world.paGauge();
    double index = 0;
    if (before >= paGauge) {
      return OptionalDouble.of(0);
    }
    for (int i = 1; i <= CONSTANTS * STEPS_PER_CONSTANT; i++) {
      double next = TEMPERATURES * -Math.expm1(-(double) i / STEPS_PER_CONSTANT);
      double quick = world.unmixedPaGauge(kelvin(next)) - world.unmixedPaGauge(kelvin(index));
      lag = lag * kept + felt * (quick - (at(rest, next) - at(rest, index)));
      double now = at(rest, next) + lag;
      if (!(now < paGauge)) {
        double share = (paGauge - before) / (now - before);
        return OptionalDouble.of((i - 1 + Math.max(0, Math.min(1, share))) * step);
      }
      before = now;
      index = next;
    }
    return OptionalDouble.empty();
  }

  private static double at(double[] rest, double index) {
    int below = Math.min(TEMPERATURES - 1, (int) index);
    return rest[below] + (index - below) * (rest[below + 1] - rest[below]);
  }

  private static Duration duration(double seconds) {
    return Duration.ofSeconds(Math.round(seconds));
  }
}

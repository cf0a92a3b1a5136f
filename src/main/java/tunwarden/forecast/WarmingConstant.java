package tunwarden.forecast;

import java.time.Duration;
import java.time.Instant;
import java.util.OptionalDouble;

/**
 * Learns how fast a vessel warms towards its surroundings from the temperatures of a log: a
 * straight line through ln(ambient − temperature) against time, by least squares over the present
 * run of warming. A fall by more than the noise ends the run. Immutable; each temperature gives the
 * next.
 *
 * @param ambientK what it warms to, K
 * @param start first reading of the run; null before any
 * @param highestK highest temperature of the run
 * @param fit sums of the fit
 */
public record WarmingConstant(double ambientK, Instant start, double highestK, Fit fit) {
  private static final double NOISE_K = 0.5;
  private static final double LEAST_GAP_K = 2;
  private static final double LEAST_LOG_RISE = 0.05;

  /** Sums over hours since the start (t) and ln of the gap to ambient (y). */
  record Fit(long count, double t, double y, double tt, double ty) {
    static final Fit NONE = new Fit(0, 0, 0, 0, 0);

    Fit with(double hours, double logGap) {
      return new Fit(count + 1, t + hours, y + logGap, tt + hours * hours, ty + hours * logGap);
    }

    /** Fall of ln(gap) per hour. */
    double fallPerHour() {
      return -(count * ty - t * y) / (count * tt - t * t);
    }
  }

  /** Nothing seen yet. */
  public static WarmingConstant towards(double ambientK) {
    return new WarmingConstant(ambientK, null, Double.NEGATIVE_INFINITY, Fit.NONE);
  }

  /** With one more temperature. */
  public WarmingConstant seen(Instant at, double temperatureK) {
    double gap = ambientK - temperatureK;
    if (!(gap > LEAST_GAP_K)) {
      return this;
    }
    if (start == null || temperatureK < highestK - NOISE_K || at.isBefore(start)) {
      return new WarmingConstant(ambientK, at, temperatureK, Fit.NONE.with(0, Math.log(gap)));
    }
    double hours = Duration.between(start, at).toMillis() / 3.6e6;
    return new WarmingConstant(
        ambientK, start, Math.max(highestK, temperatureK), fit.with(hours, Math.log(gap)));
  }

  /** The time constant, s; empty until the gap has closed by a twentieth in this run. */
  public OptionalDouble seconds() {
    if (fit.count() < 3) {
      return OptionalDouble.empty();
    }
    double fall = fit.fallPerHour();
    double span = 2 * fit.t() / fit.count();
    return fall > 0 && fall * span >= LEAST_LOG_RISE
        ? OptionalDouble.of(3600 / fall)
        : OptionalDouble.empty();
  }
}

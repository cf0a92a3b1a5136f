package tunwarden.forecast;

import java.time.Duration;
import java.time.Instant;
import java.util.OptionalDouble;

/**
 * How fast the gauge itself has been rising, whatever any model says of it: the mean of the present
 * hour against that of the hour before. A sudden fall (a vent, a lift) begins anew. Immutable; each
 * reading gives the next.
 *
 * @param before the completed hour; null before there is one
 * @param present the hour that goes on; null before any reading
 * @param keptPaPerS what the hours before told, Pa/s, until the present one is long enough; NaN
 *     before that
 */
public record RecentRise(Hour before, Hour present, double keptPaPerS) {
  /** Nothing seen yet. */
  public static final RecentRise NONE = new RecentRise(null, null, Double.NaN);

  private static final Duration LENGTH = Duration.ofHours(1);
  private static final Duration LEAST = Duration.ofMinutes(20);
  private static final double FALL_PA = 3_000;

  /**
   * Readings of up to an hour.
   *
   * @param start the first
   * @param count how many
   * @param seconds sum of their times since the start, s
   * @param pa sum of their pressures, Pa gauge
   * @param lastS time of the newest since the start, s
   */
  record Hour(Instant start, long count, double seconds, double pa, double lastS) {
    static Hour of(Instant at, double paGauge) {
      return new Hour(at, 1, 0, paGauge, 0);
    }

    Hour with(Instant at, double paGauge) {
      double since = Duration.between(start, at).toMillis() / 1000.0;
      return new Hour(start, count + 1, seconds + since, pa + paGauge, since);
    }

    double meanPa() {
      return pa / count;
    }

    double secondsUntil(Hour later) {
      double apart = Duration.between(start, later.start).toMillis() / 1000.0;
      return apart + later.seconds / later.count - seconds / count;
    }
  }

  /** With one more reading, Pa gauge. */
  public RecentRise seen(Instant at, double paGauge) {
    if (present == null || at.isBefore(present.start) || paGauge < present.meanPa() - FALL_PA) {
      return new RecentRise(null, Hour.of(at, paGauge), Double.NaN);
    }
    Duration since = Duration.between(present.start, at);
    if (since.compareTo(LENGTH.multipliedBy(2)) > 0) {
      return new RecentRise(null, Hour.of(at, paGauge), Double.NaN);
    }
    return since.compareTo(LENGTH) < 0
        ? new RecentRise(before, present.with(at, paGauge), keptPaPerS)
        : new RecentRise(present, Hour.of(at, paGauge), paPerS().orElse(Double.NaN));
  }

  /** Pa/s; empty until an hour and a third have been seen without a fall. */
  public OptionalDouble paPerS() {
    boolean tooShort = before == null || present == null || present.lastS < LEAST.toSeconds();
    double rate =
        tooShort ? keptPaPerS : (present.meanPa() - before.meanPa()) / before.secondsUntil(present);
    return Double.isFinite(rate) ? OptionalDouble.of(rate) : OptionalDouble.empty();
  }
}

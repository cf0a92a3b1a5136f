package tunwarden.replay;

import java.time.Duration;
import java.time.Instant;

/**
 * Data time as a function of elapsed real time; immutable. Real time is counted in nanoseconds of
 * any monotonic counter, which the caller supplies.
 *
 * @param at data time at {@code sinceNanos}
 * @param sinceNanos real time of the last change
 * @param pace data seconds per real second, positive
 * @param paused whether data time stands still
 */
public record ReplayClock(Instant at, long sinceNanos, double pace, boolean paused) {
  /** Fastest pace; beyond it the machine sets the speed anyway. */
  public static final double FASTEST = 1e7;

  /** Refuses a pace that is no pace. */
  public ReplayClock {
    if (!(pace > 0) || !(pace <= FASTEST)) {
      throw new IllegalArgumentException("a pace of " + pace + " is not above 0 and up to 1e7");
    }
  }

  /** Data time at a real time. */
  public Instant dataTime(long nowNanos) {
    if (paused) {
      return at;
    }
    double dataNanos = Math.max(0, nowNanos - sinceNanos) * pace;
    long seconds = (long) (dataNanos / 1e9);
    return at.plusSeconds(seconds).plusNanos((long) (dataNanos - seconds * 1e9));
  }

  /** Real nanoseconds from {@code nowNanos} until data time reaches {@code target}; 0 if it has. */
  public long nanosUntil(Instant target, long nowNanos) {
    if (paused) {
      return Long.MAX_VALUE;
    }
    Duration left = Duration.between(dataTime(nowNanos), target);
    if (left.isNegative() || left.isZero()) {
      return 0;
    }
    double nanos = (left.getSeconds() * 1e9 + left.getNano()) / pace;
    return nanos >= Long.MAX_VALUE ? Long.MAX_VALUE : (long) Math.ceil(nanos);
  }

  /** The same moment at another pace. */
  public ReplayClock withPace(double other, long nowNanos) {
    return new ReplayClock(dataTime(nowNanos), nowNanos, other, paused);
  }

  /** The same moment, standing still or running. */
  public ReplayClock withPaused(boolean still, long nowNanos) {
    return new ReplayClock(dataTime(nowNanos), nowNanos, pace, still);
  }

  /** Another moment. */
  public ReplayClock movedTo(Instant other, long nowNanos) {
    return new ReplayClock(other, nowNanos, pace, paused);
  }
}

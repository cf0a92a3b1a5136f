package tunwarden.report;

import java.time.Duration;
import java.time.Instant;

/** Picks the first row of every stretch of time; every row where no stretch is given. */
final class Spacing {
  private final long everyMs;
  private long nextMs = Long.MIN_VALUE;

  /** Stretches begin at whole multiples of their length; zero for every row. */
  Spacing(Duration every) {
    this.everyMs = every.toMillis();
  }

  /** Whether this row is the first of its stretch; rows come in order of time. */
  boolean isDue(Instant time) {
    long ms = time.toEpochMilli();
    if (ms < nextMs) {
      return false;
    }
    nextMs = everyMs == 0 ? ms : Math.floorDiv(ms, everyMs) * everyMs + everyMs;
    return true;
  }
}

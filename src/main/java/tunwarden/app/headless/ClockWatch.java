package tunwarden.app.headless;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;

/**
 * Compares the wall clock with one that only ever runs forward, and tells of steps. A step back
 * makes readings look older than those before it; a step forward makes them look stale.
 */
final class ClockWatch {
  private static final Duration NOTICEABLE = Duration.ofSeconds(5);

  private final Clocks clocks;
  private Instant lastWall;
  private long lastNanos;

  ClockWatch(Clocks clocks) {
    this.clocks = clocks;
    this.lastWall = clocks.wall().instant();
    this.lastNanos = clocks.nanos().getAsLong();
  }

  /** One sentence when the clock has been stepped since the last look. */
  Optional<String> look() {
    Instant wall = clocks.wall().instant();
    long nanos = clocks.nanos().getAsLong();
    Duration step = Duration.between(lastWall, wall).minusNanos(nanos - lastNanos);
    lastWall = wall;
    lastNanos = nanos;
    if (step.abs().compareTo(NOTICEABLE) < 0) {
      return Optional.empty();
    }
    String way = step.isNegative() ? "back" : "forward";
    return Optional.of(
        "The clock of this computer was put " + way + " by " + step.abs().toSeconds() + " s.");
  }
}

package tunwarden.app.headless;

import java.time.Duration;
import java.time.Instant;
import java.time.InstantSource;

/** A clock that runs many times too fast, and can be stepped and held. It is held at first. */
final class FastClock implements InstantSource {
  private final Instant begin;
  private final int factor;
  private long passedNanos;
  private long sinceNanos;
  private boolean held = true;
  private volatile Duration stepped = Duration.ZERO;

  FastClock(Instant begin, int factor) {
    this.begin = begin;
    this.factor = factor;
  }

  /** What a clock shows that is never stepped, ns. */
  synchronized long nanos() {
    return passedNanos + (held ? 0 : (System.nanoTime() - sinceNanos) * factor);
  }

  /** Time stands still. */
  synchronized void hold() {
    passedNanos = nanos();
    held = true;
  }

  /** Time goes on. */
  synchronized void goOn() {
    sinceNanos = System.nanoTime();
    held = false;
  }

  Duration passed() {
    return Duration.ofNanos(nanos());
  }

  void step(Duration by) {
    stepped = stepped.plus(by);
  }

  @Override
  public Instant instant() {
    return begin.plusNanos(nanos()).plus(stepped);
  }
}

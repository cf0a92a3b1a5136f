package tunwarden.forecast;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Apparent extract as an instrument has read it, smoothed over two hours, and a mark of what it was
 * half a day to a day before, from which the fall is told. Immutable.
 *
 * @param newest the newest value; empty before any
 * @param middle what it was up to half a day ago
 * @param oldest what it was half a day to a day ago
 */
public record GravityTrack(
    Optional<Extract> newest, Optional<Extract> middle, Optional<Extract> oldest) {
  /** Nothing seen yet. */
  public static final GravityTrack NONE =
      new GravityTrack(Optional.empty(), Optional.empty(), Optional.empty());

  private static final double SMOOTHING_S = 2 * 3600;
  private static final Duration MARKS = Duration.ofHours(12);
  private static final double LEAST_S = 6 * 3600;
  private static final double DAY_S = 86_400;

  /**
   * Apparent extract at a time.
   *
   * @param at when
   * @param plato degrees Plato
   */
  public record Extract(Instant at, double plato) {}

  /** With one more reading, degrees Plato; one out of order changes nothing. */
  public GravityTrack seen(Instant at, double plato) {
    if (newest.isEmpty()) {
      Optional<Extract> first = Optional.of(new Extract(at, plato));
      return new GravityTrack(first, first, first);
    }
    double gap = seconds(newest.get().at(), at);
    if (!(gap > 0)) {
      return this;
    }
    double before = newest.get().plato();
    double smooth = before - Math.expm1(-gap / SMOOTHING_S) * (plato - before);
    Optional<Extract> now = Optional.of(new Extract(at, smooth));
    boolean due = Duration.between(middle.orElseThrow().at(), at).compareTo(MARKS) >= 0;
    return due ? new GravityTrack(now, now, middle) : new GravityTrack(now, middle, oldest);
  }

  /** How fast it falls, degrees Plato a day; empty until six hours have been seen, or at rest. */
  public OptionalDouble dropPlatoPerDay() {
    if (newest.isEmpty()) {
      return OptionalDouble.empty();
    }
    double apart = seconds(oldest.orElseThrow().at(), newest.get().at());
    double drop = (oldest.get().plato() - newest.get().plato()) / apart * DAY_S;
    return apart >= LEAST_S && drop > 0 ? OptionalDouble.of(drop) : OptionalDouble.empty();
  }

  private static double seconds(Instant from, Instant to) {
    return Duration.between(from, to).toMillis() / 1000.0;
  }
}

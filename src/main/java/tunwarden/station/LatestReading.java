package tunwarden.station;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.assess.Observed;
import tunwarden.reading.Quality;

/** Remembers the newest value of one quantity; immutable. */
record LatestReading(OptionalDouble value, Optional<Instant> at, Quality quality) {
  static final LatestReading NONE =
      new LatestReading(OptionalDouble.empty(), Optional.empty(), Quality.STALE);

  LatestReading seen(double newValue, Instant time, Quality newQuality) {
    return new LatestReading(OptionalDouble.of(newValue), Optional.of(time), newQuality);
  }

  /** A fault keeps the last value, so that the screen can show it with its mark. */
  LatestReading faulty(Quality newQuality) {
    return new LatestReading(value, at, newQuality);
  }

  Observed observedAt(Instant now, Duration stale) {
    if (at.isEmpty()) {
      return new Observed(value, at, quality, Duration.ZERO);
    }
    Duration age = Duration.between(at.get(), now);
    Duration known = age.isNegative() ? Duration.ZERO : age;
    boolean silent = !quality.isBad() && known.compareTo(stale) > 0;
    return new Observed(value, at, silent ? Quality.STALE : quality, known);
  }
}

package tunwarden.assess;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.reading.Quality;

/**
 * The newest word of one instrument.
 *
 * @param value the value in SI; empty when none was ever seen or the instrument gives none
 * @param at when it was measured; empty when never
 * @param quality how far to believe it; {@link Quality#STALE} once too old
 * @param age how old it is at the time of the assessment
 */
public record Observed(OptionalDouble value, Optional<Instant> at, Quality quality, Duration age) {
  /** Nothing was ever seen. */
  public static final Observed NEVER =
      new Observed(OptionalDouble.empty(), Optional.empty(), Quality.STALE, Duration.ZERO);

  /** Whether there is a value that may be used. */
  public boolean isUsable() {
    return value.isPresent() && !quality.isBad();
  }
}

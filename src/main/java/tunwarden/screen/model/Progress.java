package tunwarden.screen.model;

import java.time.Duration;
import java.util.Optional;

/**
 * Work that takes more than a moment, such as reading a long log.
 *
 * @param words what is being done: "reading brewhouse.csv"
 * @param share how much is done, 0..1
 * @param left estimate of the time left, once there is one
 */
public record Progress(String words, double share, Optional<Duration> left) {
  private static final Duration SHOWN_AFTER = Duration.ofMillis(500);
  private static final double LEAST_TO_JUDGE_BY = 0.01;

  /** Work that has come so far in that time; empty as long as it may be over in a moment. */
  public static Optional<Progress> after(Duration spent, String words, double share) {
    if (spent.compareTo(SHOWN_AFTER) < 0) {
      return Optional.empty();
    }
    double done = Math.max(0, Math.min(1, share));
    Optional<Duration> left =
        done > LEAST_TO_JUDGE_BY
            ? Optional.of(Duration.ofMillis(Math.round(spent.toMillis() * (1 - done) / done)))
            : Optional.empty();
    return Optional.of(new Progress(words, done, left));
  }
}

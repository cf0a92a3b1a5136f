package tunwarden.replay;

import java.time.Instant;
import java.util.Optional;

/**
 * Where a replay stands, for a screen.
 *
 * @param start data time of the first row
 * @param at data time reached
 * @param rows rows fed
 * @param pace data seconds per real second
 * @param paused whether it stands still
 * @param ended whether all rows have been fed
 * @param failure why it stopped, as one sentence, if it failed
 * @param seek where it is on its way to, if it is
 */
public record ReplayStatus(
    Instant start,
    Instant at,
    long rows,
    double pace,
    boolean paused,
    boolean ended,
    Optional<String> failure,
    Optional<Seek> seek) {
  /**
   * A way through the log that takes a while.
   *
   * @param from data time at which it began to feed rows
   * @param to data time to be reached
   * @param sinceNanos when it was asked for, on the driver's counter
   */
  public record Seek(Instant from, Instant to, long sinceNanos) {}
}

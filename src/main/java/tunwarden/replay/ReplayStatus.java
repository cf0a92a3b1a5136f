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
 */
public record ReplayStatus(
    Instant start,
    Instant at,
    long rows,
    double pace,
    boolean paused,
    boolean ended,
    Optional<String> failure) {}

package tunwarden.screen.model;

import java.time.Instant;
import java.util.List;

/**
 * Where a replay stands.
 *
 * @param log name of the log
 * @param pace data seconds per second of real time
 * @param paused whether it stands still
 * @param from first time in the log
 * @param to last time in the log
 * @param position time of the newest row played
 * @param trouble why it cannot go on, as one sentence; empty as long as it can
 * @param events times at which something happened, in order, as far as known
 */
public record ReplayStatus(
    String log,
    double pace,
    boolean paused,
    Instant from,
    Instant to,
    Instant position,
    String trouble,
    List<TimeMark> events) {
  /** Keeps its own copy. */
  public ReplayStatus {
    events = List.copyOf(events);
  }

  /**
   * A time worth going to.
   *
   * @param time data time
   * @param vessel identity of the vessel
   * @param word what happened, one or two words
   */
  public record TimeMark(Instant time, String vessel, String word) {}
}

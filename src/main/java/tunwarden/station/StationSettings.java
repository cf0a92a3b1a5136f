package tunwarden.station;

import java.time.Duration;

/**
 * How the station paces itself, all in data time, so that a replay gives the same results.
 *
 * @param stale age at which a reading counts as stale
 * @param outlookAtMost shortest time between two computations of the futures
 * @param outlookAtLeast longest time between two
 */
public record StationSettings(Duration stale, Duration outlookAtMost, Duration outlookAtLeast) {
  /** Half a minute to staleness; futures every minute, and every ten seconds on the move. */
  public static final StationSettings USUAL =
      new StationSettings(Duration.ofSeconds(30), Duration.ofSeconds(10), Duration.ofMinutes(1));

  /** The same pacing with another age of staleness. */
  public StationSettings withStale(Duration other) {
    return new StationSettings(other, outlookAtMost, outlookAtLeast);
  }
}

package tunwarden.alarm;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;

/**
 * How many alarms have come, and whether they come faster than one person can follow: a flood
 * begins above ten in ten minutes and ends below five (ISA-18.2 and EEMUA 191, from memory).
 *
 * @param raised alarms raised since the book was begun
 * @param chattered those of them that came and went faster than a person can follow
 * @param floods floods since then
 * @param flood whether one is going on
 * @param recent when the latest were raised, at most {@link #MOST_KEPT}
 */
public record AlarmCounts(
    long raised, long chattered, long floods, boolean flood, List<Instant> recent) {
  /** Nothing yet. */
  public static final AlarmCounts ZERO = new AlarmCounts(0, 0, 0, false, List.of());

  static final int MOST_KEPT = 64;
  private static final Duration WINDOW = Duration.ofMinutes(10);
  private static final int FLOOD_ABOVE = 10;
  private static final int OVER_BELOW = 5;

  /** Keeps its own copy. */
  public AlarmCounts {
    recent = List.copyOf(recent);
  }

  /**
   * Counts what was raised at {@code at} and forgets what is older than the window.
   *
   * @param chatter how many of the raised chatter
   */
  AlarmCounts count(int more, int chatter, Instant at) {
    if (more == 0 && recent.isEmpty()) {
      return this;
    }
    List<Instant> kept = new ArrayList<>();
    for (Instant time : recent) {
      if (time.isAfter(at.minus(WINDOW)) && !time.isAfter(at)) {
        kept.add(time);
      }
    }
    for (int i = 0; i < more; i++) {
      kept.add(at);
    }
    int surplus = Math.max(0, kept.size() - MOST_KEPT);
    List<Instant> newest = kept.subList(surplus, kept.size());
    boolean now = flood ? newest.size() >= OVER_BELOW : newest.size() > FLOOD_ABOVE;
    if (more == 0 && newest.size() == recent.size()) {
      return this;
    }
    long begun = now && !flood ? 1 : 0;
    return new AlarmCounts(raised + more, chattered + chatter, floods + begun, now, newest);
  }
}

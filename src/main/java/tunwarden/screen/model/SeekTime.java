package tunwarden.screen.model;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Kind;
import tunwarden.units.Quantities;

/**
 * Reads where to go in a replay: a time of day, a full time, or so much back or forth. Where a long
 * log ends may not be known yet, so that a time after it is taken as it is: it leads to the end.
 */
final class SeekTime {
  /** A hundred years, s. */
  private static final double FURTHEST_S = 3.2e9;

  private SeekTime() {}

  /**
   * The moment meant, not before the log begins.
   *
   * @throws BadQuantityException when the text is no time
   */
  static Instant parse(String text, ReplayStatus replay, ZoneId zone) {
    Instant meant = text.matches("[+-].*") ? relative(text, replay) : absolute(text, replay, zone);
    return meant.isBefore(replay.from()) ? replay.from() : meant;
  }

  private static Instant relative(String text, ReplayStatus replay) {
    double seconds = Quantities.parse(text, Kind.DURATION);
    double kept = Math.max(-FURTHEST_S, Math.min(FURTHEST_S, seconds));
    return replay.position().plusMillis((long) (1000 * kept));
  }

  private static Instant absolute(String text, ReplayStatus replay, ZoneId zone) {
    try {
      if (text.contains("T")) {
        return OffsetDateTime.parse(text).toInstant();
      }
      return nearest(LocalTime.parse(text.matches("\\d:.*") ? "0" + text : text), replay, zone);
    } catch (DateTimeException notATime) {
      throw new BadQuantityException(
          "'" + text + "' is no time; write 14:30, 2026-03-02T14:30:00Z, +2 h or -10 min");
    }
  }

  /** That time of day on the day being played, or the nearest day the log covers. */
  private static Instant nearest(LocalTime time, ReplayStatus replay, ZoneId zone) {
    ZonedDateTime day = replay.position().atZone(zone);
    Instant same = day.with(time).toInstant();
    if (same.isAfter(replay.to())) {
      return day.minusDays(1).with(time).toInstant();
    }
    return same.isBefore(replay.from()) ? day.plusDays(1).with(time).toInstant() : same;
  }
}

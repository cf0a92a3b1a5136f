package tunwarden.screen.view;

import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tunwarden.forecast.TimeRange;
import tunwarden.screen.model.Board;
import tunwarden.units.Display;

/** Times and lengths of time as words, and lines broken between words. */
final class Words {
  private static final DateTimeFormatter CLOCK =
      DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT);
  private static final DateTimeFormatter MINUTE = DateTimeFormatter.ofPattern("HH:mm", Locale.ROOT);
  private static final DateTimeFormatter DAY_MINUTE =
      DateTimeFormatter.ofPattern("MM-dd HH:mm", Locale.ROOT);
  private static final DateTimeFormatter FULL =
      DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss", Locale.ROOT);
  private static final long MINUTE_S = 60;
  private static final long HOUR_S = 3_600;
  private static final long DAY_S = 86_400;

  private Words() {}

  static String clock(Instant time, ZoneId zone) {
    return CLOCK.format(time.atZone(zone));
  }

  static String minute(Instant time, ZoneId zone) {
    return MINUTE.format(time.atZone(zone));
  }

  static String dayAndMinute(Instant time, ZoneId zone) {
    return DAY_MINUTE.format(time.atZone(zone));
  }

  static String full(Instant time, ZoneId zone) {
    return FULL.format(time.atZone(zone));
  }

  /** Time of day, with the day before it unless that is today's. */
  static String when(Instant time, Board board) {
    ZoneId zone = board.zone();
    boolean today = time.atZone(zone).toLocalDate().equals(board.now().atZone(zone).toLocalDate());
    return today ? minute(time, zone) : dayAndMinute(time, zone);
  }

  /** Two units at most: {@code 45 s}, {@code 5 min}, {@code 5 h 20 min}, {@code 3 d 4 h}. */
  static String length(Duration duration) {
    long s = Math.max(0, duration.toSeconds());
    if (s < MINUTE_S) {
      return s + " s";
    }
    if (s < HOUR_S) {
      return s / MINUTE_S + " min";
    }
    if (s < DAY_S) {
      return two(s / HOUR_S, "h", s % HOUR_S / MINUTE_S, "min");
    }
    return two(s / DAY_S, "d", s % DAY_S / HOUR_S, "h");
  }

  private static String two(long first, String unit, long second, String smaller) {
    return first + " " + unit + (second == 0 ? "" : " " + second + " " + smaller);
  }

  /** One unit, for narrow columns: {@code 1 s}, {@code 12 min}, {@code 3 h}, {@code 9 d}. */
  static String age(Duration duration) {
    long s = Math.max(0, duration.toSeconds());
    if (s < 100) {
      return s + " s";
    }
    if (s < 100 * MINUTE_S) {
      return s / MINUTE_S + " min";
    }
    return s < 100 * HOUR_S ? s / HOUR_S + " h" : s / DAY_S + " d";
  }

  /** {@code 5 h 20 min (4 h 40 min to 6 h 30 min)}. */
  static String range(TimeRange range) {
    String high = range.high().map(h -> "to " + length(h)).orElse("or never");
    return length(range.middle()) + " (" + length(range.low()) + " " + high + ")";
  }

  /** The same in one unit, for narrow columns: {@code 5.3 h (4.7 to 6.5)}. */
  static String briefRange(TimeRange range) {
    long s = Math.max(0, range.middle().toSeconds());
    boolean days = s >= 2 * DAY_S;
    long unit = s < 2 * MINUTE_S ? 1 : s < 2 * HOUR_S ? MINUTE_S : days ? DAY_S : HOUR_S;
    String symbol = unit == 1 ? "s" : unit == MINUTE_S ? "min" : days ? "d" : "h";
    int decimals = unit >= HOUR_S && s < 10 * unit ? 1 : 0;
    String high = range.high().map(h -> "to " + in(h, unit, decimals)).orElse("or never");
    return in(range.middle(), unit, decimals)
        + " "
        + symbol
        + " ("
        + in(range.low(), unit, decimals)
        + " "
        + high
        + ")";
  }

  private static String in(Duration duration, long unitS, int decimals) {
    return Display.number(Math.max(0, duration.toSeconds()) / (double) unitS, decimals);
  }

  /** Lines of at most so many columns, broken at blanks. */
  static List<String> wrap(String text, int width) {
    List<String> lines = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : text.split(" ")) {
      boolean fits = Cells.width(line.toString()) + 1 + Cells.width(word) <= width;
      if (!line.isEmpty() && !fits) {
        lines.add(line.toString());
        line.setLength(0);
      }
      line.append(line.isEmpty() ? "" : " ").append(word);
    }
    if (!line.isEmpty()) {
      lines.add(line.toString());
    }
    return lines;
  }
}

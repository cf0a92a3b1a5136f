package tunwarden.report.story;

import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.Locale;
import tunwarden.units.Display;

/** How times, amounts and degrees of certainty are put into words. */
public final class Telling {
  /** Units of every report: bar, °C, g/L. */
  public static final Display DISPLAY = Display.METRIC;

  private final DateTimeFormatter dayAndTime;
  private final DateTimeFormatter time;

  /** Tells times in that zone. */
  public Telling(ZoneId zone) {
    dayAndTime = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm:ss", Locale.ROOT).withZone(zone);
    time = DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT).withZone(zone);
  }

  /** Day and time of day. */
  public String at(Instant instant) {
    return dayAndTime.format(instant);
  }

  /** Time of day alone. */
  public String clock(Instant instant) {
    return time.format(instant);
  }

  /** A stretch of time, in the unit that suits it. */
  public static String duration(Duration duration) {
    long seconds = duration.toSeconds();
    if (seconds < 180) {
      return seconds + " s";
    }
    if (seconds < 3 * 3600) {
      return Math.round(seconds / 60.0) + " min";
    }
    return seconds < 72 * 3600
        ? String.format(Locale.ROOT, "%.1f h", seconds / 3600.0)
        : String.format(Locale.ROOT, "%.1f days", seconds / 86_400.0);
  }

  /** A mass of gas. */
  public static String mass(double kg) {
    return kg < 1 ? Math.round(kg * 1000) + " g" : String.format(Locale.ROOT, "%.2f kg", kg);
  }

  /** A confidence in words. */
  public static String sure(double confidence) {
    if (confidence >= 0.9) {
      return "almost certainly";
    }
    return confidence >= 0.7 ? "probably" : "possibly";
  }

  /** {@code 1 time}, {@code 3 times}. */
  public static String times(int count) {
    return switch (count) {
      case 0 -> "never";
      case 1 -> "once";
      case 2 -> "twice";
      default -> count + " times";
    };
  }

  /** {@code 1 row}, {@code 3 rows}. */
  public static String count(long number, String noun) {
    return String.format(Locale.ROOT, "%,d %s%s", number, noun, number == 1 ? "" : "s");
  }
}

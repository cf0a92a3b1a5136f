package tunwarden.report.page;

import java.time.Instant;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Time along a picture, with marks at round times of the log's own zone. */
final class TimeScale {
  private static final long[] STEPS_S = {
    60, 120, 300, 600, 1200, 1800, 3600, 7200, 10_800, 21_600, 43_200, 86_400, 172_800, 604_800,
    1_209_600, 2_592_000
  };
  private static final int MOST_MARKS = 10;

  private final Scale scale;
  private final ZoneId zone;

  TimeScale(long fromMs, long untilMs, double at0, double at1, ZoneId zone) {
    this.scale = new Scale(fromMs, Math.max(untilMs, fromMs + 1000), at0, at1);
    this.zone = zone;
  }

  double at(long ms) {
    return scale.at(ms);
  }

  boolean holds(long ms) {
    return scale.holds(ms);
  }

  /**
   * A mark on the axis.
   *
   * @param at where
   * @param label its time or date
   */
  record Mark(double at, String label) {}

  List<Mark> marks() {
    double span = (scale.high() - scale.low()) / 1000;
    long step = STEPS_S[STEPS_S.length - 1];
    for (long each : STEPS_S) {
      if (span / each <= MOST_MARKS) {
        step = each;
        break;
      }
    }
    List<Mark> marks = new ArrayList<>();
    ZonedDateTime time =
        Instant.ofEpochMilli((long) scale.low()).atZone(zone).truncatedTo(ChronoUnit.DAYS);
    while (time.toInstant().toEpochMilli() <= scale.high()) {
      long ms = time.toInstant().toEpochMilli();
      if (ms >= scale.low()) {
        marks.add(new Mark(scale.at(ms), label(time)));
      }
      time = time.plusSeconds(step);
    }
    return marks;
  }

  private static String label(ZonedDateTime time) {
    boolean midnight = time.getHour() == 0 && time.getMinute() == 0;
    String pattern = midnight ? "d MMM" : "HH:mm";
    return DateTimeFormatter.ofPattern(pattern, Locale.ENGLISH).format(time);
  }
}

package tunwarden.screen.view;

import java.time.Instant;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;

/** Round moments for the time axis of a chart. */
final class TimeTicks {
  /** Steps between ticks, s: from 10 s by minutes and hours to weeks. */
  private static final long[] STEPS_S = {
    10, 30, 60, 120, 300, 600, 900, 1_800, 3_600, 7_200, 10_800, 21_600, 43_200, 86_400, 172_800,
    604_800
  };

  private static final int LEAST_CELLS = 12;
  private static final long DAY_S = 86_400;
  private static final long MINUTE_S = 60;

  private TimeTicks() {}

  /** The ticks of a chart, at least a dozen cells apart. */
  static List<Instant> of(ChartTime time, ZoneId zone) {
    long step = stepS(time);
    long offset = zone.getRules().getOffset(time.start()).getTotalSeconds();
    long first = Math.floorDiv(time.start().getEpochSecond() + offset, step) * step + step - offset;
    List<Instant> ticks = new ArrayList<>();
    for (long s = first; s < time.end().getEpochSecond(); s += step) {
      ticks.add(Instant.ofEpochSecond(s));
    }
    return ticks;
  }

  private static long stepS(ChartTime time) {
    long least = LEAST_CELLS * time.dotMs() * time.dotsAcross() / 1000;
    for (long step : STEPS_S) {
      if (step >= least) {
        return step;
      }
    }
    return Math.floorDiv(least, DAY_S) * DAY_S + DAY_S;
  }

  /** Time of day, with seconds or the date where the step asks for it. */
  static String text(Instant tick, ChartTime time, ZoneId zone) {
    long step = stepS(time);
    if (step < MINUTE_S) {
      return Words.clock(tick, zone);
    }
    String minute = Words.dayAndMinute(tick, zone);
    return step >= DAY_S || minute.endsWith("00:00") ? minute.substring(0, 5) : minute.substring(6);
  }
}

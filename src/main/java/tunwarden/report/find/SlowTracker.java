package tunwarden.report.find;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.function.DoubleSupplier;

/**
 * Finds what is too slow to stand out from row to row, in means over some seconds. Among means of a
 * minute a shut vessel moves as well: a liquid coming to rest, a change of temperature. Gas let out
 * through a throttled valve tells itself from these by beginning and ending abruptly, and by no
 * temperature that explains it.
 */
final class SlowTracker {
  private static final int REMEMBERED = 64;
  private static final int LATER = 3;
  private static final double SLOWEST_PA_PER_S = 3;
  private static final double LONGEST_S = 2700;

  /** After the end it goes on falling at no more than this share of the pace before. */
  private static final double GOES_ON = 0.2;

  /** The last part of a fall is no slower than this share of the whole. */
  private static final double LAST_PACE = 0.55;

  /** The part of a fall that tells when it began. */
  private static final double EARLY = 0.08;

  private static final double LATE = 0.6;
  private static final int LEAST_COURSE = 5;

  /** What a degree does to a pressure at rest, share: no drink's solubility falls faster. */
  private static final double PER_K = 0.045;

  private final long widthMs;
  private final boolean strict;
  private final MovementTracker tracker;
  private final ArrayDeque<Point> recent = new ArrayDeque<>();
  private final List<Movement> pending = new ArrayList<>();
  private final List<Movement> found = new ArrayList<>();
  private int judged;
  private long slot = Long.MIN_VALUE;
  private double sumMs;
  private double sumPa;
  private double sumK;
  private int count;

  /**
   * A tracker over means.
   *
   * @param widthMs over how long, ms
   * @param strict whether a shut vessel may move as well in that time
   * @param leastPa smallest change that counts
   */
  SlowTracker(long widthMs, boolean strict, DoubleSupplier leastPa) {
    this.widthMs = widthMs;
    this.strict = strict;
    this.tracker = MovementTracker.ofMeans(strict ? SLOWEST_PA_PER_S : 8, leastPa);
  }

  void add(Point point) {
    long now = Math.floorDiv(point.ms(), widthMs);
    if (now != slot) {
      pass();
    }
    slot = now;
    sumMs += point.ms() - now * widthMs;
    sumPa += point.paGauge();
    sumK += point.kelvin();
    count++;
  }

  private void pass() {
    if (count == 0) {
      return;
    }
    long ms = slot * widthMs + Math.round(sumMs / count);
    Point mean = new Point(ms, sumPa / count, sumK / count);
    count = 0;
    sumMs = 0;
    sumPa = 0;
    sumK = 0;
    tracker.add(mean);
    recent.addLast(mean);
    if (recent.size() > REMEMBERED) {
      recent.removeFirst();
    }
    take(mean.ms() - LATER * widthMs);
  }

  void silence() {
    pass();
    tracker.silence();
    take(Long.MAX_VALUE);
    recent.clear();
  }

  /** Judges what ended before a time, when what came after it is known. */
  private void take(long beforeMs) {
    List<Movement> all = tracker.movements();
    pending.addAll(all.subList(judged, all.size()));
    judged = all.size();
    for (Iterator<Movement> each = pending.iterator(); each.hasNext(); ) {
      Movement movement = each.next();
      if (movement.untilMs() <= beforeMs) {
        each.remove();
        if (!strict || isAbrupt(movement) && !isByTemperature(movement)) {
          found.add(refined(movement));
        }
      }
    }
  }

  private boolean isAbrupt(Movement movement) {
    double seconds = (movement.untilMs() - movement.fromMs()) / 1000.0;
    if (movement.changePa() > 0 || seconds > LONGEST_S) {
      return false;
    }
    double pace = movement.changePa() / seconds;
    Point end = nearest(movement.untilMs());
    Point late = nearest(movement.untilMs() - Math.round(1000 * seconds / 3));
    Point after = nearest(movement.untilMs() + LATER * widthMs);
    if (after.ms() == end.ms() || late.ms() == end.ms()) {
      return false;
    }
    return pace(late, end) <= LAST_PACE * pace && pace(end, after) >= GOES_ON * pace;
  }

  private static double pace(Point from, Point to) {
    return 1000 * (to.paGauge() - from.paGauge()) / (to.ms() - from.ms());
  }

  private boolean isByTemperature(Movement movement) {
    double change = nearest(movement.untilMs()).kelvin() - nearest(movement.fromMs()).kelvin();
    double absolute = movement.fromPa() + 101_325;
    return change < 0 && PER_K * -change * absolute > -movement.changePa() / 2;
  }

  private Point nearest(long ms) {
    Point nearest = recent.getLast();
    for (Point point : recent) {
      nearest = Math.abs(point.ms() - ms) < Math.abs(nearest.ms() - ms) ? point : nearest;
    }
    return nearest;
  }

  /** Begins where the line through the first half of the fall meets the course before it. */
  private Movement refined(Movement movement) {
    Line course = new Line(movement.fromMs());
    Line fall = new Line(movement.fromMs());
    for (Point point : recent) {
      if (point.ms() < movement.fromMs() - widthMs) {
        course.add(point);
      }
    }
    double high = movement.fromPa() + EARLY * movement.changePa();
    double low = movement.fromPa() + LATE * movement.changePa();
    for (Point point : recent) {
      boolean inside = point.ms() > movement.fromMs() - widthMs && point.ms() <= movement.untilMs();
      boolean early = (point.paGauge() - low) * (high - low) >= 0;
      boolean begun = (high - point.paGauge()) * (high - low) >= 0;
      if (inside && early && begun) {
        fall.add(point);
      }
    }
    if (course.count() < LEAST_COURSE || fall.count() < 2 || fall.slope() == course.slope()) {
      return movement;
    }
    double ms = (course.atOrigin() - fall.atOrigin()) / (fall.slope() - course.slope());
    double most = 4.0 * widthMs;
    if (Math.abs(ms) > most || movement.fromMs() + ms >= movement.untilMs()) {
      return movement;
    }
    return movement.beginning(movement.fromMs() + Math.round(ms), course.at(ms));
  }

  /** What was found, in order of time. */
  List<Movement> movements() {
    return found;
  }
}

package tunwarden.report.find;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleSupplier;

/**
 * Finds movements and spikes in a pressure signal. A shut vessel follows its temperature and its
 * liquid within minutes; a valve changes the pressure within seconds. So a value far from the
 * straight course of the last rows opens a movement, if the next rows stay away; if they return, it
 * was a spike.
 */
final class MovementTracker {
  private static final int COURSE_ROWS = 12;
  private static final int LEAST_ROWS = 5;
  private static final double FLOOR_PA = 350;
  private static final int SPIKE_ROWS = 3;

  private static final double SLOWEST_PA_PER_S = 8;

  private final double slowestPaPerS;
  private final DoubleSupplier leastPa;
  private final boolean means;
  private final NoiseGauge noise = new NoiseGauge();
  private final Course course = new Course(COURSE_ROWS);
  private final List<Point> away = new ArrayList<>();
  private final List<Movement> movements = new ArrayList<>();
  private final List<Movement> spikes = new ArrayList<>();
  private Point last;
  private Point before;
  private boolean moving;
  private double extremePa;
  private Point extreme;

  private MovementTracker(double slowestPaPerS, DoubleSupplier leastPa, boolean means) {
    this.slowestPaPerS = slowestPaPerS;
    this.leastPa = leastPa;
    this.means = means;
  }

  /** A tracker fed every row. */
  static MovementTracker ofRows() {
    return new MovementTracker(SLOWEST_PA_PER_S, () -> FLOOR_PA, false);
  }

  /**
   * A tracker fed means, which have no last digit.
   *
   * @param slowestPaPerS a movement that gets slower than this has ended
   * @param leastPa smallest change that counts
   */
  static MovementTracker ofMeans(double slowestPaPerS, DoubleSupplier leastPa) {
    return new MovementTracker(slowestPaPerS, leastPa, true);
  }

  /** Smallest change that counts, Pa. */
  double threshold() {
    double byNoise = Math.max(6 * noise.sigma(), means ? 0 : 2.5 * noise.step());
    return Math.max(leastPa.getAsDouble(), byNoise);
  }

  void add(Point point) {
    if (last != null && !moving && away.isEmpty()) {
      noise.add(point.paGauge() - last.paGauge());
    }
    if (moving) {
      goOn(point);
    } else {
      judge(point);
    }
    last = point;
  }

  /** The signal was silent: nothing before it tells what comes after. */
  void silence() {
    if (moving) {
      end();
    }
    flushAway();
    course.clear();
    last = null;
  }

  private void judge(Point point) {
    if (course.size() < LEAST_ROWS) {
      course.add(point);
      return;
    }
    double expected = course.at(point.ms());
    double off = point.paGauge() - expected;
    if (Math.abs(off) <= threshold() * course.reach(point.ms())) {
      if (!away.isEmpty()) {
        spike(expected);
      }
      course.add(point);
      return;
    }
    if (!away.isEmpty() && off * (away.get(0).paGauge() - course.at(away.get(0).ms())) < 0) {
      spike(expected);
    }
    away.add(point);
    if (away.size() >= SPIKE_ROWS || isLargeAndGoingOn()) {
      begin(point);
    }
  }

  /** Two rows away, the second further than the first, are no spike. */
  private boolean isLargeAndGoingOn() {
    if (away.size() < 2) {
      return false;
    }
    double first = away.get(0).paGauge() - course.at(away.get(0).ms());
    double second = away.get(1).paGauge() - course.at(away.get(1).ms());
    return Math.abs(second) > Math.abs(first) + threshold();
  }

  private void spike(double expected) {
    Point first = away.get(0);
    Point top = away.get(away.size() - 1);
    double sharp = Math.abs(top.paGauge() - expected) / threshold();
    spikes.add(new Movement(first.ms(), top.ms(), expected, top.paGauge(), top.kelvin(), sharp));
    away.clear();
  }

  private void begin(Point point) {
    moving = true;
    before = course.last();
    extreme = away.get(0);
    boolean down = away.get(0).paGauge() < level();
    for (Point each : away) {
      boolean further =
          down ? each.paGauge() < extreme.paGauge() : each.paGauge() > extreme.paGauge();
      extreme = further ? each : extreme;
    }
    extremePa = extreme.paGauge();
    if (extreme != point) {
      end();
      return;
    }
    away.clear();
  }

  private void goOn(Point point) {
    boolean down = extremePa < level();
    double further = down ? extremePa - point.paGauge() : point.paGauge() - extremePa;
    double seconds = Math.max(1, (point.ms() - extreme.ms()) / 1000.0);
    double least = Math.max(means ? 0 : noise.step(), means ? 0 : threshold() / 8);
    boolean quick = further > least && further / seconds > slowestPaPerS;
    if (quick) {
      extreme = point;
      extremePa = point.paGauge();
      return;
    }
    if (further < -threshold() / 2 || seconds > 20) {
      end();
      course.add(point);
    }
  }

  private void end() {
    double sharp = Math.abs(extremePa - level()) / threshold();
    if (sharp >= 1) {
      movements.add(
          new Movement(before.ms(), extreme.ms(), level(), extremePa, extreme.kelvin(), sharp));
    }
    moving = false;
    List<Point> later = new ArrayList<>(away);
    away.clear();
    course.clear();
    for (Point point : later) {
      if (point.ms() > extreme.ms()) {
        course.add(point);
      }
    }
  }

  private void flushAway() {
    if (away.size() > 1) {
      begin(away.get(away.size() - 1));
      if (moving) {
        end();
      }
    }
    away.clear();
  }

  private double level() {
    return course.isEmpty() ? before.paGauge() : course.at(course.last().ms());
  }

  List<Movement> movements() {
    return movements;
  }

  List<Movement> spikes() {
    return spikes;
  }

  NoiseGauge noise() {
    return noise;
  }
}

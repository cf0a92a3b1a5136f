package tunwarden.report.find;

import java.util.ArrayList;
import java.util.List;

/** Silences, judged by the usual distance between rows. */
final class GapTracker {
  private static final double LEAST_S = 60;
  private static final double TIMES_USUAL = 5;

  /**
   * One silence.
   *
   * @param before last row before it
   * @param after first row after it
   */
  record Gap(Point before, Point after) {}

  private final List<Gap> gaps = new ArrayList<>();
  private Point last;
  private double usualS = Double.NaN;

  /** Takes in a row; true when it ends a silence. */
  boolean add(Point point) {
    Point before = last;
    last = point;
    if (before == null) {
      return false;
    }
    double seconds = (point.ms() - before.ms()) / 1000.0;
    if (seconds > Math.max(LEAST_S, TIMES_USUAL * usualS) && !Double.isNaN(usualS)) {
      gaps.add(new Gap(before, point));
      return true;
    }
    double held = Double.isNaN(usualS) ? seconds : Math.min(seconds, 3 * usualS);
    usualS = Double.isNaN(usualS) ? seconds : usualS + (held - usualS) / 30;
    return false;
  }

  List<Gap> gaps() {
    return gaps;
  }

  /** Usual distance between rows, s; NaN while unknown. */
  double usualS() {
    return usualS;
  }
}

package tunwarden.screen.view;

import tunwarden.assess.History.Trace;
import tunwarden.units.Unit;

/**
 * The value scale of a chart, ending on round numbers of the unit shown, so that it stays put while
 * readings wander a little.
 *
 * @param low value at the lower edge, SI
 * @param high value at the upper edge, SI
 */
record ChartScale(double low, double high) {
  private static final int PARTS = 4;

  /** A scale that holds everything between two values, at least as long as given. */
  static ChartScale around(double least, double most, double leastSpan, Unit unit) {
    double middle = (least + most) / 2;
    double half = Math.max(most - least, leastSpan) / 2;
    double from = unit.fromSi(middle - half);
    double to = unit.fromSi(middle + half);
    double step = NiceSteps.step(to - from, PARTS);
    double low = unit.toSi(Math.floor(from / step + 1e-6) * step);
    double high = unit.toSi(Math.ceil(to / step - 1e-6) * step);
    return new ChartScale(low, high);
  }

  /** Least value of a trace; positive infinity when it is empty. */
  static double least(Trace trace) {
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < trace.columns(); i++) {
      least = trace.has(i) ? Math.min(least, trace.min()[i]) : least;
    }
    return least;
  }

  /** Greatest value of a trace; negative infinity when it is empty. */
  static double most(Trace trace) {
    double most = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < trace.columns(); i++) {
      most = trace.has(i) ? Math.max(most, trace.max()[i]) : most;
    }
    return most;
  }

  boolean holds(double value) {
    return value >= low && value <= high;
  }

  /** Row of a value among so many rows, the top being 0; may lie outside. */
  int row(double value, int rows) {
    double share = (high - value) / (high - low);
    return (int) Math.round(Math.max(-1, Math.min(2, share)) * (rows - 1));
  }
}

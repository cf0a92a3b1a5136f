package tunwarden.report.page;

import java.util.ArrayList;
import java.util.List;

/**
 * A straight scale from values to picture units.
 *
 * @param low value at {@code at0}
 * @param high value at {@code at1}
 * @param at0 where the low end is drawn
 * @param at1 where the high end is drawn
 */
record Scale(double low, double high, double at0, double at1) {
  private static final double[] NICE = {1, 2, 2.5, 5, 10};

  /** A scale over values, widened by a twentieth and never empty. */
  static Scale over(double least, double greatest, double at0, double at1) {
    double span = greatest - least;
    double room = span > 0 ? 0.05 * span : Math.max(0.5, 0.05 * Math.abs(least));
    return new Scale(least - room, greatest + room, at0, at1);
  }

  double at(double value) {
    return at0 + (value - low) / (high - low) * (at1 - at0);
  }

  boolean holds(double value) {
    return value >= low && value <= high;
  }

  /** Distance between marks so that there are at most that many. */
  double step(int most) {
    double rough = (high - low) / most;
    double power = Math.pow(10, Math.floor(Math.log10(rough)));
    for (double nice : NICE) {
      if (nice * power >= rough) {
        return nice * power;
      }
    }
    return 10 * power;
  }

  /** Values for at most that many marks. */
  List<Double> marks(int most) {
    double step = step(most);
    List<Double> marks = new ArrayList<>();
    for (long i = (long) Math.ceil(low / step); i * step <= high; i++) {
      marks.add(i * step);
    }
    return marks;
  }
}

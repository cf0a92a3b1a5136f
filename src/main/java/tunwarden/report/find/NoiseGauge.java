package tunwarden.report.find;

/**
 * How much a signal changes from row to row by itself: a slowly forgetting mean of the absolute
 * change, from which large changes are kept out, and the smallest change ever seen, which is the
 * step of its last digit.
 */
final class NoiseGauge {
  private static final double MEMORY_ROWS = 200;
  private static final double TO_SIGMA = Math.sqrt(Math.PI) / 2;

  private static final int MOST_STILL_ROWS = 12;

  private double meanChange;
  private double step = Double.POSITIVE_INFINITY;
  private long seen;
  private int still;

  /** Takes in one change between neighbouring rows. */
  void add(double change) {
    double size = Math.abs(change);
    still = size == 0 ? still + 1 : 0;
    if (still > MOST_STILL_ROWS) {
      return; // a signal that stands still says nothing about its noise
    }
    if (size > 1e-6 && size < step) {
      step = size;
    }
    double held = seen < 20 ? size : Math.min(size, 5 * (meanChange + step()));
    seen++;
    meanChange += (held - meanChange) / Math.min(seen, MEMORY_ROWS);
  }

  /** Standard deviation of one value about its course, in the unit of the signal. */
  double sigma() {
    return meanChange * TO_SIGMA;
  }

  /** The step of the last digit; 0 while unknown. */
  double step() {
    return Double.isInfinite(step) ? 0 : step;
  }
}

package tunwarden.estimate.bank;

/** A weighted sum of normal distributions of one quantity, of which quantiles are asked. */
final class Mixture {
  private static final int BISECTIONS = 28;
  private static final double REACH = 5;

  /** A quantile is found to this part of the whole reach, or this near in share. */
  private static final double CLOSE = 4e-9;

  private static final double NEAR = 1e-8;
  private static final int FLAT = 3;
  private static final int SLOW = 5;

  private final double[] weight;
  private final double[] mean;
  private final double[] sd;
  private int size;
  private double total;
  private double low = Double.POSITIVE_INFINITY;
  private double high = Double.NEGATIVE_INFINITY;

  Mixture(int capacity) {
    weight = new double[capacity];
    mean = new double[capacity];
    sd = new double[capacity];
  }

  void add(double newWeight, double newMean, double variance) {
    weight[size] = newWeight;
    mean[size] = newMean;
    sd[size] = Math.sqrt(Math.max(variance, 1e-12));
    low = Math.min(low, newMean - REACH * sd[size]);
    high = Math.max(high, newMean + REACH * sd[size]);
    total += newWeight;
    size++;
  }

  private double below(double x) {
    double sum = 0;
    for (int i = 0; i < size; i++) {
      sum += weight[i] * Normal.below((x - mean[i]) / sd[i]);
    }
    return sum / total;
  }

  /**
   * The value below which a share of the whole lies: bisected until the curve is no longer flat,
   * then regula falsi by the Illinois rule (an end that stays twice counts half), and bisection
   * wherever that is slow.
   */
  double quantile(double share) {
    double a = low;
    double b = high;
    double atA = -share;
    double atB = 1 - share;
    double least = (b - a) * CLOSE;
    int stayed = 0;
    for (int i = 0; i < BISECTIONS && b - a > least; i++) {
      boolean halve = i < FLAT || i % SLOW == 0;
      double x = halve ? 0.5 * (a + b) : b - atB * (b - a) / (atB - atA);
      double at = below(x) - share;
      if (Math.abs(at) < NEAR) {
        return x;
      }
      if (at < 0) {
        a = x;
        atA = at;
        atB = stayed > 0 ? 0.5 * atB : atB;
        stayed = 1;
      } else {
        b = x;
        atB = at;
        atA = stayed < 0 ? 0.5 * atA : atA;
        stayed = -1;
      }
    }
    return 0.5 * (a + b);
  }

  /** Half-width of the interval about a centre that holds a share of the whole. */
  double halfWidth(double centre, double share) {
    double a = 0;
    double b = high - low;
    for (int i = 0; i < BISECTIONS; i++) {
      double middle = 0.5 * (a + b);
      if (below(centre + middle) - below(centre - middle) < share) {
        a = middle;
      } else {
        b = middle;
      }
    }
    return b;
  }

  double mean() {
    double sum = 0;
    for (int i = 0; i < size; i++) {
      sum += weight[i] * mean[i];
    }
    return sum / total;
  }

  double variance() {
    double centre = mean();
    double sum = 0;
    for (int i = 0; i < size; i++) {
      double off = mean[i] - centre;
      sum += weight[i] * (sd[i] * sd[i] + off * off);
    }
    return sum / total;
  }
}

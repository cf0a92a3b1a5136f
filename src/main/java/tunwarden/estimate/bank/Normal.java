package tunwarden.estimate.bank;

import org.hipparchus.special.Erf;

/** The normal distribution function from a table, accurate to 2e-6. */
final class Normal {
  private static final double STEP = 1.0 / 256;
  private static final double REACH = 6;
  private static final double[] TABLE = new double[(int) (2 * REACH / STEP) + 2];

  static {
    for (int i = 0; i < TABLE.length; i++) {
      TABLE[i] = 0.5 * Erf.erfc(-(i * STEP - REACH) / Math.sqrt(2));
    }
  }

  private Normal() {}

  static double below(double z) {
    if (!(z > -REACH)) {
      return 0;
    }
    if (z >= REACH) {
      return 1;
    }
    double at = (z + REACH) / STEP;
    int i = (int) at;
    return TABLE[i] + (TABLE[i + 1] - TABLE[i]) * (at - i);
  }
}

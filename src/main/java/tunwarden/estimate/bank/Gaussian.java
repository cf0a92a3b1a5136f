package tunwarden.estimate.bank;

/**
 * Working copy of one filter: mean and covariance over the nine hidden quantities. Gas is counted
 * as partial pressure, so that a reading is linear in it and the uncertain fill enters only where
 * masses are balanced.
 */
final class Gaussian {
  /** CO2 in the headspace: partial pressure at the liquid's temperature, Pa. */
  static final int GAS = 0;

  /** CO2 in the liquid, kg/m3. */
  static final int LIQUID = 1;

  /**
   * CO2 being made in the liquid (positive) or leaking from the headspace (negative), per second.
   */
  static final int SOURCE = 2;

  /** Logarithm of true over described headspace. */
  static final int FILL = 3;

  /** Logarithm of true over assumed solubility. */
  static final int RELATION = 4;

  /** Constant error of gauge and barometer together, Pa. */
  static final int BIAS = 5;

  /** Headspace gas temperature over liquid temperature, minus one. */
  static final int HEAT = 6;

  /** Air and other gas that does not dissolve: partial pressure, Pa. */
  static final int AIR = 7;

  /** Logarithm of the true transfer coefficient over the one the filter is centred on. */
  static final int PACE = 8;

  static final int STATES = 9;

  /** Doubles a packed filter takes: means, then the lower triangle. */
  static final int STRIDE = STATES + STATES * (STATES + 1) / 2;

  final double[] mean = new double[STATES];
  final double[] cov = new double[STATES * STATES];
  private final double[] first = new double[STATES];
  private final double[] second = new double[STATES];

  void load(double[] from, int offset) {
    System.arraycopy(from, offset, mean, 0, STATES);
    int k = offset + STATES;
    for (int i = 0; i < STATES; i++) {
      for (int j = 0; j <= i; j++) {
        double value = from[k++];
        cov[i * STATES + j] = value;
        cov[j * STATES + i] = value;
      }
    }
  }

  void store(double[] to, int offset) {
    System.arraycopy(mean, 0, to, offset, STATES);
    int k = offset + STATES;
    for (int i = 0; i < STATES; i++) {
      for (int j = 0; j <= i; j++) {
        to[k++] = cov[i * STATES + j];
      }
    }
  }

  void clear() {
    java.util.Arrays.fill(mean, 0);
    java.util.Arrays.fill(cov, 0);
  }

  double variance(int i) {
    return cov[i * STATES + i];
  }

  void addVariance(int i, double value) {
    cov[i * STATES + i] += value;
  }

  /** Adds a common disturbance to gas and liquid. */
  void addWander(double gas, double liquid, double variance) {
    cov[0] += gas * gas * variance;
    cov[1] += gas * liquid * variance;
    cov[STATES] += gas * liquid * variance;
    cov[STATES + 1] += liquid * liquid * variance;
  }

  /** Multiplies the spread of one quantity; the mean is left alone. */
  void scaleSpread(int i, double factor) {
    for (int j = 0; j < STATES; j++) {
      cov[i * STATES + j] *= factor;
    }
    for (int j = 0; j < STATES; j++) {
      cov[j * STATES + i] *= factor;
    }
  }

  /** Keeps one quantity, mean and spread, within a size. */
  void limit(int i, double most) {
    mean[i] = Math.max(-most, Math.min(most, mean[i]));
    double sd = Math.sqrt(variance(i));
    if (sd > most) {
      scaleSpread(i, most / sd);
    }
  }

  /** Fixes one quantity at a value. */
  void pin(int i, double value) {
    mean[i] = value;
    scaleSpread(i, 0);
  }

  /** Replaces the spreads of gas and liquid by those of two linear combinations of everything. */
  void mixRows(double[] gasRow, double[] liquidRow) {
    java.util.Arrays.fill(first, 0);
    java.util.Arrays.fill(second, 0);
    for (int z = 0; z < STATES; z++) {
      double g = gasRow[z];
      double l = liquidRow[z];
      if (g == 0 && l == 0) {
        continue;
      }
      int row = z * STATES;
      for (int j = 0; j < STATES; j++) {
        double p = cov[row + j];
        first[j] += g * p;
        second[j] += l * p;
      }
    }
    double gg = 0;
    double gl = 0;
    double ll = 0;
    for (int z = 0; z < STATES; z++) {
      gg += gasRow[z] * first[z];
      gl += liquidRow[z] * first[z];
      ll += liquidRow[z] * second[z];
    }
    for (int j = LIQUID + 1; j < STATES; j++) {
      cov[j] = first[j];
      cov[j * STATES] = first[j];
      cov[STATES + j] = second[j];
      cov[j * STATES + LIQUID] = second[j];
    }
    cov[0] = gg;
    cov[1] = gl;
    cov[STATES] = gl;
    cov[STATES + 1] = ll;
  }

  /** Variance of a linear combination. */
  double varianceOf(double[] row) {
    java.util.Arrays.fill(first, 0);
    for (int z = 0; z < STATES; z++) {
      double h = row[z];
      if (h != 0) {
        int k = z * STATES;
        for (int i = 0; i < STATES; i++) {
          first[i] += h * cov[k + i];
        }
      }
    }
    double sum = 0;
    for (int i = 0; i < STATES; i++) {
      sum += first[i] * row[i];
    }
    return sum;
  }

  /**
   * Conditions on a measurement of the combination that {@link #varianceOf} was last asked for.
   *
   * @param innovation measured minus expected
   * @param total variance of the measurement and the combination together
   * @param considers what is only considered, not learnt
   */
  void condition(double innovation, double total, Considered considers) {
    for (int i = 0; i < STATES; i++) {
      boolean fixed = considers.has(i);
      double gain = first[i] / total;
      if (!fixed) {
        mean[i] += gain * innovation;
      }
      for (int j = 0; j <= i; j++) {
        if (fixed && considers.has(j)) {
          continue;
        }
        double value = cov[i * STATES + j] - gain * first[j];
        cov[i * STATES + j] = value;
        cov[j * STATES + i] = value;
      }
    }
  }

  /**
   * Quantities that widen the belief but are not learnt (Schmidt's filter, NASA TR R-135, 1962):
   * pressures repeat too often for their small model errors to be trusted with these.
   */
  enum Considered {
    /** All are learnt. */
    NOTHING,
    /** Fill, relation and bias. */
    CONSTANTS,
    /** The pace of transfer too. */
    AND_PACE;

    boolean has(int i) {
      boolean constant = i == FILL || i == RELATION || i == BIAS;
      return this != NOTHING && (constant || this == AND_PACE && i == PACE);
    }
  }
}

package tunwarden.report.hindsight;

import java.util.Arrays;
import org.hipparchus.special.Erf;

/**
 * What is believed while one manner rules, as a normal distribution: the CO2 in the headspace, what
 * the liquid holds and held at first, left-over air, and gas being made.
 */
final class Manner {
  /** CO2 pressure in the headspace as the gauge shows it, Pa absolute. */
  static final int GAS = 0;

  /** CO2 in the liquid, kg/m³. */
  static final int LIQUID = 1;

  /** What the liquid held at the first step, kg/m³. */
  static final int START = 2;

  /** Air beyond what was stated, Pa at the first step. */
  static final int AIR = 3;

  /** Gas being made, kg/m³ in a step. */
  static final int MADE = 4;

  static final int STATES = 5;

  private static final double UNKNOWN_PA2 = 1e10;

  final double[] mean = new double[STATES];
  final double[][] cov = new double[STATES][STATES];
  private final double[] row = new double[STATES];
  private final double[] other = new double[STATES];

  void set(double[] means, double[] variances) {
    for (int i = 0; i < STATES; i++) {
      mean[i] = means[i];
      Arrays.fill(cov[i], 0);
      cov[i][i] = variances[i];
    }
    cov[LIQUID][START] = variances[START];
    cov[START][LIQUID] = variances[START];
  }

  void copy(Manner of) {
    System.arraycopy(of.mean, 0, mean, 0, STATES);
    for (int i = 0; i < STATES; i++) {
      System.arraycopy(of.cov[i], 0, cov[i], 0, STATES);
    }
  }

  /** The pressure may be anything now. */
  void loseGas(double pa) {
    mean[GAS] = pa;
    for (int i = 0; i < STATES; i++) {
      cov[GAS][i] = 0;
      cov[i][GAS] = 0;
    }
    cov[GAS][GAS] = UNKNOWN_PA2;
  }

  /**
   * Shut: what liquid and headspace hold together stays, and they come to rest; exact while the
   * temperature stays.
   *
   * @param slope dissolved at rest for every pascal of CO2, kg/(m³ Pa)
   * @param room CO2 in the headspace for every pascal, kg/(m³ Pa)
   * @param heated pressure over the one before, by temperature alone
   * @param times kLa times the length of the step
   */
  void shut(double slope, double room, double heated, double times) {
    double sum = room + slope;
    double fromLiquid = -Math.expm1(-times * sum / room) / sum;
    double fromGas = 1 - slope * fromLiquid;
    double kept = 1 - room * fromLiquid;
    set(row, fromGas * heated, fromLiquid, 0, fromLiquid);
    set(other, room * (1 - fromGas) * heated, kept, 0, kept);
    step(0, 0);
  }

  /**
   * Pinned or moving: the pressure is not the liquid's doing; the liquid follows it.
   *
   * @param heldBy by how much CO2 rises when the total stays, but for the air
   * @param airGone share of the first air by which CO2 rises as well
   */
  void follow(double slope, double heldBy, double airGone, double times) {
    double done = -Math.expm1(-times);
    set(row, 1, 0, airGone, 0);
    set(other, slope * done, 1 - done, slope * done * airGone, 1);
    step(heldBy, slope * done * heldBy);
  }

  private static void set(double[] row, double gas, double liquid, double air, double made) {
    row[GAS] = gas;
    row[LIQUID] = liquid;
    row[START] = 0;
    row[AIR] = air;
    row[MADE] = made;
  }

  /** New gas and new liquid are the two rows times the state. */
  private void step(double addGas, double addLiquid) {
    double gas = addGas + dot(row, mean);
    double liquid = addLiquid + dot(other, mean);
    mean[GAS] = gas;
    mean[LIQUID] = liquid;
    double gasGas = 0;
    double gasLiquid = 0;
    double liquidLiquid = 0;
    double[] withGas = new double[STATES];
    double[] withLiquid = new double[STATES];
    for (int i = 0; i < STATES; i++) {
      withGas[i] = dot(row, cov[i]);
      withLiquid[i] = dot(other, cov[i]);
    }
    for (int i = 0; i < STATES; i++) {
      gasGas += row[i] * withGas[i];
      gasLiquid += other[i] * withGas[i];
      liquidLiquid += other[i] * withLiquid[i];
    }
    for (int i = START; i < STATES; i++) {
      cov[GAS][i] = withGas[i];
      cov[i][GAS] = withGas[i];
      cov[LIQUID][i] = withLiquid[i];
      cov[i][LIQUID] = withLiquid[i];
    }
    cov[GAS][GAS] = gasGas;
    cov[GAS][LIQUID] = gasLiquid;
    cov[LIQUID][GAS] = gasLiquid;
    cov[LIQUID][LIQUID] = liquidLiquid;
  }

  private static double dot(double[] a, double[] b) {
    return a[0] * b[0] + a[1] * b[1] + a[2] * b[2] + a[3] * b[3] + a[4] * b[4];
  }

  void wander(double addGas, double addLiquid) {
    cov[GAS][GAS] += addGas;
    cov[LIQUID][LIQUID] += addLiquid;
  }

  /**
   * Takes in a dry pressure, which is the CO2 and a share of the first air.
   *
   * @return its log-density but for a constant
   */
  double see(double value, double airShare, double noise) {
    double s = noise;
    for (int i = 0; i < STATES; i++) {
      row[i] = cov[i][GAS] + airShare * cov[i][AIR];
    }
    s += row[GAS] + airShare * row[AIR];
    double off = value - mean[GAS] - airShare * mean[AIR];
    learn(row, off, s);
    return -(off * off / s + Math.log(s)) / 2;
  }

  /** Takes in a laboratory value of what the liquid holds. */
  double seeLiquid(double value, double noise) {
    double s = cov[LIQUID][LIQUID] + noise;
    double off = value - mean[LIQUID];
    System.arraycopy(cov[LIQUID], 0, row, 0, STATES);
    learn(row, off, s);
    return -(off * off / s + Math.log(s)) / 2;
  }

  private void learn(double[] with, double off, double s) {
    for (int i = 0; i < STATES; i++) {
      mean[i] += with[i] / s * off;
      for (int j = 0; j <= i; j++) {
        double value = cov[i][j] - with[i] * with[j] / s;
        cov[i][j] = value;
        cov[j][i] = value;
      }
    }
  }

  /**
   * Takes in that no liquid holds less than nothing: the normal is cut off at zero and replaced by
   * the one with the moments of what is left.
   *
   * @return how likely that was, never quite zero
   */
  double keepStartAboveZero() {
    double sigma = Math.sqrt(cov[START][START]);
    double edge = Math.max(-8, mean[START] / sigma);
    double above = 0.5 * Erf.erfc(-edge / Math.sqrt(2));
    double hazard = Math.exp(-edge * edge / 2) / Math.sqrt(2 * Math.PI) / above;
    double shrink = hazard * (hazard + edge);
    double[] with = cov[START].clone();
    for (int i = 0; i < STATES; i++) {
      mean[i] += with[i] / sigma * hazard;
      for (int j = 0; j < STATES; j++) {
        cov[i][j] -= with[i] * with[j] / (sigma * sigma) * shrink;
      }
    }
    return above;
  }

  /** Becomes the one normal with the mean and covariance of a mixture. */
  void blend(Manner[] of, double[] share) {
    for (int i = 0; i < STATES; i++) {
      mean[i] = share[0] * of[0].mean[i] + share[1] * of[1].mean[i] + share[2] * of[2].mean[i];
    }
    for (int i = 0; i < STATES; i++) {
      for (int j = 0; j <= i; j++) {
        double sum = 0;
        for (int m = 0; m < of.length; m++) {
          double offI = of[m].mean[i] - mean[i];
          double offJ = of[m].mean[j] - mean[j];
          sum += share[m] * (of[m].cov[i][j] + offI * offJ);
        }
        cov[i][j] = sum;
        cov[j][i] = sum;
      }
    }
  }
}

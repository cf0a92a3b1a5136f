package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Grid.CLOSED;
import static tunwarden.estimate.bank.Grid.HELD;
import static tunwarden.estimate.bank.Grid.LEAKING;
import static tunwarden.estimate.bank.Grid.MAKING;
import static tunwarden.estimate.bank.Grid.MODES;
import static tunwarden.estimate.bank.Grid.STILL;

import tunwarden.physics.liquid.LiquidKind;
import tunwarden.vessel.Accuracy;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Vessel;

/**
 * What is believed before anything was seen. The numbers are judgement, kept broad on purpose; the
 * transfer coefficient follows the spread of published kL (see the estimator's page).
 */
final class Prior {
  private static final double STILL_KL = 5e-6;
  private static final double MAKING_KL = 5e-5;
  private static final double KL_LN_SD = 1.6;
  private static final double EVEN_SHARE = 0.8;

  /**
   * Chance of each class of air left behind: small enough not to widen the interval of a vessel
   * that shows no sign of air, large enough to be found in a few hours of changing temperature.
   */
  private static final double[] AIR_SHARE = {0.96, 0.0134, 0.0133, 0.0133};

  /** Chance that an untold vessel is held from outside when it is first seen. */
  private static final double HELD_UNTOLD = 0.05;

  private static final double MAKING_FIRST = 0.02;

  /** No drink follows a relation better than this, whatever the relation claims. */
  private static final double LEAST_RELATION_U = 0.013;

  private static final double SOLUBILITY_PER_K = 0.03;
  private static final double FIRST_READING_PA = 200;

  /** A fermenting drink is seldom further above rest than this share of it. */
  static final double MOST_SURPLUS = 0.6;

  private static final double SURPLUS_SD = 0.03;
  private static final double NEAR_ATMOSPHERE_PA = 8_000;
  private static final double DAY_S = 86_400;

  /** Middle of the rate at which gas is made, kg/m3/s: 2 g/L a day; 4 is brisk. */
  static final double MADE = 2.4e-5;

  static final double MADE_SD = 2.4e-5;

  /** Middle of a leak, kg/m3/s: some 10 mbar an hour in a usual vessel. */
  static final double LEAK = -0.8e-5;

  static final double LEAK_SD = 0.8e-5;

  private final Medium medium;
  private final Vessel vessel;

  Prior(Medium medium) {
    this.medium = medium;
    this.vessel = medium.vessel();
  }

  /** Weights of a fresh bank. */
  double[] weights(double dryPa, double paGauge) {
    double[] modes = modes();
    double depth = 1.1 * Math.cbrt(Math.max(vessel.fillM3(), 1e-3));
    double[] weights = new double[Grid.FILTERS];
    for (int f = 0; f < Grid.FILTERS; f++) {
      int mode = Grid.modeOf(f);
      double kl = mode == MAKING ? MAKING_KL : STILL_KL;
      double air = Grid.airPa(Grid.airOf(f), vessel.contents().airPaAbsolute());
      double fits = air < 0.9 * dryPa ? AIR_SHARE[Grid.airOf(f)] : 0;
      weights[f] = modes[mode] * fits * transferShare(Grid.transferPerS(f), kl / depth);
    }
    return Bank.normalized(weights);
  }

  private static double transferShare(double transfer, double centre) {
    double z = Math.log(transfer / centre) / KL_LN_SD;
    return EVEN_SHARE / Grid.TRANSFERS + (1 - EVEN_SHARE) * 0.43 * Math.exp(-0.5 * z * z);
  }

  private double[] modes() {
    double making = MAKING_FIRST * makingShare();
    double leaking = 0.002;
    double held =
        switch (vessel.closure()) {
          case SEALED -> 0.002;
          case SUPPLY, SPUNDING, OPEN -> 0.96;
          default -> HELD_UNTOLD;
        };
    double[] modes = new double[MODES];
    modes[HELD] = held;
    modes[MAKING] = (1 - held) * making;
    modes[LEAKING] = (1 - held) * leaking;
    modes[CLOSED] = (1 - held) * 0.005;
    modes[STILL] = (1 - held) * (0.995 - making - leaking);
    return modes;
  }

  /** A drink that should not ferment may do so all the same. */
  private double makingShare() {
    return ferments() ? 1 : 0.02;
  }

  boolean ferments() {
    LiquidKind kind = vessel.liquid().kind();
    return kind != LiquidKind.WATER
        && kind != LiquidKind.MINERAL_WATER
        && kind != LiquidKind.SOFT_DRINK;
  }

  /** Fills one filter's Gaussian from the first reading. */
  void begin(Gaussian x, int filter, Passage way, double dryPa, double paGauge) {
    x.clear();
    Accuracy accuracy = vessel.accuracy();
    int air = Grid.airOf(filter);
    double stated = vessel.contents().airPaAbsolute();
    double airPa = Grid.airPa(air, stated) + (1 - medium.co2Share()) * dryPa;
    double gasPa = Math.max(dryPa - airPa, 0.02 * dryPa);
    double headU = 0.5 * accuracy.fillU95M3() / headspaceM3();
    double relationU =
        Math.hypot(
            Math.max(medium.relationU(), LEAST_RELATION_U),
            SOLUBILITY_PER_K * 0.5 * accuracy.temperatureU95K());
    double biasU = 0.5 * Math.hypot(accuracy.pressureU95Pa(), vessel.site().ambientU95Pa());
    x.addVariance(Gaussian.FILL, square(Math.min(headU, 0.5)));
    x.addVariance(Gaussian.RELATION, square(relationU));
    x.addVariance(Gaussian.BIAS, square(biasU));
    x.addVariance(Gaussian.PACE, square(Grid.TRANSFER_LN_SD));
    x.mean[Gaussian.AIR] = airPa;
    x.addVariance(Gaussian.AIR, square(Grid.airSdPa(air, stated)));
    x.mean[Gaussian.GAS] = gasPa;
    gasFromReading(x);
    liquidFromGas(x, way, Grid.modeOf(filter), paGauge);
    beginSource(x, Grid.modeOf(filter));
    if (Grid.modeOf(filter) == HELD && ferments()) {
      double bound = 0.12 * x.mean[Gaussian.GAS] * way.solubility() * Grid.transferPerS(filter);
      x.mean[Gaussian.SOURCE] = Math.min(0.4 * bound, MADE);
      x.addVariance(Gaussian.SOURCE, square(Math.min(MADE_SD, bound)));
    }
  }

  /** The rate of making or leaking as it is believed when that begins. */
  static void beginSource(Gaussian x, int mode) {
    x.pin(Gaussian.SOURCE, mode == MAKING ? MADE : mode == LEAKING ? LEAK : 0);
    if (mode == MAKING) {
      x.addVariance(Gaussian.SOURCE, MADE_SD * MADE_SD);
    } else if (mode == LEAKING) {
      x.addVariance(Gaussian.SOURCE, LEAK_SD * LEAK_SD);
    }
  }

  /**
   * A drink that makes gas under a held pressure is above rest by what it takes to drive the gas
   * out as fast as it is made.
   */
  static void aboveRest(Gaussian x, double solubility, double transfer) {
    double slope = solubility * Math.exp(x.mean[Gaussian.RELATION]);
    double rest = slope * x.mean[Gaussian.GAS];
    double most = MOST_SURPLUS * rest * transfer;
    x.pin(Gaussian.SOURCE, Math.min(MADE, 0.4 * most));
    x.addVariance(Gaussian.SOURCE, square(Math.min(MADE_SD, 0.4 * most)));
    double surplus = x.mean[Gaussian.SOURCE] / transfer;
    double[] gas = new double[Gaussian.STATES];
    double[] liquid = new double[Gaussian.STATES];
    gas[Gaussian.GAS] = 1;
    liquid[Gaussian.GAS] = slope;
    liquid[Gaussian.RELATION] = rest;
    liquid[Gaussian.SOURCE] = 1 / transfer;
    liquid[Gaussian.PACE] = -surplus;
    x.pin(Gaussian.PACE, 0);
    x.addVariance(Gaussian.PACE, square(Grid.TRANSFER_LN_SD));
    x.mixRows(gas, liquid);
    x.mean[Gaussian.LIQUID] = rest + surplus;
    x.addVariance(Gaussian.LIQUID, square(SURPLUS_SD * rest));
  }

  /** The first reading fixes the sum of CO2, air and bias. */
  private static void gasFromReading(Gaussian x) {
    double[] gas = new double[Gaussian.STATES];
    double[] liquid = new double[Gaussian.STATES];
    gas[Gaussian.GAS] = 1;
    gas[Gaussian.AIR] = -1;
    gas[Gaussian.BIAS] = -1;
    liquid[Gaussian.LIQUID] = 1;
    x.addVariance(Gaussian.GAS, square(FIRST_READING_PA));
    x.mixRows(gas, liquid);
  }

  private void liquidFromGas(Gaussian x, Passage way, int mode, double paGauge) {
    double atRest = Motion.atRest(x, way);
    double[] share = shareOfRest(mode, paGauge);
    double[] gas = new double[Gaussian.STATES];
    double[] liquid = new double[Gaussian.STATES];
    gas[Gaussian.GAS] = 1;
    liquid[Gaussian.GAS] = share[0] * atRest / x.mean[Gaussian.GAS];
    liquid[Gaussian.RELATION] = share[0] * atRest;
    x.mixRows(gas, liquid);
    x.mean[Gaussian.LIQUID] = share[0] * atRest;
    x.addVariance(Gaussian.LIQUID, square(share[1] * atRest));
  }

  /** Mean and spread of dissolved over equilibrium content. */
  private double[] shareOfRest(int mode, double paGauge) {
    if (mode == STILL || mode == LEAKING) {
      return new double[] {1, 0.004};
    }
    if (mode == MAKING) {
      return new double[] {1.06, 0.1};
    }
    return switch (vessel.closure()) {
      case SPUNDING -> new double[] {1.05, 0.2};
      case SUPPLY -> new double[] {0.62, 0.33};
      case OPEN -> new double[] {1.2, 0.5};
      default -> {
        if (paGauge < NEAR_ATMOSPHERE_PA) {
          yield new double[] {1.2, 0.5};
        }
        yield ferments() ? new double[] {0.75, 0.37} : new double[] {0.6, 0.33};
      }
    };
  }

  private double headspaceM3() {
    return Math.max(vessel.volumeM3() - vessel.fillM3(), 1e-3 * vessel.volumeM3());
  }

  /** Chance of leaving each mode for each other within a time; rows add to one. */
  double[][] transitions(double seconds) {
    double slow = Math.min(0.2, seconds / (5 * DAY_S));
    double toHeld = vessel.closure() == Closure.SEALED ? 0.02 * slow : slow;
    double toMaking = 0.3 * slow * makingShare();
    return rows(
        new double[] {0, toHeld, 0.1 * toMaking, 0.05 * slow, 0},
        new double[] {0, 0, 6 * toMaking, 0, 3 * slow},
        new double[] {slow, toHeld, 0, 0, 0},
        new double[] {slow, toHeld, 0, 0, 0},
        new double[] {0.1 * slow, toHeld, toMaking, 0, 0});
  }

  /** The same after somebody has worked a valve. */
  double[][] afterValve() {
    double making = 0.05 * makingShare();
    double held = vessel.closure() == Closure.SEALED ? 0.05 : 0.38;
    return rows(
        new double[] {0, held, 0.4 * making, 0.001, 0},
        new double[] {0, 0, making, 0, 0.6},
        new double[] {0.05, held, 0, 0, 0},
        new double[] {0.5, held, 0, 0, 0},
        new double[] {0.05, held, 0.4 * making, 0, 0});
  }

  /** The same when no filter explains the readings any more. */
  double[][] whenNothingFits() {
    double making = 0.05 * makingShare();
    double closed = vessel.closure() == Closure.SEALED ? 0.02 : 0.15;
    return rows(
        new double[] {0, 0.02, making, 0.02, 0},
        new double[] {0, 0, 6 * making, 0, closed},
        new double[] {0.05, 0.05, 0, 0, 0.05},
        new double[] {0.05, 0.05, 0, 0, 0},
        new double[] {0, 0.02, making, 0, 0});
  }

  private static double[][] rows(double[]... rows) {
    for (int i = 0; i < rows.length; i++) {
      double out = 0;
      for (double chance : rows[i]) {
        out += chance;
      }
      rows[i][i] = 1 - out;
    }
    return rows;
  }

  private static double square(double a) {
    return a * a;
  }
}

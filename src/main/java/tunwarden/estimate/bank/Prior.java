package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Grid.HELD;
import static tunwarden.estimate.bank.Grid.MODES;
import static tunwarden.estimate.bank.Grid.SOURCE;
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
  private static final double EVEN_SHARE = 0.5;
  private static final double[] AIR_SHARE = {0.94, 0.02, 0.02, 0.02};
  private static final double SOLUBILITY_PER_K = 0.03;
  private static final double NEAR_ATMOSPHERE_PA = 8_000;
  private static final double DAY_S = 86_400;

  /** Spread of the rate at which gas is made, kg/m3/s: a brisk fermentation is 4 g/L a day. */
  static final double SOURCE_SD = 4e-5;

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
      double kl = mode == SOURCE ? MAKING_KL : STILL_KL;
      double air = Grid.airPa(Grid.airOf(f), vessel.contents().airPaAbsolute());
      double fits = air < 0.9 * dryPa ? AIR_SHARE[Grid.airOf(f)] : 0;
      weights[f] = modes[mode] * fits * transferShare(Grid.transferPerS(f), kl / depth);
    }
    return Bank.normalized(weights);
  }

  private static double transferShare(double transfer, double centre) {
    double z = Math.log(transfer / centre) / KL_LN_SD;
    return EVEN_SHARE / Grid.TRANSFERS + (1 - EVEN_SHARE) * 0.287 * Math.exp(-0.5 * z * z);
  }

  private double[] modes() {
    double source = ferments() ? 0.1 : 0.02;
    double held =
        switch (vessel.closure()) {
          case SEALED -> 0.02;
          case SUPPLY, SPUNDING, OPEN -> 0.96;
          default -> 0.3;
        };
    double[] modes = new double[MODES];
    modes[HELD] = held;
    modes[SOURCE] = (1 - held) * source;
    modes[STILL] = (1 - held) * (1 - source);
    return modes;
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
    double k = way.middle();
    double headU = 0.5 * accuracy.fillU95M3() / headspaceM3(k);
    double relationU =
        Math.hypot(medium.relationU(), SOLUBILITY_PER_K * 0.5 * accuracy.temperatureU95K());
    double biasU = 0.5 * Math.hypot(accuracy.pressureU95Pa(), vessel.site().ambientU95Pa());
    x.addVariance(Gaussian.FILL, square(Math.min(headU, 0.5)));
    x.addVariance(Gaussian.RELATION, square(relationU));
    x.addVariance(Gaussian.BIAS, square(biasU));
    x.mean[Gaussian.AIR] = airPa * k;
    x.addVariance(Gaussian.AIR, square(Grid.airSdPa(air, stated) * k));
    x.mean[Gaussian.GAS] = gasPa * k;
    gasFromReading(x, k, gasPa + airPa);
    liquidFromGas(x, way, Grid.modeOf(filter), paGauge);
    if (Grid.modeOf(filter) == SOURCE) {
      x.addVariance(Gaussian.SOURCE, square(SOURCE_SD));
    } else if (Grid.modeOf(filter) == HELD && ferments()) {
      double bound = 0.1 * x.mean[Gaussian.LIQUID] * Grid.transferPerS(filter);
      x.addVariance(Gaussian.SOURCE, square(Math.min(SOURCE_SD, bound)));
    }
  }

  /** The first reading fixes the sum of CO2 and air, up to bias and fill. */
  private void gasFromReading(Gaussian x, double k, double totalPa) {
    double[] gas = new double[Gaussian.STATES];
    double[] liquid = new double[Gaussian.STATES];
    gas[Gaussian.GAS] = 1;
    gas[Gaussian.AIR] = -1;
    gas[Gaussian.BIAS] = -k;
    gas[Gaussian.FILL] = totalPa * k;
    liquid[Gaussian.LIQUID] = 1;
    x.addVariance(Gaussian.GAS, square(k * 100));
    x.mixRows(gas, liquid);
  }

  private void liquidFromGas(Gaussian x, Passage way, int mode, double paGauge) {
    double atRest = Motion.atRest(x, way);
    double[] share = shareOfRest(mode, paGauge);
    double slope = atRest / x.mean[Gaussian.GAS];
    double[] gas = new double[Gaussian.STATES];
    double[] liquid = new double[Gaussian.STATES];
    gas[Gaussian.GAS] = 1;
    liquid[Gaussian.GAS] = share[0] * slope;
    liquid[Gaussian.RELATION] = share[0] * atRest;
    liquid[Gaussian.FILL] = -share[0] * atRest;
    x.mixRows(gas, liquid);
    x.mean[Gaussian.LIQUID] = share[0] * atRest;
    x.addVariance(Gaussian.LIQUID, square(share[1] * atRest));
  }

  /** Mean and spread of dissolved over equilibrium content. */
  private double[] shareOfRest(int mode, double paGauge) {
    if (mode == STILL) {
      return new double[] {1, 0.015};
    }
    if (mode == SOURCE) {
      return new double[] {1.1, 0.15};
    }
    return switch (vessel.closure()) {
      case SPUNDING -> new double[] {1.05, 0.2};
      case SUPPLY -> new double[] {0.62, 0.33};
      case OPEN -> new double[] {1.2, 0.5};
      default -> paGauge < NEAR_ATMOSPHERE_PA ? new double[] {1.2, 0.5} : new double[] {0.62, 0.33};
    };
  }

  private double headspaceM3(double k) {
    return Math.max(vessel.volumeM3() - vessel.fillM3(), 1e-3 * vessel.volumeM3());
  }

  /** Chance of leaving each mode for each other within a time; rows add to one. */
  double[][] transitions(double seconds) {
    double slow = seconds / (5 * DAY_S);
    boolean told = vessel.closure() == Closure.SEALED;
    double toHeld = told ? 0.1 * slow : slow;
    double toSource = ferments() ? 0.5 * slow : 0.1 * slow;
    return rows(
        new double[] {0, toHeld, toSource},
        new double[] {slow, 0, ferments() ? slow : 0.1 * slow},
        new double[] {slow, toHeld, 0});
  }

  /** The same after somebody has worked a valve. */
  double[][] afterValve() {
    if (vessel.closure() == Closure.SEALED) {
      return rows(
          new double[] {0, 0.05, 0.02}, new double[] {0.8, 0, 0.05}, new double[] {0.05, 0.05, 0});
    }
    return rows(
        new double[] {0, 0.38, 0.02}, new double[] {0.55, 0, 0.05}, new double[] {0.05, 0.35, 0});
  }

  private static double[][] rows(double[]... rows) {
    for (int i = 0; i < rows.length; i++) {
      double out = 0;
      for (int j = 0; j < rows.length; j++) {
        rows[i][j] = Math.min(rows[i][j], 0.3 + 0.3 * (i == j ? 0 : 1));
        out += rows[i][j];
      }
      rows[i][i] = Math.max(1 - out, 0);
    }
    return rows;
  }

  private static double square(double a) {
    return a * a;
  }
}

package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Gaussian.AIR;
import static tunwarden.estimate.bank.Gaussian.FILL;
import static tunwarden.estimate.bank.Gaussian.GAS;
import static tunwarden.estimate.bank.Gaussian.HEAT;
import static tunwarden.estimate.bank.Gaussian.LIQUID;
import static tunwarden.estimate.bank.Gaussian.RELATION;
import static tunwarden.estimate.bank.Gaussian.SOURCE;

import java.util.Arrays;

/**
 * How one filter moves in time. First-order mass transfer with the solubility fixed over the step
 * has a closed solution for any step length; only the products with the uncertain fill and relation
 * are linearised.
 */
final class Motion {
  private static final double SMALL = 1e-4;

  private final double[] gasRow = new double[Gaussian.STATES];
  private final double[] liquidRow = new double[Gaussian.STATES];

  /** Nothing passes the valves: the sum of liquid and headspace changes by the source alone. */
  void sealed(Gaussian x, double transfer, Passage way) {
    double dt = way.seconds();
    double beta = way.solubility() / way.middle() * Math.exp(x.mean[RELATION] - x.mean[FILL]);
    double lambda = transfer * (1 + beta);
    double share = beta / (1 + beta);
    double gone = gone(lambda * dt);
    double left = 1 - gone;
    double all = x.mean[GAS] + x.mean[LIQUID];
    double apart = x.mean[LIQUID] - share * all;
    double perSource = sourceIntoLiquid(x.mean[SOURCE] >= 0, transfer * beta, lambda, dt);
    double liquid = share * all + apart * left + x.mean[SOURCE] * perSource;
    double byBeta = beta * (all / ((1 + beta) * (1 + beta)) * gone - apart * transfer * dt * left);
    clearRows();
    liquidRow[GAS] = share * gone;
    liquidRow[LIQUID] = share * gone + left;
    liquidRow[SOURCE] = perSource;
    liquidRow[RELATION] = byBeta;
    liquidRow[FILL] = -byBeta;
    gasRow[GAS] = 1 - liquidRow[GAS];
    gasRow[LIQUID] = 1 - liquidRow[LIQUID];
    gasRow[SOURCE] = dt - perSource;
    gasRow[RELATION] = -byBeta;
    gasRow[FILL] = byBeta;
    x.mean[GAS] = all + x.mean[SOURCE] * dt - liquid;
    x.mean[LIQUID] = liquid;
    x.mixRows(gasRow, liquidRow);
  }

  /** The pressure is pinned: the liquid relaxes towards it, the headspace follows the pin. */
  void held(Gaussian x, double transfer, Passage way) {
    double gone = gone(transfer * way.seconds());
    double atRest = atRest(x, way);
    double perSource = transfer > 0 ? gone / transfer : way.seconds();
    double liquid =
        x.mean[LIQUID] + (atRest - x.mean[LIQUID]) * gone + Math.max(0, x.mean[SOURCE]) * perSource;
    double released = x.mean[LIQUID] - liquid + Math.max(0, x.mean[SOURCE]) * way.seconds();
    clearRows();
    liquidRow[GAS] = gone * atRest / Math.max(x.mean[GAS], 1e-9);
    liquidRow[LIQUID] = 1 - gone;
    liquidRow[SOURCE] = x.mean[SOURCE] > 0 ? perSource : 0;
    liquidRow[RELATION] = gone * atRest;
    liquidRow[FILL] = -gone * atRest;
    gasRow[GAS] = 1;
    x.mean[LIQUID] = liquid;
    x.mixRows(gasRow, liquidRow);
    stretch(x, way.after() / way.before(), way.supplyShare());
    exchange(x, released, way.supplyShare());
  }

  /** Scales what the headspace holds; growth is fed from the supply, shrinkage takes all alike. */
  void stretch(Gaussian x, double factor, double supplyShare) {
    if (factor <= 1) {
      x.mean[GAS] *= factor;
      x.mean[AIR] *= factor;
      x.scaleSpread(GAS, factor);
      x.scaleSpread(AIR, factor);
      return;
    }
    double grown = factor - 1;
    double inert = 1 - supplyShare;
    double added = grown * (x.mean[GAS] + x.mean[AIR]);
    x.mean[GAS] += supplyShare * added;
    x.mean[AIR] += inert * added;
    clearRows();
    gasRow[GAS] = 1 + supplyShare * grown;
    gasRow[AIR] = supplyShare * grown;
    liquidRow[LIQUID] = 1;
    x.mixRows(gasRow, liquidRow);
    x.scaleSpread(AIR, 1 + inert * grown);
  }

  /**
   * Liquid gives gas to a pinned headspace and sweeps air out, or takes gas and draws supply in.
   */
  private void exchange(Gaussian x, double released, double supplyShare) {
    double held = x.mean[GAS] + x.mean[AIR];
    double swept;
    if (released >= 0) {
      swept = x.mean[AIR] * gone(released / Math.max(held, 1e-9));
      x.scaleSpread(AIR, x.mean[AIR] > 0 ? 1 - swept / x.mean[AIR] : 1);
    } else {
      swept = Math.max((1 - supplyShare) * released, -0.5 * x.mean[GAS]);
    }
    x.mean[AIR] -= swept;
    x.mean[GAS] += swept;
  }

  /** Cold or hot gas comes back to the liquid's temperature; how fast is known within a factor. */
  static void soothe(Gaussian x, double seconds, double memoryS) {
    double left = Math.exp(-seconds / memoryS);
    double doubt = 0.5 * x.mean[HEAT] * (1 - left);
    x.mean[HEAT] *= left;
    x.scaleSpread(HEAT, left);
    x.addVariance(HEAT, doubt * doubt);
  }

  /** What the liquid would hold at rest under the filter's own CO2 pressure. */
  static double atRest(Gaussian x, Passage way) {
    return way.solubility()
        / way.middle()
        * x.mean[GAS]
        * Math.exp(x.mean[RELATION] - x.mean[FILL]);
  }

  /** 1 - exp(-u), accurate for small u. */
  static double gone(double u) {
    return u < SMALL ? u * (1 - 0.5 * u) : 1 - Math.exp(-u);
  }

  /** Liquid gained per unit of a constant source, by the closed solution. */
  private static double sourceIntoLiquid(
      boolean madeInLiquid, double uptake, double lambda, double dt) {
    double u = lambda * dt;
    double gone = gone(u);
    double ramp = u < SMALL ? 0.5 * dt * dt : (dt - gone / lambda) / lambda;
    double direct = u < SMALL ? dt * (1 - 0.5 * u) : gone / lambda;
    return uptake * ramp + (madeInLiquid ? direct : 0);
  }

  private void clearRows() {
    Arrays.fill(gasRow, 0);
    Arrays.fill(liquidRow, 0);
  }
}

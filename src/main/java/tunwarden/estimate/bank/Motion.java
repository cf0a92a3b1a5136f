package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Gaussian.AIR;
import static tunwarden.estimate.bank.Gaussian.FILL;
import static tunwarden.estimate.bank.Gaussian.GAS;
import static tunwarden.estimate.bank.Gaussian.HEAT;
import static tunwarden.estimate.bank.Gaussian.LIQUID;
import static tunwarden.estimate.bank.Gaussian.PACE;
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
  void sealed(Gaussian x, double centre, Passage way) {
    scale(x, way.before() / way.after());
    double transfer = centre * Math.exp(x.mean[PACE]);
    double dt = way.seconds();
    double k = way.after() * Math.exp(x.mean[FILL]);
    double beta = way.solubility() / k * Math.exp(x.mean[RELATION]);
    double lambda = transfer * (1 + beta);
    double share = beta / (1 + beta);
    double gone = gone(lambda * dt);
    double left = 1 - gone;
    double before = x.mean[LIQUID];
    double all = before + k * x.mean[GAS];
    double apart = before - share * all;
    double source = x.mean[SOURCE];
    double perSource = sourceIntoLiquid(source >= 0, transfer * beta, lambda, dt);
    double liquid = before - apart * gone + source * perSource;
    double byBeta = beta * (all / ((1 + beta) * (1 + beta)) * gone - apart * transfer * dt * left);
    double gas = x.mean[GAS] + (before - liquid + source * dt) / k;
    clearRows();
    liquidRow[GAS] = share * gone * k;
    liquidRow[LIQUID] = share * gone + left;
    liquidRow[SOURCE] = perSource;
    liquidRow[RELATION] = byBeta;
    liquidRow[FILL] = share * gone * k * x.mean[GAS] - byBeta;
    liquidRow[PACE] = -apart * lambda * dt * left;
    gasRow[GAS] = 1 - liquidRow[GAS] / k;
    gasRow[LIQUID] = (1 - liquidRow[LIQUID]) / k;
    gasRow[SOURCE] = (dt - perSource) / k;
    gasRow[RELATION] = -byBeta / k;
    gasRow[FILL] = x.mean[GAS] - gas - liquidRow[FILL] / k;
    gasRow[PACE] = -liquidRow[PACE] / k;
    x.mean[GAS] = gas;
    x.mean[LIQUID] = liquid;
    x.mixRows(gasRow, liquidRow);
  }

  /** The pressure is pinned: the liquid relaxes towards it, whatever gas that takes. */
  void held(Gaussian x, double centre, Passage way) {
    double transfer = centre * Math.exp(x.mean[PACE]);
    double dt = way.seconds();
    double gone = gone(transfer * dt);
    double atRest = atRest(x, way);
    double made = Math.max(0, x.mean[SOURCE]);
    double perSource = gone / transfer;
    double before = x.mean[LIQUID];
    double liquid = before + (atRest - before) * gone + made * perSource;
    clearRows();
    liquidRow[GAS] = gone * way.solubility() * Math.exp(x.mean[RELATION]);
    liquidRow[LIQUID] = 1 - gone;
    liquidRow[SOURCE] = made > 0 ? perSource : 0;
    liquidRow[RELATION] = gone * atRest;
    liquidRow[PACE] = (atRest - before) * transfer * dt * (1 - gone);
    gasRow[GAS] = 1;
    x.mean[LIQUID] = liquid;
    x.mixRows(gasRow, liquidRow);
    double k = way.after() * Math.exp(x.mean[FILL]);
    double intoGas = (before - liquid + made * dt) / k;
    double total = x.mean[GAS] + x.mean[AIR];
    exchange(x, intoGas + total * (way.before() / way.after() - 1), way.supplyShare());
  }

  /** Every species alike. */
  static void scale(Gaussian x, double factor) {
    x.mean[GAS] *= factor;
    x.mean[AIR] *= factor;
    x.scaleSpread(GAS, factor);
    x.scaleSpread(AIR, factor);
  }

  /** Gas enters (Pa) and an equal amount leaves a pinned headspace, or the supply makes it up. */
  private void exchange(Gaussian x, double surplus, double supplyShare) {
    double total = x.mean[GAS] + x.mean[AIR];
    double inert;
    if (surplus >= 0) {
      double kept = Math.exp(-surplus / total);
      inert = x.mean[AIR] * kept;
      clearRows();
      gasRow[GAS] = 1;
      gasRow[AIR] = 1 - kept;
      liquidRow[LIQUID] = 1;
      x.mixRows(gasRow, liquidRow);
      x.scaleSpread(AIR, kept);
    } else {
      inert = x.mean[AIR] - (1 - supplyShare) * Math.max(surplus, -0.5 * total);
    }
    x.mean[GAS] = total - inert;
    x.mean[AIR] = inert;
  }

  /** Gas drawn from the supply, Pa. */
  static void charge(Gaussian x, double added, double supplyShare) {
    x.mean[GAS] += supplyShare * added;
    x.mean[AIR] += (1 - supplyShare) * added;
  }

  /** Cold or hot gas comes back to the liquid's temperature; how fast is known within a factor. */
  static void soothe(Gaussian x, double seconds, double memoryS) {
    double left = Math.exp(-seconds / memoryS);
    double doubt = 0.6 * x.mean[HEAT];
    x.mean[HEAT] *= left;
    x.scaleSpread(HEAT, left);
    x.addVariance(HEAT, doubt * doubt * (1 - left));
  }

  /** What the liquid would hold at rest under the filter's own CO2 pressure. */
  static double atRest(Gaussian x, Passage way) {
    return way.solubility() * x.mean[GAS] * Math.exp(x.mean[RELATION]);
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

package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Gaussian.AIR;
import static tunwarden.estimate.bank.Gaussian.BIAS;
import static tunwarden.estimate.bank.Gaussian.GAS;
import static tunwarden.estimate.bank.Gaussian.LIQUID;
import static tunwarden.estimate.bank.Gaussian.PACE;
import static tunwarden.estimate.bank.Gaussian.RELATION;
import static tunwarden.estimate.bank.Gaussian.SOURCE;

/** Noise that stands for everything the model leaves out. */
final class Disturbance {
  private static final double HOUR_S = 3600;
  private static final double DAY_S = 86_400;

  /** Slow change of a pinned level or of a nearly tight headspace: 1.5 mbar in an hour. */
  private static final double LEVEL_PA2_PER_S = 150.0 * 150 / HOUR_S;

  /** Weather and drift of the gauge: 4 mbar in a day. */
  private static final double BIAS_PA2_PER_S = 400.0 * 400 / DAY_S;

  /** What gas law, solubility and vapour are wrong by over a kelvin, relative. */
  private static final double SWING_SHARE = 3e-4;

  /** What the swelling of the liquid is wrong by over a kelvin, relative to its volume. */
  private static final double SWELLING_SHARE = 5e-5;

  /** The error over a swing is taken as one draw in so many kelvin. */
  private static final double SWING_SPAN_K = 4;

  /** Pa per kg/m3 of gas in the headspace, roughly: R T over the molar mass of CO2. */
  private static final double PA_PER_KG_PER_M3 = 5.3e4;

  private static final double RELATION_PER_K = 2e-6;
  private static final double LIQUID_SHARE = 0.002;
  private static final double SOURCE_SHARE = 0.3;
  private static final double SOURCE_LEAST = 0.05 * Prior.MADE_SD;
  private static final double PACE_PER_S = 0.2 * 0.2 / DAY_S;
  private static final double COLD_MEMORY_S = 180;

  private Disturbance() {}

  /**
   * Widens a filter by what may have happened unseen. The level of a sealed vessel wanders exactly
   * as that of a pinned one, liquid and headspace together, so that a constant reading speaks for
   * neither.
   *
   * @param x the filter
   * @param mode how its headspace is connected
   * @param way the time that has passed
   * @param swingK how far the liquid has warmed or cooled meanwhile, K
   */
  static void add(Gaussian x, int mode, Passage way, double swingK) {
    double dt = way.seconds();
    double wander = LEVEL_PA2_PER_S * dt + swing(x, way) * swingK;
    x.addWander(1, mode == Grid.HELD ? 0 : way.solubility(), wander);
    x.addVariance(BIAS, BIAS_PA2_PER_S * dt);
    x.addVariance(RELATION, RELATION_PER_K * swingK);
    double liquid = LIQUID_SHARE * x.mean[LIQUID];
    x.addVariance(LIQUID, liquid * liquid * dt / DAY_S);
    x.addVariance(PACE, PACE_PER_S * dt);
    Motion.soothe(x, dt, COLD_MEMORY_S);
    if (mode != Grid.STILL) {
      double step = SOURCE_SHARE * Math.max(Math.abs(x.mean[SOURCE]), SOURCE_LEAST);
      x.addVariance(SOURCE, 2 * step * step * dt / DAY_S);
    }
  }

  /** Pressure error of the model over a swing of temperature, Pa squared per kelvin. */
  private static double swing(Gaussian x, Passage way) {
    double liquidOverGas = 1 / (PA_PER_KG_PER_M3 * way.after());
    double share = SWING_SHARE + SWELLING_SHARE * liquidOverGas;
    double pa = share * (x.mean[GAS] + x.mean[AIR]);
    return pa * pa * SWING_SPAN_K;
  }
}

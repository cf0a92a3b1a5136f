package tunwarden.forecast.relief;

import tunwarden.physics.flow.IsentropicOrifice;

/**
 * Flow area for a gas flow: A = W / (Kd · flux). API Std 520 Part I and ISO 4126-7 print the same
 * nozzle with their own unit constants (C = 0.03948 ψ(k) and 3.948 ψ(k)); below the critical ratio
 * API's F2 and ISO's Kb are its subcritical branch. Kb = Kc = 1: conventional valve, no disk.
 */
public final class ReliefSizing {
  private ReliefSizing() {}

  /**
   * Area, m².
   *
   * @param kgPerS flow wanted, kg/s
   * @param k ratio of heat capacities
   * @param zrt Z R T / M at the inlet, J/kg
   * @param fromPaAbsolute relieving pressure, Pa absolute
   * @param toPaAbsolute back pressure, Pa absolute
   * @param dischargeCoefficient certified or preliminary coefficient
   */
  public static double areaM2(
      double kgPerS,
      double k,
      double zrt,
      double fromPaAbsolute,
      double toPaAbsolute,
      double dischargeCoefficient) {
    double flux = IsentropicOrifice.flux(k, zrt, fromPaAbsolute, toPaAbsolute);
    return kgPerS / (dischargeCoefficient * flux);
  }
}

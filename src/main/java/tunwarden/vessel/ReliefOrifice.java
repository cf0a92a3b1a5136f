package tunwarden.vessel;

/**
 * The flow path of a relief valve or vent.
 *
 * @param diameterM orifice diameter, m
 * @param dischargeCoefficient certified or assumed coefficient of discharge, 0..1
 */
public record ReliefOrifice(double diameterM, double dischargeCoefficient) {
  /** Flow area, m². */
  public double areaM2() {
    return Math.PI / 4 * diameterM * diameterM;
  }
}

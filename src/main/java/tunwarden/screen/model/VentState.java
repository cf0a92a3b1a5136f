package tunwarden.screen.model;

import java.util.OptionalDouble;
import tunwarden.vessel.ReliefOrifice;

/**
 * The vent being tried on the bench; nothing here moves a valve.
 *
 * @param targetPaGauge pressure to vent to, Pa gauge; empty until chosen
 * @param orificeM diameter of the vent path, m
 * @param dischargeCoefficient of the vent path, 0..1
 */
public record VentState(
    OptionalDouble targetPaGauge, double orificeM, double dischargeCoefficient) {
  /** A plain 10 mm hole to begin with; the person puts in their own. */
  public static final VentState USUAL = new VentState(OptionalDouble.empty(), 0.010, 0.6);

  private static final double LEAST_ORIFICE_M = 0.001;
  private static final double MOST_ORIFICE_M = 0.1;

  /** The chosen target, or half the present gauge pressure until one is chosen. */
  public double targetOr(double nowPaGauge) {
    double usual = Math.max(0, nowPaGauge / 2);
    return Math.min(targetPaGauge.orElse(usual), Math.max(0, nowPaGauge));
  }

  /** What the gas would leave through. */
  public ReliefOrifice path() {
    return new ReliefOrifice(orificeM, dischargeCoefficient);
  }

  public VentState withTarget(double paGauge) {
    return new VentState(OptionalDouble.of(paGauge), orificeM, dischargeCoefficient);
  }

  /** The same with another vent path, held within what the bench can reckon with. */
  public VentState withOrifice(double diameterM) {
    double kept = Math.max(LEAST_ORIFICE_M, Math.min(MOST_ORIFICE_M, diameterM));
    return new VentState(targetPaGauge, kept, dischargeCoefficient);
  }
}

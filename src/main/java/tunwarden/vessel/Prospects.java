package tunwarden.vessel;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a person may tell about a vessel so that more of its future can be worked out. All of it is
 * optional, and nothing is forecast from what was not told.
 *
 * @param ferment a fermentation that goes on
 * @param target carbonation wanted at the end
 * @param supply the gas supply it is connected to
 * @param warmingS time constant of warming with cooling lost, s: 63 % of the way to the ambient
 * @param fireM2 outer surface that is wetted inside, up to 7.6 m above a fire, m²
 */
public record Prospects(
    Optional<Ferment> ferment,
    Optional<Target> target,
    Optional<Supply> supply,
    OptionalDouble warmingS,
    OptionalDouble fireM2) {
  /** Nothing told. */
  public static final Prospects NONE =
      new Prospects(
          Optional.empty(),
          Optional.empty(),
          Optional.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty());

  /**
   * A fermentation, by apparent extract in degrees Plato.
   *
   * @param originalPlato before it began, if known
   * @param nowPlato when last measured by hand; a gravity instrument's newer reading goes first
   * @param finalPlato when it will have ended
   * @param dropPlatoPerDay how fast it falls, degrees Plato a day, if known
   */
  public record Ferment(
      OptionalDouble originalPlato,
      OptionalDouble nowPlato,
      double finalPlato,
      OptionalDouble dropPlatoPerDay) {}

  /**
   * Carbonation wanted.
   *
   * @param kgPerM3 dissolved CO2, kg/m³
   * @param atK temperature the vessel is brought to, shut, K; empty: as it is
   */
  public record Target(double kgPerM3, OptionalDouble atK) {}

  /**
   * A gas supply whose regulator may fail open. Of seat and flow at most one is told; without
   * either, only how far the pressure would go is known.
   *
   * @param paGauge pressure behind the regulator, Pa gauge
   * @param seat its widest opening
   * @param kgPerS its largest flow, kg/s
   */
  public record Supply(double paGauge, Optional<ReliefOrifice> seat, OptionalDouble kgPerS) {}
}

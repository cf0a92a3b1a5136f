package tunwarden.vessel;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;

/**
 * One vessel as described by the user.
 *
 * @param id short name, unique in the cellar, safe as a file name
 * @param title what is in it, in the user's words; may be empty
 * @param volumeM3 gross volume, m³
 * @param fillM3 liquid volume, m³, at the temperature it was filled (taken as the first seen)
 * @param contents liquid and gas
 * @param closure how the headspace is connected
 * @param limits relief, vessel and vacuum limits
 * @param orifice relief valve's flow path, if described
 * @param site where it stands
 * @param warmToK what it would warm to with cooling lost, K, if stated
 * @param accuracy of the instruments and the fill
 * @param prospects what was told so that more can be forecast
 */
public record Vessel(
    String id,
    String title,
    double volumeM3,
    double fillM3,
    Contents contents,
    Closure closure,
    Limits limits,
    Optional<ReliefOrifice> orifice,
    Site site,
    OptionalDouble warmToK,
    Accuracy accuracy,
    Prospects prospects) {

  /**
   * Liquid and gas of a vessel.
   *
   * @param liquid the drink
   * @param gas what the headspace is purged or supplied with
   * @param airPaAbsolute air left in the headspace, as absolute partial pressure, Pa
   */
  public record Contents(Liquid liquid, GasMix gas, double airPaAbsolute) {}

  /** Refuses what no vessel can be. */
  public Vessel {
    Objects.requireNonNull(id, "id");
    if (!(volumeM3 > 0) || !(fillM3 >= 0) || !(fillM3 <= volumeM3)) {
      throw new IllegalArgumentException(
          id + ": fill of " + fillM3 + " m3 does not fit a volume of " + volumeM3 + " m3");
    }
  }

  public Liquid liquid() {
    return contents.liquid();
  }

  public GasMix gas() {
    return contents.gas();
  }

  /** Headspace as a share of the gross volume, 0..1, before any expansion of the liquid. */
  public double ullage() {
    return 1 - fillM3 / volumeM3;
  }

  /** A vessel with everything optional left at its default. */
  public static Vessel plain(String id, double volumeM3, double fillM3, Liquid liquid) {
    return new Vessel(
        id,
        "",
        volumeM3,
        fillM3,
        new Contents(liquid, GasMix.CO2, 0),
        Closure.INFER,
        Limits.NONE,
        Optional.empty(),
        Site.SEA_LEVEL,
        OptionalDouble.empty(),
        Accuracy.usual(volumeM3),
        Prospects.NONE);
  }

  /** The same vessel, differently connected. */
  public Vessel withClosure(Closure other) {
    return new Vessel(
        id, title, volumeM3, fillM3, contents, other, limits, orifice, site, warmToK, accuracy,
        prospects);
  }

  /** The same vessel with other limits. */
  public Vessel withLimits(Limits other) {
    return new Vessel(
        id, title, volumeM3, fillM3, contents, closure, other, orifice, site, warmToK, accuracy,
        prospects);
  }

  /** The same vessel with another atmosphere around it. */
  public Vessel withSite(Site other) {
    return new Vessel(
        id, title, volumeM3, fillM3, contents, closure, limits, orifice, other, warmToK, accuracy,
        prospects);
  }

  /** The same vessel with more told of it. */
  public Vessel withProspects(Prospects other) {
    return new Vessel(
        id, title, volumeM3, fillM3, contents, closure, limits, orifice, site, warmToK, accuracy,
        other);
  }
}

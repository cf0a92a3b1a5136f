package tunwarden.config;

import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.vessel.Prospects;
import tunwarden.vessel.Prospects.Ferment;
import tunwarden.vessel.Prospects.Supply;
import tunwarden.vessel.Prospects.Target;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.Site;

/** What a vessel's table may tell so that more can be forecast. */
final class ProspectsReader {
  private static final double USUAL_KD = 0.6;

  private ProspectsReader() {}

  /**
   * Reads a vessel's optional tables.
   *
   * @param vessel the vessel's table
   * @param site where gauge pressures count from
   * @param volumeM3 gross volume, m³
   */
  static Prospects read(Section vessel, Site site, double volumeM3) {
    OptionalDouble warming = vessel.quantity("time-constant", ProspectsReader::aboveZeroS);
    if (warming.isPresent() && !vessel.has("ambient")) {
      vessel.problem("time-constant", "write with it what the vessel warms to: ambient = \"24 C\"");
    }
    return new Prospects(
        ferment(vessel), target(vessel), supply(vessel, site, volumeM3), warming, fire(vessel));
  }

  private static Optional<Ferment> ferment(Section vessel) {
    if (!vessel.has("ferment")) {
      return Optional.empty();
    }
    Section ferment = vessel.section("ferment");
    OptionalDouble original = ferment.quantity("original-gravity", Texts::gravityPlato);
    OptionalDouble now = ferment.quantity("gravity", Texts::gravityPlato);
    OptionalDouble end = ferment.quantity("final-gravity", Texts::gravityPlato);
    OptionalDouble drop = ferment.quantity("extract-drop", ProspectsReader::dropPlato);
    ferment.require("final-gravity", "\"1.010 SG\"");
    double least = end.orElse(Double.NEGATIVE_INFINITY);
    if (now.orElse(least) < least) {
      ferment.problem("final-gravity", "it is above the present gravity; exchange them");
    } else if (original.orElse(Double.MAX_VALUE) < now.orElse(least)) {
      ferment.problem("original-gravity", "it is below the later ones; check both");
    }
    ferment.close();
    return Optional.of(new Ferment(original, now, end.orElse(0), drop));
  }

  private static Optional<Target> target(Section vessel) {
    if (!vessel.has("target")) {
      return Optional.empty();
    }
    Section target = vessel.section("target");
    OptionalDouble content = target.quantity("carbonation", ProspectsReader::contentKgPerM3);
    OptionalDouble at = target.quantity("temperature", Texts::kelvin);
    target.require("carbonation", "\"5.0 g/L\"");
    target.close();
    return Optional.of(new Target(content.orElse(1), at));
  }

  private static Optional<Supply> supply(Section vessel, Site site, double volumeM3) {
    if (!vessel.has("supply")) {
      return Optional.empty();
    }
    Section supply = vessel.section("supply");
    OptionalDouble pressure =
        supply.quantity(
            "pressure",
            text -> aboveZero(text, Pressure.parse(text).gaugePa(site.ambientPaAbsolute())));
    OptionalDouble orifice = supply.quantity("orifice", Texts::diameterM);
    OptionalDouble kd = supply.quantity("kd", Texts::coefficient);
    OptionalDouble flow =
        supply.quantity("flow", text -> aboveZero(text, Quantities.parse(text, Kind.MASS_FLOW)));
    supply.require("pressure", "\"8 bar\"");
    if (supply.has("orifice") && supply.has("flow")) {
      supply.problem("flow", "write orifice or flow, not both");
    }
    if (supply.has("kd") && !supply.has("orifice")) {
      supply.problem("kd", "it belongs to an orifice, as orifice = \"3 mm\"");
    }
    VesselReader.refuseWide(supply, orifice, volumeM3);
    supply.close();
    Optional<ReliefOrifice> seat =
        orifice.isPresent()
            ? Optional.of(new ReliefOrifice(orifice.getAsDouble(), kd.orElse(USUAL_KD)))
            : Optional.empty();
    return Optional.of(new Supply(pressure.orElse(1), seat, flow));
  }

  /** The surface a fire would heat; without a described valve nothing is reckoned from it. */
  private static OptionalDouble fire(Section vessel) {
    OptionalDouble area =
        vessel.quantity("fire-area", text -> aboveZero(text, Quantities.parse(text, Kind.AREA)));
    if (area.isPresent() && !vessel.has("relief-valve")) {
      vessel.problem("fire-area", "it is held against a [relief-valve]; describe that too");
    }
    return area;
  }

  private static double aboveZeroS(String text) {
    return aboveZero(text, Quantities.parse(text, Kind.DURATION));
  }

  private static double contentKgPerM3(String text) {
    return aboveZero(text, Quantities.parse(text, Kind.GAS_CONTENT));
  }

  private static double dropPlato(String text) {
    return aboveZero(text, Texts.gravityPlato(text));
  }

  private static double aboveZero(String text, double value) {
    if (!(value > 0)) {
      throw new BadQuantityException("'" + text + "' is not above zero");
    }
    return value;
  }
}

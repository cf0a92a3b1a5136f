package tunwarden.config;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.forecast.vent.OrificeFit;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.vessel.Accuracy;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.Site;
import tunwarden.vessel.Vessel;

/** One {@code [vessel.…]} table, its readings apart. */
final class VesselReader {
  private static final double STAND_IN_M3 = 1;

  private final Section section;
  private final Site site;

  VesselReader(Section section, Site site) {
    this.section = section;
    this.site = site;
  }

  /**
   * The vessel. Where something is wrong or missing the problem is recorded and a stand-in takes
   * its place; the caller must not use the vessel then.
   *
   * @param readings what its instruments are worth
   */
  Vessel read(String id, List<Instrument> readings) {
    String title = section.text("title").orElse("");
    double volume = volume();
    double fill = section.quantity("fill", Texts.of(Kind.VOLUME)).orElse(0);
    section.require("fill", "\"1800 L\"");
    if (fill > volume) {
      section.problem("fill", "the fill is larger than the volume; check both");
      fill = volume;
    }
    Vessel.Contents contents =
        new Vessel.Contents(
            liquid(),
            section.parsed("gas", GasMix::parse).orElse(GasMix.CO2),
            section.quantity("air", Texts::absolutePa).orElse(0));
    return new Vessel(
        id,
        title,
        volume,
        fill,
        contents,
        section.parsed("closure", Texts::closure).orElse(Closure.INFER),
        limits(),
        orifice(volume),
        site,
        section.quantity("ambient", Texts::kelvin),
        accuracy(volume, readings),
        ProspectsReader.read(section, site, volume));
  }

  private double volume() {
    OptionalDouble volume = section.quantity("volume", Texts.of(Kind.VOLUME));
    section.require("volume", "\"2000 L\"");
    if (volume.orElse(STAND_IN_M3) == 0) {
      section.problem("volume", "a vessel has a volume above zero");
    }
    // With no usable volume any fill must pass, so that only one problem is told.
    double stated = volume.orElse(Double.MAX_VALUE);
    return stated == 0 ? Double.MAX_VALUE : stated;
  }

  private Liquid liquid() {
    section.require("liquid", "{ kind = \"beer\", abv = \"5.2 %\" }");
    if (!section.has("liquid")) {
      return Liquid.WATER;
    }
    if (section.isText("liquid")) {
      return section.parsed("liquid", Texts::liquidKind).map(Liquid::of).orElse(Liquid.WATER);
    }
    Section liquid = section.section("liquid");
    LiquidKind kind = liquid.parsed("kind", Texts::liquidKind).orElse(LiquidKind.WATER);
    liquid.require("kind", "\"beer\"");
    Liquid stated =
        new Liquid(
            kind,
            liquid.quantity("abv", Texts::share),
            liquid.quantity("extract", Texts.of(Kind.EXTRACT)),
            liquid.quantity("sugar", Texts.of(Kind.GAS_CONTENT)),
            liquid.parsed("method", Texts::beerMethod).orElse(BeerMethod.EUROPEAN),
            salts(liquid));
    if (liquid.has("method") && kind != LiquidKind.BEER) {
      liquid.problem("method", "only beer has a choice of method; leave it out");
    }
    liquid.close();
    return stated;
  }

  private static Map<String, Double> salts(Section liquid) {
    Map<String, Double> salts = new HashMap<>();
    Section section = liquid.section("salts");
    for (String salt : section.names()) {
      section
          .parsed(salt, text -> Quantities.parse(text, Kind.MOLARITY))
          .ifPresent(concentration -> salts.put(salt, concentration));
    }
    return salts;
  }

  private Limits limits() {
    Section limits = section.section("limits");
    StatedLimits stated =
        new StatedLimits(
            gauge(limits, "relief"),
            limits.parsed("tolerance", StatedLimits.Tolerance::parse),
            gauge(limits, "vessel"),
            gauge(limits, "vacuum"));
    if (section.has("limits")) {
      limits.require("relief", "\"1.5 bar\"");
    } else {
      section.require("limits", "{ relief = \"1.5 bar\" }");
    }
    limits.close();
    try {
      return stated.check();
    } catch (StatedLimits.Contradiction fault) {
      // A tolerance without a setting means that the setting was missing or wrong: already told.
      if (stated.reliefPaGauge().isPresent() || !fault.key().equals("tolerance")) {
        limits.problem(fault.key(), fault.getMessage());
      }
      return Limits.NONE;
    }
  }

  private OptionalDouble gauge(Section limits, String key) {
    return limits.quantity(key, text -> Pressure.parse(text).gaugePa(site.ambientPaAbsolute()));
  }

  private Optional<ReliefOrifice> orifice(double volume) {
    if (!section.has("relief-valve")) {
      return Optional.empty();
    }
    Section valve = section.section("relief-valve");
    OptionalDouble diameter = valve.quantity("orifice", Texts::diameterM);
    OptionalDouble discharge = valve.quantity("kd", Texts::coefficient);
    valve.require("orifice", "\"15 mm\"");
    valve.require("kd", "\"0.6\"");
    refuseWide(valve, diameter, volume);
    valve.close();
    return Optional.of(new ReliefOrifice(diameter.orElse(0), discharge.orElse(0)));
  }

  /** An opening that does not go into the vessel. */
  static void refuseWide(Section section, OptionalDouble diameterM, double volumeM3) {
    if (diameterM.isPresent()) {
      OrificeFit.fault(diameterM.getAsDouble(), volumeM3)
          .ifPresent(sentence -> section.problem("orifice", sentence));
    }
  }

  private Accuracy accuracy(double volume, List<Instrument> readings) {
    Accuracy usual = Accuracy.usual(volume);
    return new Accuracy(
        Instrument.accuracy(readings, Kind.PRESSURE).orElse(usual.pressureU95Pa()),
        Instrument.accuracy(readings, Kind.TEMPERATURE).orElse(usual.temperatureU95K()),
        section.quantity("fill-accuracy", Texts.of(Kind.VOLUME)).orElse(usual.fillU95M3()));
  }
}

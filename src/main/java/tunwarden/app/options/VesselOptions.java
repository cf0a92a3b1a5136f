package tunwarden.app.options;

import java.util.Optional;
import java.util.OptionalDouble;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.physics.gas.GasMix;
import tunwarden.units.BadInputException;
import tunwarden.units.Pressure;
import tunwarden.vessel.Accuracy;
import tunwarden.vessel.Closure;
import tunwarden.vessel.Limits;
import tunwarden.vessel.Prospects;
import tunwarden.vessel.Vessel;

/** A vessel described on the command line, in place of a cellar file. */
public final class VesselOptions {
  /** The headspace share that stands in where an answer does not depend on the volume. */
  private static final double NOMINAL_FILL = 0.9;

  @Option(
      names = "--volume",
      paramLabel = "VOLUME",
      converter = Convert.ToCubicMetres.class,
      description = "Gross volume, as '2000 L'.")
  private Double volumeM3;

  @Option(
      names = "--fill",
      paramLabel = "VOLUME",
      converter = Convert.ToCubicMetres.class,
      description = "Liquid in it, as '1800 L'.")
  private Double fillM3;

  @Mixin private LiquidOptions liquid = new LiquidOptions();

  @Option(
      names = "--gas",
      paramLabel = "GAS",
      converter = Convert.ToGas.class,
      description = "Headspace gas, as CO2 or 70N2/30CO2. Default: CO2.")
  private GasMix gas;

  @Option(
      names = "--air",
      paramLabel = "PRESSURE",
      converter = Convert.ToAbsolutePa.class,
      description = "Air left in the headspace, as absolute partial pressure. Default: none.")
  private Double airPaAbsolute;

  @Option(
      names = "--closure",
      paramLabel = "WORD",
      converter = Convert.ToClosure.class,
      description = "sealed, supply, spunding, open or infer. Default: infer.")
  private Closure closure;

  @Mixin private LimitOptions limits = new LimitOptions();
  @Mixin private SiteOptions site = new SiteOptions();
  @Mixin private InstrumentOptions instruments = new InstrumentOptions();

  /** Whether a vessel is described at all. */
  public boolean areGiven() {
    return volumeM3 != null || fillM3 != null || liquid.areGiven() || limits.areGiven();
  }

  /** Whether volume or fill are given. */
  public boolean areSized() {
    return volumeM3 != null || fillM3 != null;
  }

  /**
   * The vessel as described.
   *
   * @param id the name it is to have
   * @throws BadInputException when volume or fill is missing or they do not fit each other
   */
  public Vessel vessel(String id) {
    require("--volume", volumeM3);
    require("--fill", fillM3);
    if (!(volumeM3 > 0)) {
      throw new BadInputException("--volume: a vessel needs a volume above zero");
    }
    if (fillM3 > volumeM3) {
      throw new BadInputException("--fill: the fill is larger than the volume; check both");
    }
    return build(id, "", volumeM3, fillM3, instruments.accuracy(volumeM3));
  }

  /**
   * The vessel as described; where the answer does not depend on them, volume and fill may be left
   * out and a nominal cubic metre stands in.
   */
  public Vessel vesselOfAnySize(String id) {
    if (volumeM3 != null || fillM3 != null) {
      return vessel(id);
    }
    return build(id, "size not stated", 1, NOMINAL_FILL, instruments.accuracy(1));
  }

  /**
   * Refuses to go on without a named drink.
   *
   * @throws BadInputException when none is named
   */
  public void requireLiquid() {
    liquid.requireKind();
  }

  /** Whether the drink is named; if not, it is water. */
  public boolean liquidIsNamed() {
    return liquid.isNamed();
  }

  /** A pressure in Pa gauge at the site described. */
  public double gaugePa(Pressure pressure) {
    return pressure.gaugePa(site.site().ambientPaAbsolute());
  }

  private Vessel build(String id, String title, double volume, double fill, Accuracy accuracy) {
    double ambient = site.site().ambientPaAbsolute();
    Limits stated = limits.limits(ambient);
    Vessel.Contents contents =
        new Vessel.Contents(
            liquid.liquid(),
            gas == null ? GasMix.CO2 : gas,
            airPaAbsolute == null ? 0 : airPaAbsolute);
    return new Vessel(
        id,
        title,
        volume,
        fill,
        contents,
        closure == null ? Closure.INFER : closure,
        stated,
        Optional.empty(),
        site.site(),
        OptionalDouble.empty(),
        accuracy,
        Prospects.NONE);
  }

  private static void require(String option, Object value) {
    if (value == null) {
      throw new BadInputException(option + " is missing; write it as '" + option + " 900L'");
    }
  }
}

package tunwarden.app.reckon;

import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.physics.answer.Doubt;
import tunwarden.physics.answer.GaugeState;
import tunwarden.units.Pressure;
import tunwarden.vessel.Accuracy;
import tunwarden.vessel.Site;
import tunwarden.vessel.Vessel;

/** What the gauge and the thermometer show. */
final class StateOptions {
  /** Share of a stated amount of left-over air that it may be off by, 95 %: no source. */
  private static final double AIR_SHARE = 0.5;

  @Option(
      names = "--pressure",
      required = true,
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "Headspace pressure, gauge unless written as '2.0 bara'.")
  private Pressure pressure;

  @Option(
      names = "--temperature",
      required = true,
      paramLabel = "TEMPERATURE",
      converter = Convert.ToKelvin.class,
      description = "Liquid temperature, as '4 C' or '39.2 F'.")
  private double temperatureK;

  /** The state where only the place matters. */
  GaugeState state(Site site) {
    double ambient = site.ambientPaAbsolute();
    return new GaugeState(pressure.gaugePa(ambient), temperatureK, ambient, 0);
  }

  /** The state, counted from the vessel's site. */
  GaugeState state(Vessel vessel) {
    double ambient = vessel.site().ambientPaAbsolute();
    return new GaugeState(
        pressure.gaugePa(ambient), temperatureK, ambient, vessel.contents().airPaAbsolute());
  }

  /** How well it is known; an absolute gauge does not mind the weather. */
  Doubt doubt(Vessel vessel) {
    boolean gauge = pressure.reference() == Pressure.Reference.GAUGE;
    return doubt(vessel, gauge ? vessel.site().ambientU95Pa() : 0);
  }

  /** How well a vessel's quantities are known. */
  static Doubt doubt(Vessel vessel, double ambientU95Pa) {
    Accuracy accuracy = vessel.accuracy();
    return Doubt.ofU95(
        accuracy.pressureU95Pa(),
        accuracy.temperatureU95K(),
        ambientU95Pa,
        AIR_SHARE * vessel.contents().airPaAbsolute(),
        accuracy.fillU95M3());
  }
}

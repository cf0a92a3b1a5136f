package tunwarden.app.options;

import picocli.CommandLine.Option;
import tunwarden.vessel.Accuracy;

/** How good the instruments are, as 95 % uncertainties. */
public final class InstrumentOptions {
  @Option(
      names = "--gauge-accuracy",
      paramLabel = "DIFFERENCE",
      converter = Convert.ToPressureDifferencePa.class,
      description = "Pressure gauge, 95 %%. Default: 10 mbar.")
  private Double gaugePa;

  @Option(
      names = "--thermometer-accuracy",
      paramLabel = "DIFFERENCE",
      converter = Convert.ToKelvinDifference.class,
      description = "Thermometer, 95 %%. Default: 0.3 C.")
  private Double thermometerK;

  @Option(
      names = "--fill-accuracy",
      paramLabel = "VOLUME",
      converter = Convert.ToCubicMetres.class,
      description = "Stated fill, 95 %%. Default: 2 %% of the volume.")
  private Double fillM3;

  /** The accuracy for a vessel of this gross volume, m³. */
  public Accuracy accuracy(double volumeM3) {
    Accuracy usual = Accuracy.usual(volumeM3);
    return new Accuracy(
        gaugePa == null ? usual.pressureU95Pa() : gaugePa,
        thermometerK == null ? usual.temperatureU95K() : thermometerK,
        fillM3 == null ? usual.fillU95M3() : fillM3);
  }
}

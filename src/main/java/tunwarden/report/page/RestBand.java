package tunwarden.report.page;

import tunwarden.physics.gas.Gas;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.report.analysis.Bins;
import tunwarden.vessel.Vessel;

/** The pressure the headspace would come to if the liquid's gas were at rest with it. */
final class RestBand {
  private final LiquidSolubility solubility;
  private final double ambientPa;
  private final double airPa;
  private final Bins bins;

  RestBand(Vessel vessel, Bins bins) {
    this.solubility = LiquidSolubility.of(vessel.liquid());
    this.ambientPa = vessel.site().ambientPaAbsolute();
    this.airPa = vessel.contents().airPaAbsolute();
    this.bins = bins;
  }

  /** In bar gauge, for a content that many half-widths from the belief. */
  double bar(int bin, double content) {
    double kelvin = bins.temperatureK(bin);
    double pressure = bins.pressurePa(bin);
    if (Double.isNaN(content) || Double.isNaN(kelvin) || Double.isNaN(pressure)) {
      return Double.NaN;
    }
    double partial =
        solubility.partialPa(Gas.CO2, Math.max(0, content), pressure + ambientPa, kelvin);
    return (partial + airPa + solubility.vapourPressurePa(kelvin) - ambientPa) / 1e5;
  }
}

package tunwarden.app.reckon;

import picocli.CommandLine.Mixin;
import tunwarden.app.options.VesselOptions;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Present;
import tunwarden.physics.answer.GaugeState;
import tunwarden.physics.answer.Warming;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.units.BadInputException;
import tunwarden.units.Display;
import tunwarden.units.Pressure;
import tunwarden.vessel.Vessel;

/** A vessel at rest with its gas, the start of every forecast on the command line. */
final class PresentOptions {
  @Mixin private StateOptions state;
  @Mixin private VesselOptions vessel;

  /** All worlds of the vessel as it is now. */
  Ensemble ensemble() {
    Vessel described = vessel.vessel("vessel");
    GaugeState now = state.state(described);
    if (!(now.temperatureK() >= Warming.LEAST_K && now.temperatureK() <= Warming.MOST_K)) {
      throw new BadInputException(
          "--temperature: write one from "
              + Display.METRIC.temperature(Warming.LEAST_K)
              + " to "
              + Display.METRIC.temperature(Warming.MOST_K)
              + ", where the relations hold");
    }
    if (!(now.paAbsolute() > 0)) {
      throw new BadInputException("--pressure: that lies below a perfect vacuum; check its unit");
    }
    if (described.fillM3() >= described.volumeM3()) {
      throw new BadInputException("--fill: a vessel full to the brim has no gas to reckon with");
    }
    refuseRelief(described, now.paGauge());
    return Ensemble.of(Present.atRest(described, now.paGauge(), now.temperatureK()));
  }

  /** A valve set below the present pressure would be open. */
  static void refuseRelief(Vessel vessel, double paGauge) {
    vessel
        .limits()
        .relief()
        .filter(relief -> relief.setPaGauge() < paGauge)
        .ifPresent(
            relief -> {
              throw new BadInputException(
                  "--relief: a setting of "
                      + Display.METRIC.gauge(relief.setPaGauge())
                      + " is below the present pressure of "
                      + Display.METRIC.gauge(paGauge)
                      + ", the valve would be open; check both");
            });
  }

  double gaugePa(Pressure pressure) {
    return vessel.gaugePa(pressure);
  }

  /** The correlations used, and what limits them. */
  void model(AnswerSheet sheet, Ensemble ensemble, String more) {
    Present present = ensemble.present();
    LiquidSolubility solubility = LiquidSolubility.of(present.vessel().liquid());
    sheet.model(solubility.model(Gas.CO2) + "; closed-vessel balance of each gas" + more);
    solubility
        .breaches(Gas.CO2, present.pressurePaAbsolute(), present.temperatureK())
        .forEach(sheet::caution);
    sheet.assume(
        "now: liquid and gas at rest with each other at the stated pressure and temperature");
    sheet.assume(Assumed.gas(present.vessel()));
    if (!vessel.liquidIsNamed()) {
      sheet.caution("no liquid was named: reckoned for water");
    }
  }

  /** The wider side of a range, as the one number beside a value. */
  static double u95(Spread spread) {
    return Math.max(spread.high() - spread.middle(), spread.middle() - spread.low());
  }
}

package tunwarden.app.reckon;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.World;
import tunwarden.forecast.vacuum.Vacuum;
import tunwarden.physics.gas.Gas;
import tunwarden.units.BadInputException;
import tunwarden.units.Display;

/** Ways a shut vessel comes under vacuum. */
@Command(
    name = "vacuum",
    description = "Pressure of a shut vessel after cooling, caustic or drawing off without gas.")
final class VacuumCheck extends AnswerCommand {
  @Option(
      names = "--cool-to",
      paramLabel = "TEMPERATURE",
      converter = Convert.ToKelvin.class,
      description = "Cooled shut to this temperature, at rest.")
  private Double coolK;

  @Option(
      names = "--caustic",
      paramLabel = "SHARE",
      converter = Convert.ToShare.class,
      description = "Caustic binds this share of the headspace's CO2, as '100 %%'.")
  private Double causticShare;

  @Option(
      names = "--draw",
      paramLabel = "VOLUME",
      converter = Convert.ToCubicMetres.class,
      description = "Liquid drawn off with no gas let in.")
  private Double drawM3;

  @Mixin private PresentOptions present;

  @Override
  void fill(AnswerSheet sheet) {
    if (coolK == null && causticShare == null && drawM3 == null) {
      throw new BadInputException(
          "say what happens: --cool-to 0C, --caustic '100 %' or --draw 200L");
    }
    Ensemble ensemble = present.ensemble();
    double limit = ensemble.present().vessel().limits().vacuumOrNonePaGauge();
    double lowest = Double.POSITIVE_INFINITY;
    if (coolK != null) {
      Spread cooled = ensemble.range(world -> world.restPaGauge(coolK));
      lowest = Math.min(lowest, put(sheet, "after_cooling_bar_g", "cooled", cooled));
    }
    if (causticShare != null) {
      Spread bound = ensemble.range(world -> world.causticPaGauge(causticShare));
      lowest = Math.min(lowest, put(sheet, "after_caustic_bar_g", "after caustic", bound));
      World world = ensemble.middle();
      double co2Kg = causticShare * world.headspaceMol(Gas.CO2) * Gas.CO2.molarMass();
      sheet.line("caustic soda", Display.number(Vacuum.causticKg(co2Kg), 2) + " kg NaOH bind it");
    }
    if (drawM3 != null) {
      if (drawM3 > ensemble.present().vessel().fillM3()) {
        throw new BadInputException("--draw: that is more than the vessel holds; check its unit");
      }
      Spread drawn = ensemble.range(world -> world.drawnPaGauge(drawM3));
      lowest = Math.min(lowest, put(sheet, "after_drawing_bar_g", "drawn off", drawn));
    }
    sheet.json(
        "vacuum_margin_bar",
        (lowest - limit) / 1e5,
        ensemble.present().vessel().accuracy().pressureU95Pa() / 1e5);
    sheet.line("vacuum margin", sheet.display().signedPressureNumber(lowest - limit) + " at worst");
    present.model(sheet, ensemble, "");
    if (lowest < limit) {
      sheet.caution(
          "that is below what the vessel may bear ("
              + sheet.display().gauge(limit)
              + "): keep a vent or a gas supply open; a thin wall collapses under a small vacuum");
    }
  }

  /** Puts the value down; returns the lower end of its range. */
  private static double put(AnswerSheet sheet, String key, String label, Spread paGauge) {
    sheet.gauge(key, label, paGauge.middle(), PresentOptions.u95(paGauge));
    return paGauge.low();
  }
}

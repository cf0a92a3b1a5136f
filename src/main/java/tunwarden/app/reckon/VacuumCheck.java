package tunwarden.app.reckon;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.World;
import tunwarden.forecast.vacuum.Vacuum;
import tunwarden.physics.answer.Warming;
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
    List<Spread> ends = new ArrayList<>();
    if (coolK != null) {
      refuseWarm(ensemble.present().temperatureK());
      Spread cooled = ensemble.range(world -> world.restPaGauge(coolK));
      ends.add(put(sheet, "after_cooling_bar_g", "cooled", cooled));
      sheet.assume("cooled: shut, liquid and gas at rest again at that temperature");
    }
    if (causticShare != null) {
      Spread bound = ensemble.range(world -> world.causticPaGauge(causticShare));
      ends.add(put(sheet, "after_caustic_bar_g", "after caustic", bound));
      sheet.assume(
          "caustic: at the same temperature, no gas let in, the liquid gives nothing off meanwhile");
      World world = ensemble.middle();
      double co2Kg = causticShare * world.headspaceMol(Gas.CO2) * Gas.CO2.molarMass();
      sheet.line("caustic soda", Display.number(Vacuum.causticKg(co2Kg), 2) + " kg NaOH bind it");
    }
    if (drawM3 != null) {
      if (drawM3 > ensemble.present().vessel().fillM3()) {
        throw new BadInputException("--draw: that is more than the vessel holds; check its unit");
      }
      Spread drawn = ensemble.range(world -> world.drawnPaGauge(drawM3));
      ends.add(put(sheet, "after_drawing_bar_g", "drawn off", drawn));
      sheet.assume("drawn off: so quickly that the liquid gives no gas off meanwhile");
    }
    margin(sheet, ends, limit);
    present.model(sheet, ensemble, "");
  }

  private void refuseWarm(double nowK) {
    if (!(coolK >= Warming.LEAST_K && coolK <= nowK)) {
      throw new BadInputException(
          "--cool-to: write a temperature from "
              + Display.METRIC.temperature(Warming.LEAST_K)
              + " to the present "
              + Display.METRIC.temperature(nowK));
    }
  }

  /** The worst of the cases against the limit, with that case's own uncertainty. */
  private static void margin(AnswerSheet sheet, List<Spread> ends, double limitPaGauge) {
    Spread worst = ends.stream().min(Comparator.comparingDouble(Spread::low)).orElseThrow();
    sheet.difference(
        "vacuum_margin_bar",
        "vacuum margin",
        worst.middle() - limitPaGauge,
        PresentOptions.u95(worst));
    if (worst.low() < limitPaGauge) {
      sheet.caution(
          "that is below what the vessel may bear ("
              + Display.METRIC.gauge(limitPaGauge)
              + "): keep a vent or a gas supply open; a thin wall collapses under a small vacuum");
    }
  }

  /** Puts the value down and returns it. */
  private static Spread put(AnswerSheet sheet, String key, String label, Spread paGauge) {
    sheet.gauge(key, label, paGauge.middle(), PresentOptions.u95(paGauge));
    return paGauge;
  }
}

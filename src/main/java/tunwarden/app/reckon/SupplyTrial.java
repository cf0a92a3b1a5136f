package tunwarden.app.reckon;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Words;
import tunwarden.forecast.vent.OrificeFit;
import tunwarden.forecast.whatif.Supplies;
import tunwarden.units.BadInputException;
import tunwarden.units.Unit;
import tunwarden.vessel.Limits;
import tunwarden.vessel.Prospects.Supply;
import tunwarden.vessel.Vessel;

/** A supply regulator that fails open. */
@Command(
    name = "supply",
    description = "Pressure over time when the gas supply's regulator fails open.")
final class SupplyTrial extends AnswerCommand {
  private static final int POINTS = 5;

  @Mixin private SupplyOptions options;
  @Mixin private PresentOptions present;

  @Override
  void fill(AnswerSheet sheet) {
    Ensemble ensemble = present.ensemble();
    Vessel vessel = ensemble.present().vessel();
    Supply supply = options.required(vessel.site().ambientPaAbsolute());
    double now = ensemble.present().pressurePaGauge();
    if (!(supply.paGauge() > now)) {
      throw new BadInputException(
          "--supply: it is not above the vessel's present pressure, so nothing would flow in");
    }
    supply
        .seat()
        .flatMap(seat -> OrificeFit.fault(seat.diameterM(), vessel.volumeM3()))
        .ifPresent(
            sentence -> {
              throw new BadInputException("--supply-orifice: " + sentence);
            });
    sheet.json("pressure_bar_g", Unit.BAR.fromSi(supply.paGauge()), 0);
    sheet.line("ends at", sheet.display().gauge(supply.paGauge()) + ", that of the supply");
    Limits limits = vessel.limits();
    limits
        .relief()
        .ifPresent(
            relief -> {
              boolean lifts = supply.paGauge() >= relief.earliestLiftPaGauge();
              sheet.plain("lifts", lifts, "valve lifts", lifts ? "yes" : "no");
              reach(
                  sheet,
                  ensemble,
                  supply,
                  relief.earliestLiftPaGauge(),
                  "time_to_lift_s",
                  "earliest lift");
              reach(sheet, ensemble, supply, relief.setPaGauge(), "time_to_set_s", "setting");
            });
    if (limits.relief().isEmpty()) {
      sheet.none("lifts", "valve lifts", "no relief setting was given");
    }
    limits
        .vesselPaGauge()
        .ifPresent(
            limit -> reach(sheet, ensemble, supply, limit, "time_to_limit_s", "vessel limit"));
    course(sheet, ensemble, supply, now);
    present.model(sheet, ensemble, ", isentropic orifice with real compressibility");
    sheet.assume(Supplies.ASSUMES);
    Supplies.cautions(limits, supply).forEach(caution -> sheet.caution(caution.text()));
  }

  private static void reach(
      AnswerSheet sheet,
      Ensemble ensemble,
      Supply supply,
      double paGauge,
      String key,
      String name) {
    if (!(paGauge < supply.paGauge())) {
      sheet.none(key, name, "not reached");
      return;
    }
    Optional<Spread> time = Supplies.time(ensemble, supply, paGauge);
    if (time.isEmpty()) {
      sheet.none(key, name, "time not known: state --supply-orifice or --supply-flow");
      return;
    }
    sheet.json(key, time.get().middle(), PresentOptions.u95(time.get()));
    sheet.line(
        name,
        sheet.display().gauge(paGauge)
            + " after "
            + Words.time(time.get().middle())
            + " ("
            + Words.time(time.get().low())
            + " to "
            + Words.time(time.get().high())
            + ")");
  }

  /** The way there in equal steps of pressure; the last one is nine tenths of it. */
  private static void course(
      AnswerSheet sheet, Ensemble ensemble, Supply supply, double nowPaGauge) {
    List<Object> points = new ArrayList<>();
    List<String> words = new ArrayList<>();
    for (int i = 1; i <= POINTS; i++) {
      double pa = nowPaGauge + 0.9 * i / POINTS * (supply.paGauge() - nowPaGauge);
      Supplies.time(ensemble, supply, pa)
          .ifPresent(
              time -> {
                Map<String, Object> point = new LinkedHashMap<>();
                point.put("after_s", time.middle());
                point.put("u95_after_s", PresentOptions.u95(time));
                point.put("pressure_bar_g", Unit.BAR.fromSi(pa));
                points.add(point);
                words.add(sheet.display().gauge(pa) + " after " + Words.time(time.middle()));
              });
    }
    sheet.hidden("course", points);
    if (!words.isEmpty()) {
      sheet.line("over time", String.join(", ", words));
    }
  }
}

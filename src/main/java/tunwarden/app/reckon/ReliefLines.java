package tunwarden.app.reckon;

import java.util.Optional;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/** What is said of the relief valve, and only where a setting was given. */
final class ReliefLines {
  private ReliefLines() {}

  /** Distance of a reading to the earliest conforming opening, the reading's doubt taken off. */
  static void margin(AnswerSheet sheet, Vessel vessel, double paGauge) {
    Optional<ReliefSetting> relief = vessel.limits().relief();
    if (relief.isEmpty()) {
      return;
    }
    double u95 = vessel.accuracy().pressureU95Pa();
    double margin = relief.get().earliestLiftPaGauge() - (paGauge + u95);
    sheet.difference("relief_margin_bar", "relief margin", margin, u95);
    if (margin < 0) {
      sheet.caution(
          "the valve may be open or about to open: keep clear of its outlet, and never block or"
              + " reset a relief valve");
    }
  }

  /** What a forecast pressure means for the valve and the vessel. */
  static void forecast(AnswerSheet sheet, Vessel vessel, double paGauge, double u95Pa) {
    double highest = paGauge + u95Pa;
    vessel
        .limits()
        .relief()
        .filter(relief -> highest >= relief.earliestLiftPaGauge())
        .ifPresent(
            relief ->
                sheet.caution(
                    "the valve may lift there: it may open from "
                        + Display.METRIC.gauge(relief.earliestLiftPaGauge())
                        + " ("
                        + relief.rule().words()
                        + "); keep it cool or let it down into an aired room first, and never"
                        + " block or reset a relief valve"));
    if (highest > vessel.limits().vesselPaGauge().orElse(Double.MAX_VALUE)) {
      sheet.caution(
          "that is above what the vessel is rated for: a licensed person must decide, under local"
              + " code");
    }
  }
}

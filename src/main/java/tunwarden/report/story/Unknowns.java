package tunwarden.report.story;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.EventKind;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Outlook;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.report.analysis.Analysis;
import tunwarden.vessel.Vessel;

/** What was assumed, what cannot be known, and what to mind. */
final class Unknowns {
  private Unknowns() {}

  static List<String> of(Analysis analysis) {
    Vessel vessel = analysis.vessel();
    List<String> sentences = new ArrayList<>();
    sentences.add(
        String.format(
            Locale.ROOT,
            "Vessel as stated: %.0f L, filled with %.0f L of %s (± %.0f L), headspace %.1f %%.",
            1000 * vessel.volumeM3(),
            1000 * vessel.fillM3(),
            vessel.liquid().kind().word(),
            1000 * vessel.accuracy().fillU95M3(),
            100 * vessel.ullage()));
    sentences.add(
        String.format(
            Locale.ROOT,
            "Instruments taken as good to ± %.0f mbar and ± %.1f °C, the atmosphere as %.3f bar"
                + " absolute ± %.0f mbar (95 %%).",
            vessel.accuracy().pressureU95Pa() / 100,
            vessel.accuracy().temperatureU95K(),
            vessel.site().ambientPaAbsolute() / 1e5,
            vessel.site().ambientU95Pa() / 100));
    sentences.add("Dissolved gas by: " + LiquidSolubility.of(vessel.liquid()).model(Gas.CO2) + ".");
    analysis
        .state()
        .estimate()
        .map(Estimate::ignorance)
        .filter(text -> !text.isEmpty())
        .ifPresent(text -> sentences.add(SummaryWords.sentence(text.replaceAll("\\.$", ""))));
    sentences.add(
        "Amounts of gas are worked out from the headspace alone and assume that pressure and"
            + " temperature were read where the gas is; foam, liquid carried over and gas given off"
            + " by the liquid during an opening are not counted.");
    if (!analysis.events(EventKind.LIFT).isEmpty() || !analysis.events(EventKind.VENT).isEmpty()) {
      sentences.add(
          "A log of pressure cannot show which opening the gas took: a fall is called a lift by"
              + " where it began and where it stopped.");
    }
    analysis.events(EventKind.UNEXPLAINED).stream()
        .limit(3)
        .forEach(event -> sentences.add(SummaryWords.sentence(event.why())));
    return sentences;
  }

  static List<String> cautions(Analysis analysis, Outlook next) {
    List<String> cautions = new ArrayList<>();
    next.cautions().stream().map(Caution::text).forEach(cautions::add);
    if (analysis.gasLostKg() > 0) {
      cautions.add(
          "CO2 that left the vessel collects low in rooms: measure before entering, ventilate, and"
              + " do not go in alone.");
    }
    if (analysis.vessel().limits().relief().isPresent()) {
      cautions.add(
          "Never block, plug or reset a relief valve; one that has lifted is to be inspected by a"
              + " licensed person under the local code before the vessel is used again.");
    }
    cautions.add(
        "This report is worked out from readings and stated figures. It is advice, not an inspection"
            + " and not a verdict; local codes and licensed persons decide.");
    return cautions;
  }
}

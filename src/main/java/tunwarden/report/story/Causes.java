package tunwarden.report.story;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.EventKind;
import tunwarden.estimate.Mode;
import tunwarden.physics.closed.ClosedVessel;
import tunwarden.physics.closed.Inventory;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.ReportRow;
import tunwarden.units.Display;
import tunwarden.vessel.Vessel;

/** What may have driven the pressure, each with the evidence for and against it. */
final class Causes {
  private static final Display DISPLAY = Telling.DISPLAY;
  private static final double YEAST_RESTS_K = 278.15;
  private static final double NOTICED_K = 0.5;
  private static final double NOTICED_PA = 3000;
  private static final double EXPLAINS = 0.6;

  private final Analysis analysis;
  private final Telling telling;
  private final ReportRow first;
  private final ReportRow peak;

  private Causes(Analysis analysis, Telling telling) {
    this.analysis = analysis;
    this.telling = telling;
    this.first = analysis.extremes().first();
    this.peak = analysis.extremes().peak();
  }

  static List<Hypothesis> of(Analysis analysis, OptionalDouble otherRoom, Telling telling) {
    Causes causes = new Causes(analysis, telling);
    List<Hypothesis> all =
        new ArrayList<>(
            List.of(
                causes.warming(),
                causes.fermentation(),
                causes.supply(),
                causes.opening(),
                causes.sensor()));
    otherRoom.ifPresent(share -> all.add(causes.otherRoom(share)));
    return all;
  }

  /** What a shut vessel at rest would show at the temperature of the peak. */
  private Hypothesis warming() {
    Hypothesis cause = new Hypothesis("warming of the contents");
    double rise = peak.paGauge() - first.paGauge();
    double warmed = peak.temperatureK() - first.temperatureK();
    if (Double.isNaN(warmed)) {
      return cause.against("there is no temperature to judge by");
    }
    if (warmed < NOTICED_K) {
      return cause.against(
          "the liquid was " + change(warmed) + " at the highest pressure than at the beginning");
    }
    double byHeat = sealedAt(peak.temperatureK()) - first.paGauge();
    cause.speaksFor(
        "the liquid was "
            + change(warmed)
            + " at the highest pressure; a shut vessel at rest would"
            + " have gone from "
            + DISPLAY.gauge(first.paGauge())
            + " to "
            + DISPLAY.gauge(first.paGauge() + byHeat)
            + " by that alone, and "
            + DISPLAY.gauge(peak.paGauge())
            + " was seen");
    if (rise > NOTICED_PA && rise > byHeat / EXPLAINS) {
      cause.against("that explains only " + percent(byHeat / rise) + " of the rise");
    }
    if (rise < -NOTICED_PA) {
      cause.against("the pressure fell all the same");
    }
    return cause;
  }

  private double sealedAt(double kelvin) {
    Vessel vessel = analysis.vessel();
    ClosedVessel closed =
        new ClosedVessel(vessel.volumeM3(), vessel.fillM3(), first.temperatureK(), vessel.liquid());
    double ambient = vessel.site().ambientPaAbsolute();
    Inventory gas =
        closed.inventoryAt(
            first.paGauge() + ambient,
            first.temperatureK(),
            vessel.gas(),
            vessel.contents().airPaAbsolute());
    return closed.settle(gas, kelvin).totalPaAbsolute() - ambient;
  }

  private Hypothesis fermentation() {
    Hypothesis cause = new Hypothesis("fermentation going on");
    double made = analysis.state().estimate().map(Estimate::gasMadeKgPerM3PerS).orElse(0.0);
    double perDay = made * 86_400;
    double rise = peak.paGauge() - first.paGauge();
    double warmed = peak.temperatureK() - first.temperatureK();
    if (perDay > 0.1) {
      cause.speaksFor(
          String.format(
              Locale.ROOT,
              "the estimate sees %.1f g/L of gas being made a day at the end",
              perDay));
    }
    if (rise > NOTICED_PA && Math.abs(warmed) < NOTICED_K) {
      cause.speaksFor(
          "the pressure rose by "
              + DISPLAY.pressureDifference(rise)
              + " while the temperature stayed");
    }
    if (analysis.signals().temperature().greatest() < YEAST_RESTS_K) {
      cause.against("it was never above 5 °C, where most yeasts rest (common practice, no source)");
    }
    if (rise <= NOTICED_PA) {
      cause.against("the pressure did not rise");
    } else if (warmed > NOTICED_K
        && sealedAt(peak.temperatureK()) - first.paGauge() > EXPLAINS * rise) {
      cause.against("warming alone explains the rise");
    }
    return cause;
  }

  private Hypothesis supply() {
    Hypothesis cause = new Hypothesis("gas coming in from a supply");
    int charges = analysis.events(EventKind.CHARGE).size();
    double held = analysis.share(Mode.HELD);
    if (charges > 0) {
      cause.speaksFor("gas came in " + Telling.times(charges) + ", see the timeline");
    } else {
      cause.against("no sudden rise of pressure is seen");
    }
    if (held > 0.1) {
      cause.speaksFor("the pressure was held from outside for " + percent(held) + " of the time");
    }
    return cause;
  }

  private Hypothesis opening() {
    Hypothesis cause = new Hypothesis("gas let out by a vent, the relief valve or a leak");
    addOpening(cause, EventKind.VENT, "vented");
    addOpening(cause, EventKind.LIFT, "relieved by its valve");
    addOpening(cause, EventKind.LEAK, "losing gas slowly");
    if (cause.evidenceFor().isEmpty()) {
      cause.against("no sudden fall of pressure is seen");
    }
    return cause;
  }

  private void addOpening(Hypothesis cause, EventKind kind, String words) {
    int count = analysis.events(kind).size();
    if (count > 0) {
      cause.speaksFor(
          "the vessel was "
              + words
              + " "
              + Telling.times(count)
              + ", first at "
              + telling.at(analysis.events(kind).get(0).time()));
    }
  }

  private Hypothesis sensor() {
    Hypothesis cause = new Hypothesis("a fault of the pressure signal");
    int frozen = analysis.events(EventKind.FROZEN).size();
    int spikes = analysis.events(EventKind.SPIKE).size();
    if (frozen > 0) {
      cause.speaksFor("the signal stood still " + Telling.times(frozen));
    }
    if (spikes > 0) {
      cause.speaksFor("the signal jumped and came back " + Telling.times(spikes));
    }
    if (analysis.events(EventKind.UNEXPLAINED).size() > 0) {
      cause.speaksFor("no dissolved gas explains the pressure at times, see the timeline");
    }
    if (frozen == 0 && analysis.signals().pressure().goodShare() > 0.99) {
      cause.against("the signal moved with its usual noise throughout");
    }
    return cause;
  }

  private Hypothesis otherRoom(double share) {
    Vessel vessel = analysis.vessel();
    double litres = 1000 * (vessel.volumeM3() - vessel.fillM3());
    return new Hypothesis("another size or fill than stated")
        .speaksFor(
            String.format(
                Locale.ROOT,
                "a headspace of about %.0f L (to a factor of two) instead of %.0f L explains far"
                    + " better how the pressure answers warmth and comes back after an opening",
                share * litres,
                litres))
        .against("gas being made, or much air left in the headspace, can look alike");
  }

  private static String change(double kelvin) {
    return DISPLAY.temperatureDifference(Math.abs(kelvin)) + (kelvin < 0 ? " cooler" : " warmer");
  }

  private static String percent(double share) {
    return Math.round(100 * share) + " %";
  }
}

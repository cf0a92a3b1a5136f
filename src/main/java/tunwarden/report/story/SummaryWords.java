package tunwarden.report.story;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.Extremes;
import tunwarden.report.analysis.ReportRow;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;

/** The first paragraph of a report: what happened, when, how sure. */
final class SummaryWords {
  private static final Display DISPLAY = Telling.DISPLAY;

  private final Analysis analysis;
  private final OptionalDouble otherRoom;
  private final Telling telling;
  private final List<String> sentences = new ArrayList<>();

  SummaryWords(Analysis analysis, OptionalDouble otherRoom, Telling telling) {
    this.analysis = analysis;
    this.otherRoom = otherRoom;
    this.telling = telling;
  }

  List<String> sentences() {
    course();
    relief();
    vesselLimit();
    vacuum();
    movements(EventKind.VENT, "was vented", "of gas left");
    movements(EventKind.CHARGE, "was charged with gas", "came in");
    movements(EventKind.LEAK, "lost gas slowly", "left");
    lost();
    belief();
    if (otherRoom.isPresent()) {
      sentences.add(
          "The stated size and fill do not explain the pressures well: see What may have driven it,"
              + " and check them before anything else here is used.");
    }
    return sentences;
  }

  private void course() {
    Extremes extremes = analysis.extremes();
    ReportRow first = extremes.first();
    ReportRow last = extremes.last();
    ReportRow peak = extremes.peak();
    String warmed =
        Double.isNaN(first.temperatureK()) || Double.isNaN(last.temperatureK())
            ? ""
            : ", at "
                + DISPLAY.temperature(first.temperatureK())
                + " and "
                + DISPLAY.temperature(last.temperatureK());
    sentences.add(
        "The log covers "
            + Telling.duration(Duration.between(extremes.from(), extremes.until()))
            + ", from "
            + telling.at(extremes.from())
            + " to "
            + telling.at(extremes.until())
            + ". The pressure was "
            + DISPLAY.gauge(first.paGauge())
            + " at its beginning and "
            + DISPLAY.gauge(last.paGauge())
            + " at its end"
            + warmed
            + "; the highest reading was "
            + DISPLAY.gauge(peak.paGauge())
            + " at "
            + telling.at(peak.time())
            + ".");
  }

  private void relief() {
    Optional<ReliefSetting> relief = analysis.vessel().limits().relief();
    if (relief.isEmpty()) {
      sentences.add("No relief setting was stated, so nothing is said about margins or openings.");
      return;
    }
    List<Event> lifts = analysis.events(EventKind.LIFT);
    double set = relief.get().setPaGauge();
    if (lifts.isEmpty()) {
      ReportRow closest = analysis.extremes().closest();
      sentences.add(
          "No opening of the relief valve is seen (set to "
              + DISPLAY.gauge(set)
              + ")"
              + (closest == null ? "." : "; " + margin(closest)));
    } else {
      lifted(lifts, relief.get());
    }
    analysis.events(EventKind.OVER_RELIEF).forEach(e -> sentences.add(sentence(e.why())));
  }

  private String margin(ReportRow closest) {
    boolean inside = closest.marginPa() >= 0;
    return "the reading with its uncertainty "
        + (inside ? "stayed " : "came ")
        + DISPLAY.pressureDifference(Math.abs(closest.marginPa()))
        + (inside ? " below" : " above")
        + " the earliest conforming opening at the closest, at "
        + telling.at(closest.time())
        + ".";
  }

  private void lifted(List<Event> lifts, ReliefSetting relief) {
    Event first = lifts.get(0);
    Event last = lifts.get(lifts.size() - 1);
    double gas = lifts.stream().mapToDouble(Event::gasKg).sum();
    double opened = lifts.stream().mapToDouble(Event::fromPaGauge).average().orElse(0);
    double shut = lifts.stream().mapToDouble(Event::toPaGauge).average().orElse(0);
    boolean early = opened < relief.earliestLiftPaGauge();
    sentences.add(
        "The relief valve "
            + Telling.sure(first.confidence())
            + " lifted "
            + Telling.times(lifts.size())
            + ", "
            + (lifts.size() == 1 ? "at " : "first at ")
            + telling.at(first.time())
            + (lifts.size() == 1 ? "" : " and last at " + telling.at(last.time()))
            + ". It opened at "
            + (lifts.size() == 1 ? "" : "about ")
            + DISPLAY.gauge(opened)
            + " against its setting of "
            + DISPLAY.gauge(relief.setPaGauge())
            + (early
                ? ", below its earliest conforming opening of "
                : ", within its tolerance (earliest conforming opening ")
            + DISPLAY.gauge(relief.earliestLiftPaGauge())
            + (early ? "" : ")")
            + ", and reseated at "
            + (lifts.size() == 1 ? "" : "about ")
            + DISPLAY.gauge(shut)
            + ". About "
            + Telling.mass(gas)
            + " of gas left through it.");
  }

  private void vesselLimit() {
    OptionalDouble limit = analysis.vessel().limits().vesselPaGauge();
    if (limit.isEmpty()) {
      return;
    }
    double peak = analysis.extremes().peak().paGauge();
    double u95 = analysis.vessel().accuracy().pressureU95Pa();
    double distance = limit.getAsDouble() - peak;
    String place =
        distance < -u95
            ? "was passed by " + DISPLAY.pressureDifference(-distance)
            : distance < u95
                ? "was reached within the gauge's accuracy"
                : "was not passed; the highest reading stayed "
                    + DISPLAY.pressureDifference(distance)
                    + " below it";
    sentences.add("The vessel limit of " + DISPLAY.gauge(limit.getAsDouble()) + " " + place + ".");
  }

  private void vacuum() {
    double lowest = analysis.extremes().lowest().paGauge();
    double limit = analysis.vessel().limits().vacuumOrNonePaGauge();
    if (lowest < limit - analysis.vessel().accuracy().pressureU95Pa()) {
      sentences.add(
          "The pressure fell to "
              + DISPLAY.gauge(lowest)
              + " at "
              + telling.at(analysis.extremes().lowest().time())
              + ", below the vacuum limit of "
              + DISPLAY.gauge(limit)
              + ".");
    }
  }

  private void movements(EventKind kind, String what, String gasWent) {
    List<Event> events = analysis.events(kind);
    if (events.isEmpty()) {
      return;
    }
    double gas = Math.abs(events.stream().mapToDouble(Event::gasKg).sum());
    sentences.add(
        "The vessel "
            + Telling.sure(events.get(0).confidence())
            + " "
            + what
            + " "
            + Telling.times(events.size())
            + (events.size() == 1 ? ", at " : ", first at ")
            + telling.at(events.get(0).time())
            + "; about "
            + Telling.mass(gas)
            + " "
            + gasWent
            + ".");
  }

  private void lost() {
    if (analysis.gasLostKg() > 0) {
      sentences.add(
          "In all, about " + Telling.mass(analysis.gasLostKg()) + " of gas left the vessel.");
    }
  }

  private void belief() {
    int frozen = analysis.events(EventKind.FROZEN).size();
    int gaps = analysis.events(EventKind.GAP).size();
    if (frozen + gaps == 0) {
      sentences.add("Nothing speaks against the pressure signal; see Instruments.");
      return;
    }
    sentences.add(
        "The pressure cannot be believed throughout: the signal stood still "
            + Telling.times(frozen)
            + " and was missing "
            + Telling.times(gaps)
            + "; see Instruments.");
  }

  static String sentence(String text) {
    return Character.toUpperCase(text.charAt(0)) + text.substring(1) + ".";
  }
}

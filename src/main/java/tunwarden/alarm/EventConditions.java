package tunwarden.alarm;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.units.Display;

/** Alarms told by events the estimator has found in the readings. */
final class EventConditions {
  private static final Map<AlarmKind, EventKind> TOLD_BY =
      new EnumMap<>(
          Map.of(
              AlarmKind.LIFT_SEEN, EventKind.LIFT,
              AlarmKind.LEAK, EventKind.LEAK,
              AlarmKind.UNEXPLAINED_PRESSURE, EventKind.UNEXPLAINED,
              AlarmKind.OVER_RELIEF, EventKind.OVER_RELIEF,
              AlarmKind.COOLING_LOST, EventKind.COOLING_FAILURE));

  private EventConditions() {}

  static List<Condition> of(Assessment assessment, AlarmSettings settings, Page page) {
    List<Condition> all = new ArrayList<>();
    TOLD_BY.forEach((kind, told) -> all.addAll(one(kind, told, assessment, settings, page)));
    return all;
  }

  private static List<Condition> one(
      AlarmKind kind, EventKind told, Assessment assessment, AlarmSettings settings, Page page) {
    List<Condition> found = new ArrayList<>();
    for (Event event : assessment.events()) {
      String cause = event.time().toString();
      if (event.kind() == told) {
        Condition.Truth truth = event.open() ? Condition.Truth.YES : Condition.Truth.OVER;
        found.add(
            Condition.plain(kind, truth, words(event, settings.display()))
                .withCauses(Set.of(cause))
                .since(event.time()));
      } else if (isKnownAs(kind, cause, page)) {
        // The estimator thought better of it: the same event under another name.
        found.add(Condition.no(kind));
      }
    }
    if (found.isEmpty()) {
      found.add(
          assessment.pressure().isUsable()
              ? Condition.plain(kind, Condition.Truth.STANDS, "")
              : Conditions.without(assessment.pressure(), kind));
    }
    return found;
  }

  private static boolean isKnownAs(AlarmKind kind, String cause, Page page) {
    return page.memory(kind)
        .filter(memory -> memory.signal().active() && memory.signal().causes().contains(cause))
        .isPresent();
  }

  private static String words(Event event, Display display) {
    StringBuilder text = new StringBuilder(capital(event.kind().word().replace('-', ' ')));
    text.append(event.open() ? " since " : " from ").append(event.time());
    if (!event.open()) {
      text.append(" to ").append(event.until());
    }
    text.append(", ").append(display.gauge(event.fromPaGauge()));
    text.append(" to ").append(display.gauge(event.toPaGauge()));
    if (Math.abs(event.gasKg()) > 0) {
      text.append(", ")
          .append(Display.number(Math.abs(event.gasKg()) * 1000, 0))
          .append(" g of gas");
      text.append(event.gasKg() > 0 ? " lost" : " gained");
    }
    text.append(" (confidence ").append(Display.number(event.confidence() * 100, 0)).append(" %)");
    return event.why().isBlank()
        ? text.append('.').toString()
        : text.append(": ").append(event.why()).append('.').toString();
  }

  private static String capital(String words) {
    return Character.toUpperCase(words.charAt(0)) + words.substring(1);
  }
}

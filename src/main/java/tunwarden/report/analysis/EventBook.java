package tunwarden.report.analysis;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;

/**
 * The events of a log. What can be judged better with the whole log in hand is taken from there;
 * what only the estimator's model of the liquid can see is taken from its running reports.
 */
final class EventBook {
  /** Kinds for which the sealed model is needed, not only the course of the readings. */
  private static final Set<EventKind> BY_MODEL =
      Set.of(EventKind.LEAK, EventKind.DRIFT, EventKind.UNEXPLAINED);

  private static final Duration SAME_LEAK = Duration.ofHours(4);
  private static final double WORTH_TELLING = 0.5;

  private final Map<String, Event> running = new LinkedHashMap<>();

  /** Takes in what one step reported; a later word about the same event replaces the earlier. */
  void note(List<Event> events) {
    for (Event event : events) {
      if (BY_MODEL.contains(event.kind())) {
        running.put(event.kind() + "@" + event.time(), event);
      }
    }
  }

  /** The events of the whole log, in order of time. */
  List<Event> merged(List<Event> found) {
    List<Event> merged = new ArrayList<>(found);
    running.values().stream()
        .filter(event -> event.confidence() >= WORTH_TELLING)
        .sorted(Comparator.comparing(Event::time))
        .forEach(event -> join(merged, event));
    merged.sort(Comparator.comparing(Event::time).thenComparing(Event::kind));
    return merged;
  }

  /** A leak that the model lost sight of for a while is still the same leak. */
  private static void join(List<Event> merged, Event event) {
    Event last = merged.isEmpty() ? null : merged.get(merged.size() - 1);
    boolean same =
        last != null
            && event.kind() == EventKind.LEAK
            && last.kind() == EventKind.LEAK
            && event.time().isBefore(last.until().plus(SAME_LEAK));
    if (same) {
      merged.set(merged.size() - 1, both(last, event));
    } else {
      merged.add(event);
    }
  }

  private static Event both(Event first, Event second) {
    return new Event(
        first.kind(),
        first.vessel(),
        first.time(),
        second.until(),
        second.open(),
        first.fromPaGauge(),
        second.toPaGauge(),
        first.gasKg() + second.gasKg(),
        Math.max(first.confidence(), second.confidence()),
        second.why());
  }
}

package tunwarden.report.analysis;

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
        .forEach(merged::add);
    merged.sort(Comparator.comparing(Event::time).thenComparing(Event::kind));
    return merged;
  }
}

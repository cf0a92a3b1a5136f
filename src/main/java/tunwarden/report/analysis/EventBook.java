package tunwarden.report.analysis;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;

/**
 * The events of a log: what the estimator found while it ran, refined by what is found with the
 * whole log in hand. Where both speak of one thing, the later look gives its times and the
 * estimator the gas, since it knows what the liquid gave off meanwhile.
 */
final class EventBook {
  private static final Duration SAME = Duration.ofSeconds(120);
  private static final double WORTH_TELLING = 0.5;

  private final Map<String, Event> running = new LinkedHashMap<>();

  /** Takes in what one step reported; a later word about the same event replaces the earlier. */
  void note(List<Event> events) {
    for (Event event : events) {
      running.put(event.kind() + "@" + event.time(), event);
    }
  }

  /** The events of the whole log, in order of time. */
  List<Event> merged(List<Event> found) {
    List<Event> merged = new ArrayList<>();
    List<Event> left = new ArrayList<>(running.values());
    for (Event event : found) {
      Event twin = twin(event, left);
      if (twin != null) {
        left.remove(twin);
      }
      merged.add(twin == null ? event : refined(event, twin));
    }
    for (Event event : left) {
      if (event.confidence() >= WORTH_TELLING && !isTold(event, merged)) {
        merged.add(event);
      }
    }
    merged.sort(Comparator.comparing(Event::time).thenComparing(Event::kind));
    return merged;
  }

  private static Event twin(Event event, List<Event> others) {
    Event best = null;
    long bestMs = SAME.toMillis() + 1;
    for (Event other : others) {
      long apart = Math.abs(Duration.between(event.time(), other.time()).toMillis());
      if (other.kind() == event.kind() && apart < bestMs) {
        best = other;
        bestMs = apart;
      }
    }
    return best;
  }

  private static Event refined(Event found, Event running) {
    double gasKg = running.gasKg() == 0 ? found.gasKg() : running.gasKg();
    double confidence = Math.max(found.confidence(), running.confidence());
    return new Event(
        found.kind(),
        found.vessel(),
        found.time(),
        found.until(),
        found.open(),
        found.fromPaGauge(),
        found.toPaGauge(),
        gasKg,
        confidence,
        found.why());
  }

  /** Kinds the later look judges better, or the same movement under another name. */
  private static boolean isTold(Event event, List<Event> merged) {
    if (event.kind() == EventKind.MARK || event.kind() == EventKind.LEAK) {
      return false;
    }
    return merged.stream().anyMatch(other -> overlaps(event, other));
  }

  private static boolean overlaps(Event event, Event other) {
    boolean gasMoves = event.gasKg() != 0 && other.gasKg() != 0;
    Instant from = other.time().minus(SAME);
    Instant until = other.until().plus(SAME);
    boolean within = !event.time().isBefore(from) && !event.time().isAfter(until);
    return within && (gasMoves || event.kind() == other.kind());
  }
}

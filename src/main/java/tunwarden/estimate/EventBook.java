package tunwarden.estimate;

import java.time.Instant;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/** The events that still go on, at most one of a kind; immutable. */
record EventBook(Map<EventKind, Event> open) {
  static final EventBook EMPTY = new EventBook(Map.of());

  EventBook {
    open = open.isEmpty() ? Map.of() : Map.copyOf(open);
  }

  boolean has(EventKind kind) {
    return open.containsKey(kind);
  }

  /** Begins or renews an event of its kind. */
  EventBook put(Event event, List<Event> news) {
    news.add(event);
    Map<EventKind, Event> next = copy();
    next.put(event.kind(), event);
    return new EventBook(next);
  }

  /** Ends the event of that kind, if one goes on. */
  EventBook close(EventKind kind, Instant until, double toPaGauge, List<Event> news) {
    Event event = open.get(kind);
    if (event == null) {
      return this;
    }
    news.add(
        new Event(
            kind,
            event.vessel(),
            event.time(),
            until,
            false,
            event.fromPaGauge(),
            toPaGauge,
            event.gasKg(),
            event.confidence(),
            event.why()));
    Map<EventKind, Event> next = copy();
    next.remove(kind);
    return new EventBook(next);
  }

  /** The open events in a fixed order. */
  List<Event> list() {
    List<Event> all = new ArrayList<>();
    for (EventKind kind : EventKind.values()) {
      if (open.containsKey(kind)) {
        all.add(open.get(kind));
      }
    }
    return all;
  }

  private Map<EventKind, Event> copy() {
    Map<EventKind, Event> next = new EnumMap<>(EventKind.class);
    next.putAll(open);
    return next;
  }
}

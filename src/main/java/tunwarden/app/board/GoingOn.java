package tunwarden.app.board;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Event;

/** What has begun at each vessel and not ended. Written on one thread, read on any. */
final class GoingOn {
  private volatile Map<String, List<Event>> open = Map.of();

  /**
   * Takes the events of an assessment; one that comes again, or ends, takes the old one's place.
   */
  void assessed(Assessment assessment) {
    for (Event event : assessment.events()) {
      Stream<Event> others =
          of(event.vessel()).stream().filter(other -> !other.time().equals(event.time()));
      Stream<Event> now = event.open() ? Stream.of(event) : Stream.empty();
      Map<String, List<Event>> next = new HashMap<>(open);
      next.put(event.vessel(), Stream.concat(others, now).toList());
      open = Map.copyOf(next);
    }
  }

  /** The open events of a vessel, in the order in which they were found. */
  List<Event> of(String vessel) {
    return open.getOrDefault(vessel, List.of());
  }

  /** All of it, immutable, to come back to. */
  Map<String, List<Event>> kept() {
    return open;
  }

  void restore(Map<String, List<Event>> kept) {
    open = kept;
  }
}

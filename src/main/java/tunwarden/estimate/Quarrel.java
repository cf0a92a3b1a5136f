package tunwarden.estimate;

import java.util.List;
import java.util.Locale;
import tunwarden.reading.Quality;
import tunwarden.reading.Reading;

/**
 * Opens and ends the event of two sensors of one quantity that have drifted apart. That they differ
 * by more than their accuracies is found where both are read; here it becomes an event of the
 * vessel.
 */
final class Quarrel {
  private static final double CONFIDENCE = 0.9;

  private Quarrel() {}

  /** After an accepted reading. */
  static BankState check(BankState state, Reading reading, List<Event> news) {
    EventBook book = state.book();
    boolean apart = reading.quality() == Quality.DISAGREES;
    boolean known = book.has(EventKind.DRIFT);
    if (apart == known || known && !isOf(book.open().get(EventKind.DRIFT), reading)) {
      return state;
    }
    double pa = state.front() == null ? 0 : state.front().last().paGauge();
    return apart
        ? state.withBook(book.put(event(reading, pa), news))
        : state.withBook(book.close(EventKind.DRIFT, reading.time(), pa, news));
  }

  private static boolean isOf(Event event, Reading reading) {
    return event.why().startsWith(subject(reading));
  }

  private static String subject(Reading reading) {
    return "the two sensors of " + reading.quantity().word();
  }

  private static Event event(Reading reading, double pa) {
    String why =
        String.format(
            Locale.ROOT,
            "%s differ by more than their accuracies together; which of them drifts is not known",
            subject(reading));
    return new Event(
        EventKind.DRIFT,
        reading.vessel(),
        reading.time(),
        reading.time(),
        true,
        pa,
        pa,
        0,
        CONFIDENCE,
        why);
  }
}

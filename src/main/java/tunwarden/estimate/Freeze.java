package tunwarden.estimate;

import java.time.Instant;
import java.util.List;
import java.util.Locale;
import tunwarden.estimate.gate.Track;
import tunwarden.estimate.gate.Verdict;
import tunwarden.reading.Quality;
import tunwarden.reading.Reading;

/** Opens and ends the event of a signal that has frozen. */
final class Freeze {
  private Freeze() {}

  static BankState check(BankState state, Reading reading, Verdict verdict, List<Event> news) {
    boolean frozen = verdict.quality() == Quality.STUCK;
    if (!frozen) {
      return verdict.usable() && isOf(state, reading)
          ? state.withBook(
              state.book().close(EventKind.FROZEN, reading.time(), pressure(state), news))
          : state;
    }
    if (state.book().has(EventKind.FROZEN)) {
      return state;
    }
    Track track = verdict.track();
    String why =
        String.format(
            Locale.ROOT,
            "%s has repeated one value %d times; it used to move at %.0f %% of readings",
            reading.quantity().word(),
            track.sameRun() + 1,
            100 * track.restless());
    Instant since = Instant.ofEpochMilli(track.sameSinceMs());
    double pa = pressure(state);
    Event event =
        new Event(
            EventKind.FROZEN, reading.vessel(), since, reading.time(), true, pa, pa, 0, 0.95, why);
    return state.withBook(state.book().put(event, news));
  }

  /** Whether the event that goes on is about this signal. */
  private static boolean isOf(BankState state, Reading reading) {
    Event event = state.book().open().get(EventKind.FROZEN);
    return event != null && event.why().startsWith(reading.quantity().word());
  }

  private static double pressure(BankState state) {
    return state.front() == null ? 0 : state.front().last().paGauge();
  }
}

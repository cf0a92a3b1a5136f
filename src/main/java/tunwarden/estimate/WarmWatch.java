package tunwarden.estimate;

import java.util.List;
import java.util.Locale;
import tunwarden.reading.Reading;
import tunwarden.units.Constants;

/** Notices that a vessel warms, and that it goes on warming as if its cooling were lost. */
final class WarmWatch {
  private static final double WARMED_K = 1.5;
  private static final double FAILED_K = 4;
  private static final double FALLEN_K = 0.7;
  private static final double FORGET_K_PER_S = 1.5 / 43_200;
  private static final double STEADY_S = 5_400;

  private WarmWatch() {}

  static BankState look(BankState state, Reading reading, List<Event> news) {
    double now = BankEstimator.seconds(reading.time());
    double kelvin = state.senses().smoothK();
    Watch watch = state.watch();
    double crept = watch.coolestK() + FORGET_K_PER_S * (now - watch.warmestS());
    boolean first = Double.isNaN(watch.coolestK());
    boolean warming = state.book().has(EventKind.WARMING);
    if (first || kelvin <= crept && !warming || kelvin < watch.coolestK()) {
      Watch next = watch.withTemperature(kelvin, now, kelvin, now);
      return state.withWatch(next, ended(state, reading, news));
    }
    double low = warming ? watch.coolestK() : crept;
    boolean higher = kelvin > watch.warmestK();
    Watch next =
        watch.withTemperature(low, watch.coolestS(), higher ? kelvin : watch.warmestK(), now);
    EventBook book = state.book();
    if (kelvin < watch.warmestK() - FALLEN_K) {
      next = watch.withTemperature(kelvin, now, kelvin, now);
      return state.withWatch(next, ended(state, reading, news));
    }
    if (kelvin - low > WARMED_K && !warming) {
      book = book.put(event(state, EventKind.WARMING, reading, low, watch.coolestS()), news);
    }
    boolean failing = kelvin - low > FAILED_K && now - watch.coolestS() > STEADY_S;
    if (failing && !book.has(EventKind.COOLING_FAILURE)) {
      book =
          book.put(event(state, EventKind.COOLING_FAILURE, reading, low, watch.coolestS()), news);
    }
    return state.withWatch(next, book);
  }

  private static EventBook ended(BankState state, Reading reading, List<Event> news) {
    double pa = state.front() == null ? 0 : state.front().last().paGauge();
    return state
        .book()
        .close(EventKind.WARMING, reading.time(), pa, news)
        .close(EventKind.COOLING_FAILURE, reading.time(), pa, news);
  }

  private static Event event(
      BankState state, EventKind kind, Reading reading, double lowK, double sinceS) {
    double pa = state.front() == null ? 0 : state.front().last().paGauge();
    String why =
        String.format(
            Locale.ROOT,
            "warmed from %.1f to %.1f °C%s",
            lowK - Constants.ZERO_CELSIUS_K,
            state.senses().smoothK() - Constants.ZERO_CELSIUS_K,
            kind == EventKind.COOLING_FAILURE ? " without a pause, as if cooling were lost" : "");
    return new Event(
        kind,
        reading.vessel(),
        BankEstimator.instant(sinceS),
        reading.time(),
        true,
        pa,
        pa,
        0,
        kind == EventKind.WARMING ? 0.95 : 0.7,
        why);
  }
}

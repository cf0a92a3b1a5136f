package tunwarden.estimate;

import java.time.Instant;
import java.util.List;
import java.util.Locale;

/** Notices when nothing arrives for much longer than usual. */
final class GapWatch {
  private static final double LEAST_S = 60;
  private static final double USUAL_TIMES = 5;

  private GapWatch() {}

  static double limitS(Front front) {
    return Math.max(LEAST_S, USUAL_TIMES * front.intervalS());
  }

  static BankState idle(BankState state, Instant now, List<Event> news) {
    if (state.front() == null || state.book().has(EventKind.GAP)) {
      return state;
    }
    Front.Point last = state.front().last();
    boolean silent = BankEstimator.seconds(now) - last.atS() > limitS(state.front());
    return silent ? state.withBook(state.book().put(open(state, now), news)) : state;
  }

  private static Event open(BankState state, Instant now) {
    Front.Point last = state.front().last();
    String why =
        String.format(
            Locale.ROOT,
            "no reading for longer than %.0f s; usually one every %.0f s",
            limitS(state.front()),
            state.front().intervalS());
    return new Event(
        EventKind.GAP,
        state.medium().vessel().id(),
        BankEstimator.instant(last.atS()),
        now,
        true,
        last.paGauge(),
        last.paGauge(),
        0,
        1,
        why);
  }

  /** A reading arrived: a gap that was open ends, one that nobody ticked through is told whole. */
  static EventBook arrived(BankState state, EventBook book, Front.Point point, List<Event> news) {
    double gap = point.atS() - state.front().last().atS();
    EventBook next = book;
    if (!next.has(EventKind.GAP) && gap > limitS(state.front())) {
      next = next.put(open(state, BankEstimator.instant(point.atS())), news);
    }
    return next.has(EventKind.GAP)
        ? next.close(EventKind.GAP, BankEstimator.instant(point.atS()), point.paGauge(), news)
        : next;
  }
}

package tunwarden.screen.model;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import tunwarden.screen.model.ReplayStatus.TimeMark;

/** Keys that steer a replay, on every page. */
final class ReplayKeys {
  /** The paces offered, data seconds per real second. */
  private static final double[] PACES = {1, 2, 5, 10, 30, 60, 120, 300, 600, 1800, 3600, 10_000};

  private ReplayKeys() {}

  static Optional<Turn> press(Model model, Key key) {
    Optional<ReplayStatus> replay = model.board().replay();
    if (replay.isEmpty() || !key.is(Key.Kind.TYPED)) {
      return Optional.empty();
    }
    ReplayStatus at = replay.get();
    return switch (key.character()) {
      case ' ' -> ask(model, desk -> desk.pause(!at.paused()));
      case '>' -> ask(model, desk -> desk.pace(next(at.pace(), 1)));
      case '<' -> ask(model, desk -> desk.pace(next(at.pace(), -1)));
      case '.' -> ask(model, Desk::step);
      case 'e' -> toEvent(model, at, 1);
      case 'E' -> toEvent(model, at, -1);
      case 'k' -> question(model, Prompt.of(Prompt.Purpose.SEEK, "Go to (14:30, +2 h, -10 min)"));
      case 'm' -> question(model, Prompt.of(Prompt.Purpose.MARK, "Mark this moment as"));
      default -> Optional.empty();
    };
  }

  private static Optional<Turn> ask(Model model, Request request) {
    return Optional.of(Turn.asking(model, request));
  }

  private static Optional<Turn> question(Model model, Prompt prompt) {
    return Optional.of(Turn.to(model.edit().ask(prompt).done()));
  }

  private static double next(double pace, int direction) {
    double best = direction > 0 ? PACES[PACES.length - 1] : PACES[0];
    for (double offered : PACES) {
      boolean further = direction > 0 ? offered > pace : offered < pace;
      boolean nearer = direction > 0 ? offered < best : offered > best;
      if (further && nearer) {
        best = offered;
      }
    }
    return best;
  }

  private static Optional<Turn> toEvent(Model model, ReplayStatus at, int direction) {
    Optional<TimeMark> found = neighbour(at.events(), at.position(), direction);
    if (found.isEmpty()) {
      String which = direction > 0 ? "No later event is known yet." : "No earlier event.";
      return Optional.of(Turn.to(model.withSaid(which)));
    }
    return ask(model, desk -> desk.seek(found.get().time()));
  }

  private static Optional<TimeMark> neighbour(List<TimeMark> events, Instant from, int direction) {
    Optional<TimeMark> best = Optional.empty();
    for (TimeMark event : events) {
      int side = Integer.signum(event.time().compareTo(from));
      boolean nearer = best.isEmpty() || direction * event.time().compareTo(best.get().time()) < 0;
      if (side == direction && nearer) {
        best = Optional.of(event);
      }
    }
    return best;
  }
}

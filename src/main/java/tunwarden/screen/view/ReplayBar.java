package tunwarden.screen.view;

import java.time.Duration;
import java.time.Instant;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.ReplayStatus;
import tunwarden.screen.model.ReplayStatus.TimeMark;
import tunwarden.units.Display;

/** Where a replay stands in its log, with the events on the way. */
final class ReplayBar {
  private ReplayBar() {}

  static void draw(Canvas canvas, int y, Board board) {
    ReplayStatus replay = board.replay().orElseThrow();
    canvas.fill(0, y, canvas.columns(), " ", Role.NORMAL);
    if (!replay.trouble().isEmpty()) {
      canvas.fill(0, y, canvas.columns(), " ", Role.CAUTION_BAR);
      canvas.put(0, y, " ! " + replay.trouble(), Role.CAUTION_BAR);
      return;
    }
    String pace = "×" + Display.number(replay.pace(), 0);
    String state = replay.paused() ? " PAUSED " + pace + " " : " playing " + pace + " ";
    int x = canvas.put(0, y, state, replay.paused() ? Role.ORIGIN : Role.STRONG);
    x = canvas.put(x + 1, y, canvas.columns() / 4, replay.log() + " ", Role.NORMAL);
    x = canvas.put(x, y, Words.dayAndMinute(replay.from(), board.zone()) + " ", Role.DIM);
    // Until a log has been read once, where it ends is not known.
    String more = board.progress().isPresent() ? "… " : " ";
    String to = " " + Words.dayAndMinute(replay.to(), board.zone()) + more;
    int end = canvas.putRight(canvas.columns(), y, to, Role.DIM);
    int width = end - x;
    if (width < 8) {
      return;
    }
    int here = cell(replay, replay.position(), width);
    canvas.fill(x, y, here, "━", Role.STRONG);
    canvas.fill(x + here, y, width - here, "─", Role.DIM);
    for (TimeMark mark : replay.events()) {
      canvas.put(x + cell(replay, mark.time(), width), y, 1, "▲", Role.NORMAL);
    }
    canvas.put(x + here, y, 1, "●", Role.STRONG);
  }

  private static int cell(ReplayStatus replay, Instant time, int width) {
    double whole = Math.max(1, Duration.between(replay.from(), replay.to()).toMillis());
    double part = Duration.between(replay.from(), time).toMillis();
    return (int) Math.max(0, Math.min(width - 1, Math.floor(part / whole * width)));
  }
}

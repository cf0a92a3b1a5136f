package tunwarden.screen.terminal;

import java.time.temporal.ChronoUnit;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Model;

/** Whether two models are sure to give the same screen, found out without drawing. */
final class SameLook {
  private SameLook() {}

  static boolean of(Model a, Model b) {
    return onSecond(a).equals(onSecond(b));
  }

  /** The clock shows seconds, so nothing changes within one unless something else does. */
  private static Model onSecond(Model model) {
    Board board = model.board();
    return model.withBoard(
        new Board(
            board.origin(),
            board.now().truncatedTo(ChronoUnit.SECONDS),
            board.zone(),
            board.staleAfter(),
            board.vessels(),
            board.stationAlarms(),
            board.instruments(),
            board.replay(),
            board.journal(),
            board.progress()));
  }
}

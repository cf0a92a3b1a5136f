package tunwarden.screen.terminal;

import java.util.function.Supplier;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Desk;

/** The dashboard, from opening the terminal to giving it back. */
public final class Dashboard {
  private Dashboard() {}

  /**
   * Shows the board until the person quits, the input ends or the thread is interrupted. The
   * terminal is restored on every way out.
   *
   * @param latest gives the newest board; asked several times a second from the drawing thread, so
   *     it must return at once
   * @param desk carries out what the person asks for
   * @param options how to run
   * @throws NoTerminalException when standard input or output is no terminal
   */
  public static void run(Supplier<Board> latest, Desk desk, DashboardOptions options) {
    throw new NoTerminalException("this build has no terminal yet");
  }
}

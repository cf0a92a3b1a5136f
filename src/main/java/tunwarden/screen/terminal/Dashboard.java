package tunwarden.screen.terminal;

import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.screen.Screen;
import com.googlecode.lanterna.screen.TerminalScreen;
import com.googlecode.lanterna.terminal.Terminal;
import com.googlecode.lanterna.terminal.virtual.DefaultVirtualTerminal;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.function.Supplier;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Desk;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Size;
import tunwarden.screen.view.ScreenView;

/** The dashboard, from opening the terminal to giving it back. */
public final class Dashboard {
  private Dashboard() {}

  /**
   * Shows the board until the person quits, the input ends or the thread is interrupted. The
   * terminal is restored on every way out, an exception and SIGTERM among them.
   *
   * @param latest gives the newest board; asked several times a second from the drawing thread, so
   *     it must return at once
   * @param desk carries out what the person asks for
   * @param options how to run
   * @throws NoTerminalException when standard input or output is no terminal
   */
  public static void run(Supplier<Board> latest, Desk desk, DashboardOptions options) {
    PrintStream out = System.out;
    PrintStream err = System.err;
    Terminal terminal = Terminals.open(options.window());
    // Anything printed while the screen is up would tear it.
    PrintStream stray = new PrintStream(options.strayOutput(), true, StandardCharsets.UTF_8);
    System.setOut(stray);
    System.setErr(stray);
    try {
      runOn(terminal, latest, desk, options);
    } finally {
      System.setOut(out);
      System.setErr(err);
    }
  }

  /** Draws a board on a terminal that is only memory; loads what a first frame needs. */
  public static void drawInMemory(Board board) {
    try {
      TerminalScreen screen = new TerminalScreen(new DefaultVirtualTerminal());
      TerminalSize size = screen.getTerminalSize();
      Size cells = new Size(size.getColumns(), size.getRows());
      Model model = Model.start(board, Look.USUAL, cells);
      screen.startScreen();
      new Painter(screen).paint(ScreenView.draw(model), model.look().theme());
      screen.refresh(Screen.RefreshType.COMPLETE);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The same on a terminal already open, which is closed at the end. */
  static void runOn(
      Terminal terminal, Supplier<Board> latest, Desk desk, DashboardOptions options) {
    Thread hook = null;
    try {
      Session session = new Session(terminal, latest, desk, options);
      if (terminal instanceof Console console) {
        console.beforeLeaving(session::stopDrawing);
      } else {
        hook = hookFor(session, terminal);
        Runtime.getRuntime().addShutdownHook(hook);
      }
      try {
        session.run();
      } finally {
        giveBack(session, terminal);
      }
    } catch (IOException terminalGone) {
      throw new NoTerminalException("the terminal went away: " + terminalGone.getMessage());
    } finally {
      forget(hook);
    }
  }

  /** The Unix console brings its own hook; the others need one. */
  private static Thread hookFor(Session session, Terminal terminal) {
    return new Thread(() -> Patience.within("leaving", () -> giveBack(session, terminal)), "leave");
  }

  private static void giveBack(Session session, Terminal terminal) throws IOException {
    try {
      session.leave();
    } finally {
      close(terminal);
    }
  }

  private static void close(Terminal terminal) throws IOException {
    try {
      terminal.close();
    } catch (IllegalStateException ignored) {
      // Already on the way down: the terminal library's own hook has restored it.
    }
  }

  private static void forget(Thread hook) {
    if (hook == null) {
      return;
    }
    try {
      Runtime.getRuntime().removeShutdownHook(hook);
    } catch (IllegalStateException ignored) {
      // Already on the way down: the hook is doing its work.
    }
  }
}

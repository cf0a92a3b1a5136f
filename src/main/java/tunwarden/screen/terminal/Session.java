package tunwarden.screen.terminal;

import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.input.KeyStroke;
import com.googlecode.lanterna.input.KeyType;
import com.googlecode.lanterna.screen.Screen;
import com.googlecode.lanterna.screen.TerminalScreen;
import com.googlecode.lanterna.terminal.Terminal;
import java.io.IOException;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Supplier;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Desk;
import tunwarden.screen.model.Key;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Request;
import tunwarden.screen.model.Size;
import tunwarden.screen.model.Turn;
import tunwarden.screen.model.Update;
import tunwarden.screen.view.Canvas;
import tunwarden.screen.view.ScreenView;

/**
 * One run of the dashboard on a terminal. The caller's thread reads keys and updates the model; a
 * thread of its own draws. The model goes from one to the other through one reference.
 */
final class Session {
  /** Something played is watched moving; what is live changes once a second. */
  private static final long PLAYED_BEAT_MS = 300;

  private static final long LIVE_BEAT_MS = 1_000;

  /** After the turn of the second, so that the clock is never seen to skip one. */
  private static final long AFTER_THE_SECOND_MS = 20;

  /** Keys are looked for often while someone types, seldom while nobody does. */
  private static final long BUSY_POLL_MS = 10;

  private static final long IDLE_POLL_MS = 100;
  private static final int BUSY_POLLS = 300;

  private final Terminal terminal;
  private final TerminalScreen screen;
  private final Supplier<Board> latest;
  private final Desk desk;
  private final DashboardOptions options;
  private final AtomicReference<Model> model;
  private final Object wake = new Object();
  private final Thread drawing = new Thread(this::drawUntilOver, "screen");
  private volatile Board seen;
  private volatile boolean repaint;
  private volatile boolean over;
  private volatile RuntimeException failure;
  private boolean woken;

  Session(Terminal terminal, Supplier<Board> latest, Desk desk, DashboardOptions options)
      throws IOException {
    this.terminal = terminal;
    this.screen = new TerminalScreen(terminal);
    this.latest = latest;
    this.desk = desk;
    this.options = options;
    Size size = size(screen.getTerminalSize());
    this.seen = latest.get();
    this.model = new AtomicReference<>(Model.start(seen, options.look(), size));
    drawing.setDaemon(true);
  }

  /** Runs until the person leaves, input ends, the thread is interrupted or drawing fails. */
  void run() throws IOException {
    screen.startScreen();
    screen.setCursorPosition(null);
    drawing.start();
    try {
      readKeys();
    } finally {
      stopDrawing();
    }
    if (failure != null) {
      throw failure;
    }
  }

  /** Gives the terminal back, unless it takes no more output; on whatever way out. */
  void leave() {
    stopDrawing();
    Patience.within("leaving the screen", () -> screen.stopScreen(false));
  }

  /** Stops the drawing thread and waits for its last frame, but not for a stalled terminal. */
  void stopDrawing() {
    over = true;
    wake();
    if (Thread.currentThread() != drawing) {
      Patience.await(drawing);
    }
  }

  private void readKeys() throws IOException {
    try {
      int quiet = 0;
      while (!over) {
        KeyStroke stroke = screen.pollInput();
        quiet = stroke == null ? quiet + 1 : 0;
        if (stroke == null) {
          Thread.sleep(quiet < BUSY_POLLS ? BUSY_POLL_MS : IDLE_POLL_MS);
        } else if (stroke.getKeyType() == KeyType.EOF) {
          over = true;
        } else {
          press(Keys.of(stroke));
        }
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private void press(Key key) {
    if (key.is(Key.Kind.REPAINT)) {
      repaint = true;
    }
    // What a key means is decided by what the person has seen, not by what came in since.
    Turn turn = Update.key(model.get().withBoard(seen), key);
    Model next = turn.model();
    for (Request request : turn.requests()) {
      String said = request.of(desk);
      next = said.isEmpty() ? next : next.withSaid(said);
    }
    model.set(next);
    over |= next.over();
    wake();
  }

  private void wake() {
    synchronized (wake) {
      woken = true;
      wake.notifyAll();
    }
  }

  private void drawUntilOver() {
    Frames frames = new Frames(screen);
    Chime chime = new Chime();
    boolean shown = false;
    try {
      while (!over) {
        Board board = latest.get();
        if (options.bell() && chime.isDue(board)) {
          terminal.bell();
        }
        draw(frames, board);
        if (!shown) {
          shown = true;
          options.onceShown().run();
        }
        pause(beat(board));
      }
    } catch (IOException terminalGone) {
      over = true;
    } catch (RuntimeException e) {
      failure = e;
      over = true;
    }
  }

  private void draw(Frames frames, Board board) throws IOException {
    TerminalSize resized = screen.doResizeIfNecessary();
    boolean whole = resized != null || repaint;
    repaint = false;
    Size size = size(screen.getTerminalSize());
    Model now = model.get().withBoard(board).withSize(size);
    frames.show(now, whole);
    seen = board;
  }

  private static long beat(Board board) {
    boolean slow = board.replay().map(replay -> replay.pace() <= 1).orElse(false);
    if (board.origin() != Origin.LIVE && !slow) {
      return PLAYED_BEAT_MS;
    }
    long into = Math.floorMod(board.now().toEpochMilli(), LIVE_BEAT_MS);
    return LIVE_BEAT_MS - into + AFTER_THE_SECOND_MS;
  }

  /** Waits for the next beat or a key, whichever comes first. */
  private void pause(long mostMs) {
    synchronized (wake) {
      try {
        if (!woken) {
          wake.wait(mostMs);
        }
        woken = false;
      } catch (InterruptedException e) {
        over = true;
      }
    }
  }

  private static Size size(TerminalSize size) {
    return new Size(size.getColumns(), size.getRows());
  }

  /** Draws a model unless it would look as the last one did. */
  private static final class Frames {
    private final Screen screen;
    private final Painter painter;
    private Model shown;

    Frames(Screen screen) {
      this.screen = screen;
      this.painter = new Painter(screen);
    }

    void show(Model model, boolean whole) throws IOException {
      if (!whole && shown != null && SameLook.of(shown, model)) {
        return;
      }
      Canvas canvas = ScreenView.draw(model);
      if (whole) {
        painter.forget();
      }
      if (painter.paint(canvas, model.look().theme())) {
        screen.refresh(whole ? Screen.RefreshType.COMPLETE : Screen.RefreshType.DELTA);
      }
      shown = model;
    }
  }
}

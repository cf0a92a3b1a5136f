package tunwarden.screen.terminal;

import java.io.IOException;
import java.io.OutputStream;
import java.time.Instant;
import java.util.concurrent.atomic.AtomicInteger;
import tunwarden.screen.Boards;
import tunwarden.screen.RecordingDesk;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Origin;

/**
 * The dashboard on an invented board in a process of its own, to be tried on a pseudo-terminal:
 * {@code preview.failAfter} breaks the board after so many, {@code preview.adapter} goes through
 * the console adapter.
 */
public final class TerminalPreview {
  private static final AtomicInteger asked = new AtomicInteger();

  private TerminalPreview() {}

  /** Runs until left. */
  public static void main(String[] args) throws IOException {
    Board board = Boards.three(Origin.REHEARSAL, Instant.now());
    DashboardOptions options =
        new DashboardOptions(Look.USUAL, false, true, OutputStream.nullOutputStream(), () -> {});
    if (Boolean.getBoolean("preview.adapter")) {
      Dashboard.runOn(new JlineTerminal(), () -> next(board), new RecordingDesk(), options);
    } else {
      Dashboard.run(() -> next(board), new RecordingDesk(), options);
    }
  }

  private static Board next(Board board) {
    if (asked.incrementAndGet() == Integer.getInteger("preview.failAfter", -1)) {
      throw new IllegalStateException("the invented board broke");
    }
    return Boards.at(board, Instant.now());
  }
}

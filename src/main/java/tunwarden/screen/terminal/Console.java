package tunwarden.screen.terminal;

import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.terminal.ansi.UnixTerminal;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A Unix terminal set up for the dashboard: Control-C, Control-Z, Control-backslash and Control-S
 * are plain keys, the size is asked of the driver instead of the far end, and leaving waits for the
 * drawing to stop but never for a terminal that takes no more output.
 */
final class Console extends UnixTerminal {
  private static final Pattern ROWS_AND_COLUMNS = Pattern.compile("(\\d+)\\s+(\\d+)\\s*");

  private volatile Runnable beforeLeaving = () -> {};
  private volatile TerminalSize known;

  Console(InputStream in, OutputStream out) throws IOException {
    super(in, out, StandardCharsets.UTF_8, CtrlCBehaviour.TRAP);
  }

  /**
   * All at once and the size with it, since every call starts a process. Without the second line
   * Control-Z would leave a shell inside our screen, and Control-S would stop it.
   */
  @Override
  protected void canonicalMode(boolean enabled) throws IOException {
    known =
        size(
            runSTTYCommand(
                "-icanon", "min", "1", "-echo", "intr", "undef", //
                "susp", "undef", "quit", "undef", "-ixon", "size"));
  }

  @Override
  protected void keyEchoEnabled(boolean enabled) {
    // See canonicalMode.
  }

  @Override
  protected void keyStrokeSignalsEnabled(boolean enabled) {
    // See canonicalMode.
  }

  /** What must have stopped before the terminal is given back. */
  void beforeLeaving(Runnable action) {
    beforeLeaving = action;
  }

  /** Asking the driver starts a process, so it is asked again only when it says so. */
  @Override
  protected void registerTerminalResizeListener(Runnable listener) throws IOException {
    super.registerTerminalResizeListener(
        () -> {
          known = null;
          listener.run();
        });
  }

  @Override
  protected TerminalSize findTerminalSize() throws IOException {
    TerminalSize size = known;
    if (size == null) {
      size = askDriver();
      known = size;
    }
    return size;
  }

  private TerminalSize askDriver() throws IOException {
    TerminalSize size = size(runSTTYCommand("size"));
    return size == null ? super.findTerminalSize() : size;
  }

  /** What the driver answered; null if that was no size. */
  private static TerminalSize size(String answer) {
    Matcher size = ROWS_AND_COLUMNS.matcher(answer);
    if (!size.matches()) {
      return null;
    }
    int rows = Integer.parseInt(size.group(1));
    int columns = Integer.parseInt(size.group(2));
    return rows > 0 && columns > 0 ? new TerminalSize(columns, rows) : new TerminalSize(80, 24);
  }

  @Override
  public void exitPrivateMode() {
    beforeLeaving.run();
    Patience.within("leaving the screen", this::leaveScreen);
  }

  /** The terminal library does not flush what it writes on leaving. */
  private void leaveScreen() throws IOException {
    super.exitPrivateMode();
    flush();
  }

  @Override
  protected void restoreTerminalSettings() {
    Patience.within("restoring the terminal", () -> super.restoreTerminalSettings());
  }
}

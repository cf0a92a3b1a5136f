package tunwarden.screen.terminal;

import com.googlecode.lanterna.terminal.Terminal;
import com.googlecode.lanterna.terminal.swing.SwingTerminalFrame;
import com.googlecode.lanterna.terminal.swing.TerminalEmulatorAutoCloseTrigger;
import java.awt.GraphicsEnvironment;
import java.io.BufferedOutputStream;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.util.Locale;

/** Opens the terminal that suits the machine; never guesses by trial. */
final class Terminals {
  private static final int BUFFER = 1 << 14;

  private Terminals() {}

  /**
   * The terminal to draw on.
   *
   * @throws NoTerminalException when there is none, saying what would be right
   */
  static Terminal open(boolean window) {
    try {
      if (window) {
        return openWindow();
      }
      if (System.console() == null) {
        throw new NoTerminalException(
            "the dashboard needs a terminal for input and output; use headless instead, or --window");
      }
      return isWindows() ? new JlineTerminal() : new Console(input(), output());
    } catch (IOException e) {
      throw new NoTerminalException("the terminal cannot be used: " + e.getMessage());
    }
  }

  private static boolean isWindows() {
    return System.getProperty("os.name", "").toLowerCase(Locale.ROOT).startsWith("windows");
  }

  private static FileInputStream input() {
    return new FileInputStream(FileDescriptor.in);
  }

  private static OutputStream output() {
    return new BufferedOutputStream(new FileOutputStream(FileDescriptor.out), BUFFER);
  }

  private static Terminal openWindow() {
    if (GraphicsEnvironment.isHeadless()) {
      throw new NoTerminalException("there is no display to open a window on; leave --window out");
    }
    SwingTerminalFrame frame =
        new SwingTerminalFrame(
            "Tunwarden", TerminalEmulatorAutoCloseTrigger.CloseOnExitPrivateMode);
    frame.setVisible(true);
    return frame;
  }
}

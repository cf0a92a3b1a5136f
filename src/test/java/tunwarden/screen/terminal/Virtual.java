package tunwarden.screen.terminal;

import com.googlecode.lanterna.SGR;
import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.TextCharacter;
import com.googlecode.lanterna.screen.Screen;
import com.googlecode.lanterna.screen.TerminalScreen;
import com.googlecode.lanterna.terminal.virtual.DefaultVirtualTerminal;
import java.io.IOException;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Size;
import tunwarden.screen.view.Canvas;
import tunwarden.screen.view.ScreenView;

/** A terminal without a terminal: what a model looks like once it has gone all the way. */
final class Virtual {
  private final DefaultVirtualTerminal terminal;
  private final TerminalScreen screen;
  private final Painter painter;

  Virtual(Size size) throws IOException {
    terminal = new DefaultVirtualTerminal(new TerminalSize(size.columns(), size.rows()));
    screen = new TerminalScreen(terminal);
    screen.startScreen();
    painter = new Painter(screen);
  }

  void resize(Size size) {
    terminal.setTerminalSize(new TerminalSize(size.columns(), size.rows()));
  }

  /** Shows a model at the terminal's own size, the way a session does, and gives its canvas. */
  Canvas show(Model model) throws IOException {
    boolean resized = screen.doResizeIfNecessary() != null;
    TerminalSize size = screen.getTerminalSize();
    Canvas canvas = ScreenView.draw(model.withSize(new Size(size.getColumns(), size.getRows())));
    if (resized) {
      painter.forget();
    }
    painter.paint(canvas, model.look().theme());
    screen.refresh(resized ? Screen.RefreshType.COMPLETE : Screen.RefreshType.DELTA);
    return canvas;
  }

  /** The characters on the terminal, rows without trailing blanks. */
  String text() {
    StringBuilder all = new StringBuilder();
    for (int y = 0; y < terminal.getTerminalSize().getRows(); y++) {
      StringBuilder row = new StringBuilder();
      int columns = terminal.getTerminalSize().getColumns();
      for (int x = 0; x < columns; x++) {
        TextCharacter cell = terminal.getCharacter(x, y);
        row.append(cell.getCharacterString());
        x += cell.isDoubleWidth() ? 1 : 0;
      }
      all.append(row.toString().stripTrailing()).append('\n');
    }
    return all.toString();
  }

  /** One letter for the paint of every cell, a legend below. */
  String paint() {
    StringBuilder all = new StringBuilder();
    java.util.LinkedHashMap<String, Character> legend = new java.util.LinkedHashMap<>();
    for (int y = 0; y < terminal.getTerminalSize().getRows(); y++) {
      for (int x = 0; x < terminal.getTerminalSize().getColumns(); x++) {
        String ink = ink(terminal.getCharacter(x, y));
        all.append(legend.computeIfAbsent(ink, k -> (char) ('a' + legend.size())));
      }
      all.append('\n');
    }
    legend.forEach((ink, letter) -> all.append(letter).append(' ').append(ink).append('\n'));
    return all.toString();
  }

  private static String ink(TextCharacter cell) {
    String strokes =
        (cell.getModifiers().contains(SGR.BOLD) ? " bold" : "")
            + (cell.getModifiers().contains(SGR.REVERSE) ? " reverse" : "");
    return cell.getForegroundColor() + " on " + cell.getBackgroundColor() + strokes;
  }
}

package tunwarden.screen.terminal;

import com.googlecode.lanterna.SGR;
import com.googlecode.lanterna.TerminalSize;
import com.googlecode.lanterna.TextCharacter;
import com.googlecode.lanterna.screen.Screen;
import com.googlecode.lanterna.screen.TerminalScreen;
import com.googlecode.lanterna.terminal.virtual.DefaultVirtualTerminal;
import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.Map;
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

  /**
   * One letter for the paint of every cell, runs of a letter counted, rows alike counted, a legend
   * below: {@code 3 x a20 b60} is three rows of twenty cells of a and sixty of b.
   */
  String paint() {
    StringBuilder all = new StringBuilder();
    Map<String, Character> legend = new LinkedHashMap<>();
    String before = "";
    int alike = 0;
    for (int y = 0; y < terminal.getTerminalSize().getRows(); y++) {
      String row = runs(y, legend);
      if (!row.equals(before)) {
        append(all, alike, before);
        alike = 0;
      }
      before = row;
      alike++;
    }
    append(all, alike, before);
    legend.forEach((ink, letter) -> all.append(letter).append(' ').append(ink).append('\n'));
    return all.toString();
  }

  private static void append(StringBuilder all, int alike, String row) {
    if (alike > 0) {
      all.append(alike == 1 ? "" : alike + " x ").append(row).append('\n');
    }
  }

  private String runs(int y, Map<String, Character> legend) {
    StringBuilder row = new StringBuilder();
    char before = 0;
    int run = 0;
    for (int x = 0; x < terminal.getTerminalSize().getColumns(); x++) {
      String ink = ink(terminal.getCharacter(x, y));
      char letter = legend.computeIfAbsent(ink, k -> (char) ('a' + legend.size()));
      if (run > 0 && letter != before) {
        row.append(before).append(run).append(' ');
        run = 0;
      }
      before = letter;
      run++;
    }
    return row.append(before).append(run).toString();
  }

  private static String ink(TextCharacter cell) {
    String strokes =
        (cell.getModifiers().contains(SGR.BOLD) ? " bold" : "")
            + (cell.getModifiers().contains(SGR.REVERSE) ? " reverse" : "");
    return cell.getForegroundColor() + " on " + cell.getBackgroundColor() + strokes;
  }
}

package tunwarden.screen.terminal;

import com.googlecode.lanterna.SGR;
import com.googlecode.lanterna.TextCharacter;
import com.googlecode.lanterna.TextColor;
import com.googlecode.lanterna.screen.Screen;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.Map;
import tunwarden.screen.model.Theme;
import tunwarden.screen.view.Canvas;
import tunwarden.screen.view.Ink;
import tunwarden.screen.view.Palette;
import tunwarden.screen.view.Role;

/**
 * Puts a canvas on the terminal library's screen, touching only cells that changed. The second half
 * of a two-column character is left alone, since setting it would blank the first.
 */
final class Painter {
  private static final int MOST_CACHED = 20_000;

  private final Screen screen;
  private final Map<Cell, TextCharacter> cache = new HashMap<>();
  private Canvas shown;
  private Theme shownTheme;

  private record Cell(String glyph, Role role, Theme theme) {}

  Painter(Screen screen) {
    this.screen = screen;
  }

  /** Forgets what is shown, so that the next canvas is put up whole. */
  void forget() {
    shown = null;
  }

  /** Puts the cells that differ from the last canvas; says whether there were any. */
  boolean paint(Canvas canvas, Theme theme) {
    boolean whole =
        shown == null
            || theme != shownTheme
            || shown.columns() != canvas.columns()
            || shown.rows() != canvas.rows();
    boolean changed = whole;
    for (int y = 0; y < canvas.rows(); y++) {
      for (int x = 0; x < canvas.columns(); x++) {
        boolean secondHalf = canvas.glyph(x, y).isEmpty();
        if (!secondHalf && (whole || differs(canvas, x, y))) {
          screen.setCharacter(x, y, character(canvas.glyph(x, y), canvas.role(x, y), theme));
          changed = true;
        }
      }
    }
    shown = canvas;
    shownTheme = theme;
    return changed;
  }

  private boolean differs(Canvas canvas, int x, int y) {
    return canvas.role(x, y) != shown.role(x, y) || !canvas.glyph(x, y).equals(shown.glyph(x, y));
  }

  private TextCharacter character(String glyph, Role role, Theme theme) {
    if (cache.size() > MOST_CACHED) {
      cache.clear();
    }
    return cache.computeIfAbsent(new Cell(glyph, role, theme), Painter::make);
  }

  private static TextCharacter make(Cell cell) {
    Ink ink = Palette.ink(cell.theme(), cell.role());
    EnumSet<SGR> strokes = EnumSet.noneOf(SGR.class);
    if (ink.bold()) {
      strokes.add(SGR.BOLD);
    }
    if (ink.reverse()) {
      strokes.add(SGR.REVERSE);
    }
    TextColor foreground = colour(ink.foreground());
    TextColor background = colour(ink.background());
    TextCharacter[] made = TextCharacter.fromString(cell.glyph(), foreground, background, strokes);
    return made[0];
  }

  private static TextColor colour(int index) {
    return index < 0 ? TextColor.ANSI.DEFAULT : new TextColor.Indexed(index);
  }
}

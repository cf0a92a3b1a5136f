package tunwarden.screen.view;

import java.util.Arrays;

/**
 * A grid of cells to draw on. Everything outside is cut off, so no view can draw past its edge. A
 * two-column character leaves its second cell empty.
 */
public final class Canvas {
  private static final String BLANK = " ";
  private static final String[] ASCII = new String[127];

  static {
    for (char c = 0; c < ASCII.length; c++) {
      ASCII[c] = String.valueOf(c);
    }
  }

  private final int columns;
  private final int rows;
  private final boolean ascii;
  private final String[] glyph;
  private final Role[] role;

  /** A blank canvas; one for plain ASCII spells everything drawn on it in ASCII. */
  public Canvas(int columns, int rows, boolean ascii) {
    this.columns = columns;
    this.rows = rows;
    this.ascii = ascii;
    glyph = new String[columns * rows];
    role = new Role[columns * rows];
    Arrays.fill(glyph, BLANK);
    Arrays.fill(role, Role.NORMAL);
  }

  public int columns() {
    return columns;
  }

  public int rows() {
    return rows;
  }

  public boolean isAscii() {
    return ascii;
  }

  /** The whole of it. */
  public Area area() {
    return new Area(0, 0, columns, rows);
  }

  /** What stands in a cell; empty in the second cell of a two-column character. */
  public String glyph(int x, int y) {
    return glyph[y * columns + x];
  }

  public Role role(int x, int y) {
    return role[y * columns + x];
  }

  /** Columns the text will take on this canvas. */
  public int width(String text) {
    return Cells.width(spelled(text));
  }

  /** The text as it will be drawn here. */
  String spelled(String text) {
    String clean = Cells.clean(text);
    return ascii ? Plain.of(clean) : clean;
  }

  /** Draws text and returns the column after it. */
  public int put(int x, int y, String text, Role as) {
    return put(x, y, columns - x, text, as);
  }

  /** Draws text in at most {@code width} columns, cut with an ellipsis; returns the next column. */
  public int put(int x, int y, int width, String text, Role as) {
    String spelled = spelled(text);
    int end = Math.min(columns, x + width);
    if (Cells.width(spelled) > width && width > 1) {
      spelled = cut(spelled, width - 1) + (ascii ? "~" : "…");
    }
    int at = x;
    for (int i = 0; i < spelled.length(); i += Character.charCount(spelled.codePointAt(i))) {
      int codePoint = spelled.codePointAt(i);
      int wide = Cells.width(codePoint);
      if (at + wide > end) {
        break;
      }
      set(at, y, symbol(codePoint), as);
      if (wide == 2) {
        set(at + 1, y, "", as);
      }
      at += wide;
    }
    return at;
  }

  /** Draws text so that it ends before column {@code end}; returns where it began. */
  public int putRight(int end, int y, String text, Role as) {
    int start = end - width(text);
    put(start, y, text, as);
    return start;
  }

  /** Gives every cell of a stretch a role, leaving what stands there. */
  public void tint(int x, int y, int width, Role as) {
    for (int i = Math.max(0, x); i < Math.min(columns, x + width); i++) {
      if (y >= 0 && y < rows) {
        role[y * columns + i] = as;
      }
    }
  }

  /** Fills a stretch with one character. */
  public void fill(int x, int y, int width, String character, Role as) {
    for (int i = x; i < x + width; i++) {
      put(i, y, 1, character, as);
    }
  }

  private void set(int x, int y, String symbol, Role as) {
    if (inside(x, y)) {
      mendNeighbours(x, y, symbol);
      glyph[y * columns + x] = symbol;
      role[y * columns + x] = as;
    }
  }

  /** Half of a two-column character must not stay behind when the other half is drawn over. */
  private void mendNeighbours(int x, int y, String symbol) {
    int at = y * columns + x;
    if (glyph[at].isEmpty() && !symbol.isEmpty() && x > 0) {
      glyph[at - 1] = BLANK;
    }
    if (x + 1 < columns && glyph[at + 1].isEmpty() && !glyph[at].isEmpty()) {
      glyph[at + 1] = BLANK;
    }
  }

  private boolean inside(int x, int y) {
    return x >= 0 && x < columns && y >= 0 && y < rows;
  }

  private static String symbol(int codePoint) {
    return codePoint < ASCII.length ? ASCII[codePoint] : Character.toString(codePoint).intern();
  }

  private static String cut(String text, int width) {
    int sum = 0;
    int i = 0;
    while (i < text.length()) {
      int wide = Cells.width(text.codePointAt(i));
      if (sum + wide > width) {
        break;
      }
      sum += wide;
      i += Character.charCount(text.codePointAt(i));
    }
    return text.substring(0, i);
  }

  /** The characters alone, rows without trailing blanks, for tests and for saving a screen. */
  public String text() {
    StringBuilder all = new StringBuilder();
    for (int y = 0; y < rows; y++) {
      StringBuilder row = new StringBuilder();
      for (int x = 0; x < columns; x++) {
        row.append(glyph(x, y));
      }
      all.append(row.toString().stripTrailing()).append('\n');
    }
    return all.toString();
  }
}

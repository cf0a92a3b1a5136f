package tunwarden.screen.view;

import tunwarden.screen.model.Glyphs;

/** Fine dots, several to the cell, for lines in charts. Row 0 is the top. */
final class Raster {
  /** Bit of each Braille dot by column and row (Unicode block Braille Patterns). */
  private static final int[][] BRAILLE = {{0x01, 0x02, 0x04, 0x40}, {0x08, 0x10, 0x20, 0x80}};

  /** Quadrants: bit 1 upper left, 2 upper right, 4 lower left, 8 lower right. */
  private static final String QUADRANTS = " ▘▝▀▖▌▞▛▗▚▐▜▄▙▟█";

  /** Halves: bit 1 upper, 2 lower. */
  private static final String HALVES = " '.:";

  private final int columns;
  private final int rows;
  private final Glyphs glyphs;
  private final int[] bits;

  Raster(int columns, int rows, Glyphs glyphs) {
    this.columns = columns;
    this.rows = rows;
    this.glyphs = glyphs;
    bits = new int[columns * rows];
  }

  static int dotsAcross(Glyphs glyphs) {
    return glyphs == Glyphs.ASCII ? 1 : 2;
  }

  static int dotsDown(Glyphs glyphs) {
    return glyphs == Glyphs.BRAILLE ? 4 : 2;
  }

  int width() {
    return columns * dotsAcross(glyphs);
  }

  int height() {
    return rows * dotsDown(glyphs);
  }

  /** Sets one dot; one outside is left out. */
  void dot(int x, int y) {
    if (x < 0 || x >= width() || y < 0 || y >= height()) {
      return;
    }
    int inX = x % dotsAcross(glyphs);
    int inY = y % dotsDown(glyphs);
    int bit =
        switch (glyphs) {
          case BRAILLE -> BRAILLE[inX][inY];
          case BLOCKS -> 1 << (inX + 2 * inY);
          case ASCII -> 1 << inY;
        };
    bits[y / dotsDown(glyphs) * columns + x / dotsAcross(glyphs)] |= bit;
  }

  /** Sets the dots of one column from one row to another, in either order. */
  void column(int x, int fromY, int toY) {
    int low = Math.max(0, Math.min(fromY, toY));
    int high = Math.min(height() - 1, Math.max(fromY, toY));
    for (int y = low; y <= high; y++) {
      dot(x, y);
    }
  }

  /** Draws the cells that hold a dot; the others are left as they are. */
  void draw(Canvas canvas, int x, int y, Role as) {
    for (int row = 0; row < rows; row++) {
      for (int column = 0; column < columns; column++) {
        int value = bits[row * columns + column];
        if (value != 0) {
          canvas.put(x + column, y + row, 1, symbol(value), as);
        }
      }
    }
  }

  private String symbol(int value) {
    return switch (glyphs) {
      case BRAILLE -> Character.toString(0x2800 + value);
      case BLOCKS -> QUADRANTS.substring(value, value + 1);
      case ASCII -> HALVES.substring(value, value + 1);
    };
  }
}

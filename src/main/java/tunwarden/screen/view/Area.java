package tunwarden.screen.view;

/**
 * A rectangle of cells.
 *
 * @param x first column
 * @param y first row
 * @param columns width
 * @param rows height
 */
public record Area(int x, int y, int columns, int rows) {
  /** Column after the last. */
  public int right() {
    return x + columns;
  }

  /** Row after the last. */
  public int bottom() {
    return y + rows;
  }

  Area left(int width) {
    return new Area(x, y, Math.min(width, columns), rows);
  }

  /** What remains right of so many columns. */
  Area without(int width) {
    return new Area(x + width, y, Math.max(0, columns - width), rows);
  }

  Area top(int height) {
    return new Area(x, y, columns, Math.min(height, rows));
  }

  /** What remains below so many rows. */
  Area below(int height) {
    return new Area(x, y + height, columns, Math.max(0, rows - height));
  }
}

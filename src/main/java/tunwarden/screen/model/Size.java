package tunwarden.screen.model;

/** Size of the screen in character cells. */
public record Size(int columns, int rows) {
  /** The least on which the pages are drawn; below it there is only a message. */
  public static final Size LEAST = new Size(60, 20);

  /** Whether the pages can be drawn. */
  public boolean isEnough() {
    return columns >= LEAST.columns && rows >= LEAST.rows;
  }
}

package tunwarden.screen.model;

/** What charts and lines are drawn with. */
public enum Glyphs {
  /** Four by two dots to the cell; needs a font that has the Braille patterns. */
  BRAILLE,
  /** Eighths of a block; in nearly every font. */
  BLOCKS,
  /** Plain ASCII. */
  ASCII;

  public boolean isAscii() {
    return this == ASCII;
  }
}

package tunwarden.screen.model;

import tunwarden.units.Display;

/**
 * What a person has chosen about appearance.
 *
 * @param units units of every number shown
 * @param theme colours
 * @param glyphs drawing characters
 */
public record Look(Display units, Theme theme, Glyphs glyphs) {
  /** Metric, dark, block elements. */
  public static final Look USUAL = new Look(Display.METRIC, Theme.DARK, Glyphs.BLOCKS);

  /** The next choice of units. */
  public Look nextUnits() {
    return new Look(units.next(), theme, glyphs);
  }

  /** The next theme. */
  public Look nextTheme() {
    return new Look(units, theme.next(), glyphs);
  }

  /** The next drawing characters. */
  public Look nextGlyphs() {
    return withGlyphs(Glyphs.values()[(glyphs.ordinal() + 1) % Glyphs.values().length]);
  }

  /** The same with other glyphs. */
  public Look withGlyphs(Glyphs other) {
    return new Look(units, theme, other);
  }
}

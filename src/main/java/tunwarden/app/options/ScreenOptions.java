package tunwarden.app.options;

import picocli.CommandLine.Option;
import tunwarden.screen.model.Glyphs;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Theme;

/** How a dashboard looks. */
public final class ScreenOptions {
  /** Names of the glyph sets on the command line. */
  public enum GlyphChoice {
    blocks,
    braille,
    ascii
  }

  /** Names of the themes on the command line. */
  public enum ThemeChoice {
    dark,
    light,
    monochrome
  }

  @Option(names = "--ascii", description = "Draw with plain ASCII characters.")
  private boolean ascii;

  @Option(
      names = "--glyphs",
      paramLabel = "SET",
      description = "What charts are drawn with: ${COMPLETION-CANDIDATES}.")
  private GlyphChoice glyphs;

  @Option(
      names = "--theme",
      paramLabel = "THEME",
      description = "Colours: ${COMPLETION-CANDIDATES}.")
  private ThemeChoice theme;

  @Option(names = "--window", description = "Open a window instead of using the terminal.")
  private boolean window;

  @Option(names = "--bell", description = "Ring the terminal bell when an alarm is raised.")
  private boolean bell;

  /** Whether a window of its own is wanted. */
  public boolean window() {
    return window;
  }

  /** Whether a new alarm rings the bell. */
  public boolean bell() {
    return bell;
  }

  /**
   * The look to begin with.
   *
   * @param kept what was chosen last time
   * @param unicode whether the terminal can show more than ASCII
   */
  public Look look(Look kept, boolean unicode) {
    Look look = kept;
    if (theme != null) {
      look = new Look(look.units(), Theme.values()[theme.ordinal()], look.glyphs());
    }
    if (glyphs != null) {
      look = look.withGlyphs(chosenGlyphs());
    }
    boolean plain = ascii || (!unicode && !window);
    return plain ? look.withGlyphs(Glyphs.ASCII) : look;
  }

  private Glyphs chosenGlyphs() {
    return switch (glyphs) {
      case blocks -> Glyphs.BLOCKS;
      case braille -> Glyphs.BRAILLE;
      default -> Glyphs.ASCII;
    };
  }
}

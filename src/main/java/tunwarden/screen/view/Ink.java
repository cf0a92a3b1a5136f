package tunwarden.screen.view;

/**
 * How a role is painted.
 *
 * @param foreground colour of the 256-colour palette, or -1 for the terminal's own
 * @param background likewise
 * @param bold heavier strokes
 * @param reverse foreground and background exchanged
 */
public record Ink(int foreground, int background, boolean bold, boolean reverse) {
  static Ink of(int foreground, int background) {
    return new Ink(foreground, background, false, false);
  }

  static Ink bold(int foreground, int background) {
    return new Ink(foreground, background, true, false);
  }
}

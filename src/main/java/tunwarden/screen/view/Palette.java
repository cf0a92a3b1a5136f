package tunwarden.screen.view;

import java.util.EnumMap;
import java.util.Map;
import tunwarden.screen.model.Theme;

/** The paint of every role in every theme. */
public final class Palette {
  private static final Map<Theme, Map<Role, Ink>> INKS = new EnumMap<>(Theme.class);

  static {
    INKS.put(
        Theme.DARK, coloured(new Shades(234, 236, 240, 250, 243, 255), new Hues(221, 203, 25)));
    INKS.put(
        Theme.LIGHT, coloured(new Shades(255, 253, 250, 238, 245, 232), new Hues(130, 160, 153)));
    INKS.put(Theme.MONOCHROME, monochrome());
  }

  private Palette() {}

  /** Greys: ground, bar ground, chosen ground, text, faint text, strong text. */
  private record Shades(int ground, int bar, int chosen, int text, int faint, int strong) {}

  /** Yellow, red and blue fit for the ground. */
  private record Hues(int yellow, int red, int blue) {}

  /** The ink of a role. */
  public static Ink ink(Theme theme, Role role) {
    return INKS.get(theme).get(role);
  }

  private static Map<Role, Ink> coloured(Shades grey, Hues hue) {
    Map<Role, Ink> inks = new EnumMap<>(Role.class);
    int black = 16;
    int white = 231;
    for (Role role : Role.values()) {
      inks.put(
          role,
          switch (role) {
            case NORMAL -> Ink.of(grey.text, grey.ground);
            case DIM, FORECAST -> Ink.of(grey.faint, grey.ground);
            case STRONG, TRACE -> Ink.bold(grey.strong, grey.ground);
            case TRACE_SECOND -> Ink.of(grey.text, grey.ground);
            case BAR -> Ink.of(grey.text, grey.bar);
            case BAR_STRONG -> Ink.bold(grey.strong, grey.bar);
            case CHOSEN -> Ink.bold(grey.strong, grey.chosen);
            case ORIGIN, CURSOR -> Ink.bold(grey.ground, grey.text);
            case CAUTION -> Ink.bold(hue.yellow, grey.ground);
            case CAUTION_BAR -> Ink.bold(black, 221);
            case DANGER -> Ink.bold(hue.red, grey.ground);
            case DANGER_BAR -> Ink.bold(white, 160);
            case ASK -> Ink.bold(white, hue.blue);
          });
    }
    return inks;
  }

  private static Map<Role, Ink> monochrome() {
    Map<Role, Ink> inks = new EnumMap<>(Role.class);
    for (Role role : Role.values()) {
      inks.put(
          role,
          switch (role) {
            case NORMAL, DIM, FORECAST, TRACE_SECOND, BAR -> new Ink(-1, -1, false, false);
            case STRONG, BAR_STRONG, TRACE, CAUTION, DANGER -> new Ink(-1, -1, true, false);
            case CHOSEN, ORIGIN, CAUTION_BAR, DANGER_BAR, ASK, CURSOR ->
                new Ink(-1, -1, true, true);
          });
    }
    return inks;
  }
}

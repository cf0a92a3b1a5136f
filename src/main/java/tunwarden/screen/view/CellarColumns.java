package tunwarden.screen.view;

/**
 * Where the columns of the cellar page stand for a given width; -1 where there is no room for one.
 */
record CellarColumns(
    int id,
    int title,
    int titleColumns,
    int pressureEnd,
    int temperatureEnd,
    int dissolvedEnd,
    int margin,
    int marginEnd,
    int bar,
    int barColumns,
    int when,
    int mode,
    int line,
    int lineColumns) {
  static final int ID = 7;
  static final int MARGIN_NUMBER = 6;
  static final int WHEN = 14;
  static final int MODE = 13;
  private static final int SIGN = 3;
  private static final int PRESSURE = 8;
  private static final int TEMPERATURE = 7;
  private static final int DISSOLVED = 14;
  private static final int MARGIN = 19;
  private static final int AGE = 6;

  /** Fixed columns first; the rest is shared by title, bar and the optional ones. */
  static CellarColumns of(int width) {
    int fixed = SIGN + ID + 1 + PRESSURE + TEMPERATURE + DISSOLVED + 2 + MARGIN + AGE;
    int spare = width - fixed;
    int when = spare >= 44 ? WHEN + 1 : 0;
    int mode = spare >= 60 ? MODE + 1 : 0;
    int rest = spare - when - mode;
    int line = rest >= 60 ? Math.min(60, rest / 3) : 0;
    rest -= line;
    int title = rest < 8 ? 0 : Math.min(rest, rest < 24 ? rest : Math.max(16, rest / 2));
    title = Math.min(title, 40);
    int bar = rest - title >= 8 ? Math.min(40, rest - title - 1) : 0;
    int x = SIGN;
    int titleX = x + ID + 1;
    int pressureEnd = titleX + title + PRESSURE;
    int temperatureEnd = pressureEnd + TEMPERATURE;
    int dissolvedEnd = temperatureEnd + DISSOLVED;
    int marginX = dissolvedEnd + 2;
    int barX = marginX + MARGIN;
    int whenX = barX + (bar > 0 ? bar + 1 : 0);
    int modeX = whenX + when;
    int lineX = modeX + mode;
    return new CellarColumns(
        x,
        title > 0 ? titleX : -1,
        Math.max(0, title - 1),
        pressureEnd,
        temperatureEnd,
        dissolvedEnd,
        marginX,
        barX - 1,
        bar > 0 ? barX : -1,
        bar,
        when > 0 ? whenX : -1,
        mode > 0 ? modeX : -1,
        line > 0 ? lineX : -1,
        Math.max(0, line - 1));
  }
}

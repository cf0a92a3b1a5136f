package tunwarden.screen.view;

import java.time.Duration;
import java.util.Locale;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Instrument;
import tunwarden.screen.model.Model;
import tunwarden.units.Display;

/** Every instrument and how far it is to be believed. */
final class SignalsView {
  private static final int VESSEL = 9;
  private static final int QUANTITY = 13;
  private static final int VALUE = 13;
  private static final int GRADE = 9;
  private static final int AGE = 9;
  private static final int COUNTS = 17;
  private static final int SOURCE = 32;

  private SignalsView() {}

  static void draw(Canvas canvas, Area area, Model model) {
    Board board = model.board();
    int y = area.y();
    if (board.instruments().isEmpty()) {
      canvas.put(area.x() + 2, y, "No instrument is described.", Role.NORMAL);
      return;
    }
    row(
        canvas,
        area,
        y++,
        new String[] {
          "vessel", "quantity", "value", "signal", "heard", "good / refused", "from", "why"
        },
        Role.DIM,
        Role.DIM);
    for (Instrument instrument : board.instruments()) {
      if (y >= area.bottom()) {
        break;
      }
      Role role = role(instrument.quality());
      row(
          canvas,
          area,
          y,
          cells(instrument, model),
          role == Role.CAUTION ? role : Role.NORMAL,
          role);
      if (role == Role.CAUTION) {
        canvas.put(area.x(), y, "!", role);
      }
      y++;
    }
    whole(canvas, area, y + 1, model);
  }

  /** Below the table, in whole, what its last column had to cut. */
  private static void whole(Canvas canvas, Area area, int from, Model model) {
    int y = from;
    int room = area.right() - whyColumn(area);
    for (Instrument i : model.board().instruments()) {
      if (i.words().length() <= room) {
        continue;
      }
      String text = i.vessel() + " " + i.quantity().word() + ": " + i.words();
      for (String line : Words.wrap(text, area.columns() - 4)) {
        if (y >= area.bottom()) {
          return;
        }
        canvas.put(area.x() + 2, y++, line, Role.NORMAL);
      }
    }
  }

  private static int whyColumn(Area area) {
    int x = area.x() + 2 + VESSEL + QUANTITY + VALUE + GRADE + AGE;
    return x + (showsCounts(area) ? COUNTS : 0) + (showsSource(area) ? SOURCE : 0);
  }

  private static boolean showsCounts(Area area) {
    return area.columns() >= 110;
  }

  private static boolean showsSource(Area area) {
    return area.columns() >= 150;
  }

  private static String[] cells(Instrument i, Model model) {
    String grade = i.quality().level().name().toLowerCase(Locale.ROOT);
    String heard =
        i.heard().map(at -> Words.age(Duration.between(at, model.board().now()))).orElse("never");
    String why = i.words().isEmpty() && i.quality() != Quality.GOOD ? i.quality().why() : i.words();
    return new String[] {
      i.vessel(),
      i.quantity().word(),
      value(i, model.look().units()),
      grade,
      heard,
      i.good() + " / " + i.bad(),
      i.device() + " " + i.port(),
      why
    };
  }

  private static String value(Instrument i, Display units) {
    if (i.value().isEmpty()) {
      return "?";
    }
    double v = i.value().getAsDouble();
    if (i.quantity() == Quantity.BAROMETER) {
      return units.pressureDifference(v) + " a";
    }
    return switch (i.quantity().kind()) {
      case PRESSURE -> units.gauge(v);
      case TEMPERATURE -> units.temperature(v);
      case GAS_CONTENT -> units.gasContent(v);
      case VOLUME -> Display.number(10 * v, 2) + " hL";
      case EXTRACT -> Display.number(v, 2) + " °P";
      default -> Display.number(v, 3);
    };
  }

  private static Role role(Quality quality) {
    return quality.level() == Quality.Level.GOOD ? Role.NORMAL : Role.CAUTION;
  }

  /** In a narrow screen the last columns give way to the reason. */
  private static void row(
      Canvas canvas, Area area, int y, String[] cells, Role role, Role gradeRole) {
    int[] widths = {VESSEL, QUANTITY, VALUE, GRADE, AGE, COUNTS, SOURCE};
    boolean counts = showsCounts(area);
    boolean source = showsSource(area);
    int x = area.x() + 2;
    for (int i = 0; i < widths.length; i++) {
      boolean shown = (i != 5 || counts) && (i != 6 || source);
      if (shown) {
        canvas.put(x, y, widths[i] - 1, cells[i], i == 3 ? gradeRole : role);
        x += widths[i];
      }
    }
    canvas.put(x, y, area.right() - x, cells[7], role);
  }
}

package tunwarden.screen.view;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import tunwarden.assess.Assessment;
import tunwarden.assess.Margins;
import tunwarden.estimate.Estimate;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.VesselBoard;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;

/** Every vessel on one line, the one nearest its relief setting first. */
final class CellarView {
  /** Rows that must be free below the list before the chosen vessel is shown there. */
  private static final int LEAST_DETAIL_ROWS = 11;

  private final Canvas canvas;
  private final Area area;
  private final Model model;
  private final Display units;
  private final CellarColumns at;

  private CellarView(Canvas canvas, Area area, Model model) {
    this.canvas = canvas;
    this.area = area;
    this.model = model;
    this.units = model.look().units();
    this.at = CellarColumns.of(area.columns());
  }

  static void draw(Canvas canvas, Area area, Model model) {
    new CellarView(canvas, area, model).draw();
  }

  private void draw() {
    List<VesselBoard> listed = model.listed();
    drawHead();
    if (listed.isEmpty()) {
      String none =
          model.listing().filter().isEmpty()
              ? "Nothing has been read yet."
              : "No vessel matches '" + model.listing().filter() + "'; Esc shows all.";
      canvas.put(area.x() + 3, area.y() + 2, none, Role.NORMAL);
      return;
    }
    String chosen = model.vessel().map(VesselBoard::id).orElse("");
    int rows = area.rows() - 2;
    int first = firstShown(listed, chosen, rows);
    int shown = Math.min(rows, listed.size() - first);
    for (int i = 0; i < shown; i++) {
      VesselBoard vessel = listed.get(first + i);
      drawRow(area.y() + 1 + i, vessel, vessel.id().equals(chosen));
    }
    drawFoot(area.y() + 1 + shown, listed.size(), first, shown);
    Area rest = area.below(3 + shown);
    if (rest.rows() >= LEAST_DETAIL_ROWS) {
      model.vessel().ifPresent(vessel -> drawDetail(rest, vessel));
    }
  }

  private void drawDetail(Area rest, VesselBoard vessel) {
    VesselView.drawTitle(canvas, rest, model, vessel);
    Area body = rest.below(1);
    boolean chart = body.rows() >= 2 * LEAST_DETAIL_ROWS;
    Area upper = chart ? body.top(body.rows() * 3 / 5) : body;
    VesselView.detail(canvas, upper, model, vessel);
    if (chart) {
      ChartView.draw(canvas, body.below(upper.rows()), model, vessel);
    }
  }

  private static int firstShown(List<VesselBoard> listed, String chosen, int rows) {
    int index = 0;
    for (int i = 0; i < listed.size(); i++) {
      index = listed.get(i).id().equals(chosen) ? i : index;
    }
    return Math.max(0, Math.min(index - rows / 2, listed.size() - rows));
  }

  private void drawHead() {
    int y = area.y();
    head(at.id(), y, "vessel");
    if (at.title() >= 0) {
      head(at.title(), y, "");
    }
    canvas.putRight(at.pressureEnd(), y, units.pressure().symbol() + " g", Role.DIM);
    canvas.putRight(at.temperatureEnd(), y, "°" + units.temperature().symbol(), Role.DIM);
    canvas.putRight(at.dissolvedEnd(), y, "dissolved " + units.gasContent().symbol(), Role.DIM);
    head(at.margin(), y, "relief margin " + units.pressure().symbol());
    if (at.bar() >= 0) {
      canvas.put(at.bar(), y, at.barColumns(), "0 to relief set", Role.DIM);
    }
    if (at.when() >= 0) {
      canvas.put(at.when(), y, CellarColumns.WHEN, "valve lifts", Role.DIM);
    }
    if (at.mode() >= 0) {
      canvas.put(at.mode(), y, CellarColumns.MODE, "closure", Role.DIM);
    }
    if (at.line() >= 0) {
      canvas.put(at.line(), y, at.lineColumns(), "pressure, last 24 h", Role.DIM);
    }
    canvas.putRight(area.right() - 1, y, "age", Role.DIM);
  }

  private void head(int x, int y, String text) {
    canvas.put(x, y, text, Role.DIM);
  }

  private void drawFoot(int y, int count, int first, int shown) {
    String range = shown < count ? (first + 1) + " to " + (first + shown) + " of " : "";
    String filter =
        model.listing().filter().isEmpty() ? "" : ", only '" + model.listing().filter() + "'";
    String noun = count == 1 ? " vessel, " : " vessels, ";
    canvas.put(
        area.x() + 3, y, range + count + noun + model.listing().sort().words() + filter, Role.DIM);
  }

  private void drawRow(int y, VesselBoard vessel, boolean chosen) {
    Assessment a = vessel.assessment();
    Standing standing = Standing.of(vessel, model.board());
    Role values = standing.stale() ? Role.DIM : Role.STRONG;
    canvas.put(area.x(), y, chosen ? "▸" : " ", Role.STRONG);
    canvas.put(area.x() + 1, y, standing.mood().sign(), standing.mood().role());
    canvas.put(at.id(), y, CellarColumns.ID, a.vessel().id(), Role.STRONG);
    if (at.title() >= 0) {
      canvas.put(at.title(), y, at.titleColumns(), a.vessel().title(), Role.NORMAL);
    }
    canvas.putRight(at.pressureEnd(), y, pressure(a), values);
    canvas.putRight(at.temperatureEnd(), y, temperature(a), temperatureRole(a, values));
    canvas.putRight(at.dissolvedEnd(), y, dissolved(a), values);
    drawMargin(y, a, standing);
    if (at.bar() >= 0) {
      GaugeBar.draw(canvas, at.bar(), y, at.barColumns(), a, standing);
    }
    if (at.when() >= 0) {
      canvas.put(at.when(), y, CellarColumns.WHEN, when(a), Role.NORMAL);
    }
    if (at.mode() >= 0) {
      String mode = a.estimate().map(e -> e.mode().word()).orElse("");
      canvas.put(at.mode(), y, CellarColumns.MODE, mode, Role.NORMAL);
    }
    if (at.line() >= 0) {
      SparkLine.draw(canvas, at.line(), y, at.lineColumns(), vessel, model.board());
    }
    String age = standing.age().map(Words::age).orElse("never");
    canvas.putRight(area.right() - 1, y, age, standing.stale() ? Role.CAUTION : Role.DIM);
    if (chosen) {
      chosenTint(y);
    }
  }

  private void chosenTint(int y) {
    for (int x = area.x(); x < area.right(); x++) {
      Role role = canvas.role(x, y);
      if (role == Role.NORMAL || role == Role.STRONG || role == Role.DIM) {
        canvas.tint(x, y, 1, Role.CHOSEN);
      }
    }
  }

  private String pressure(Assessment a) {
    return a.pressure().value().isPresent()
        ? units.pressureNumber(a.pressure().value().getAsDouble())
        : "?";
  }

  private String temperature(Assessment a) {
    return a.temperature().value().isPresent()
        ? Display.number(units.temperature().fromSi(a.temperature().value().getAsDouble()), 1)
        : "?";
  }

  private Role temperatureRole(Assessment a, Role otherwise) {
    return Standing.isStale(a.temperature(), model.board()) ? Role.CAUTION : otherwise;
  }

  private String dissolved(Assessment a) {
    if (a.estimate().isEmpty()) {
      return "?";
    }
    Estimate e = a.estimate().get();
    double u95 = units.gasContent().differenceFromSi(e.dissolvedU95KgPerM3());
    return units.gasContentNumber(e.dissolvedKgPerM3()) + " ±" + Display.number(u95, 2);
  }

  private void drawMargin(int y, Assessment a, Standing standing) {
    Optional<Margins> margins = a.margins();
    Optional<ReliefSetting> relief = a.vessel().limits().relief();
    Role role = standing.mood() == Mood.CALM ? Role.STRONG : standing.mood().role();
    int end = at.margin() + CellarColumns.MARGIN_NUMBER;
    if (margins.isPresent()) {
      canvas.putRight(end, y, units.signedPressureNumber(margins.get().reliefPa()), role);
    }
    String word = standing.word();
    if (word.isEmpty()) {
      word =
          margins
              .map(m -> Display.number(100 * m.shareOfSet(), 0) + " %")
              .orElse(relief.isEmpty() ? "no relief set" : "not known");
    }
    boolean quiet = standing.word().isEmpty();
    int x = margins.isPresent() ? end + 1 : at.margin();
    canvas.put(x, y, at.marginEnd() - x, word, quiet ? Role.NORMAL : role);
  }

  private static String when(Assessment a) {
    if (a.margins().isEmpty()) {
      return "";
    }
    return a.outlook()
        .timeToLift()
        .map(range -> "in " + Words.length(range.middle()))
        .orElse(notWithin(a.outlook().horizon()));
  }

  private static String notWithin(Duration horizon) {
    return horizon.isZero() ? "" : "not in " + Words.length(horizon);
  }
}

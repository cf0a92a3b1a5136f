package tunwarden.screen.view;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import tunwarden.assess.Assessment;
import tunwarden.assess.Observed;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.VesselBoard;
import tunwarden.units.Display;
import tunwarden.units.Unit;
import tunwarden.vessel.Vessel;

/** The vessel page: ladder, dissolved gas, chart; two vessels side by side where there is room. */
final class VesselView {
  private static final int TWO_FROM_COLUMNS = 160;
  private static final int LEAST_LADDER = 44;

  /** Rows of a body that holds ladder and table together, and the table's share of them. */
  private static final int ROOMY = 34;

  private static final int TABLE_ROWS = 19;

  private VesselView() {}

  static void draw(Canvas canvas, Area area, Model model) {
    Optional<VesselBoard> chosen = model.vessel();
    if (chosen.isEmpty()) {
      canvas.put(area.x() + 2, area.y() + 1, "Nothing has been read yet.", Role.NORMAL);
      return;
    }
    Optional<VesselBoard> second = neighbour(model, chosen.get());
    if (area.columns() < TWO_FROM_COLUMNS || second.isEmpty()) {
      one(canvas, area, model, chosen.get());
      return;
    }
    int half = (area.columns() - 1) / 2;
    one(canvas, area.left(half), model, chosen.get());
    for (int y = area.y(); y < area.bottom(); y++) {
      canvas.put(area.x() + half, y, "│", Role.DIM);
    }
    one(canvas, area.without(half + 1), model, second.get());
  }

  /** The vessel that wants looking at most besides the chosen one. */
  private static Optional<VesselBoard> neighbour(Model model, VesselBoard chosen) {
    List<VesselBoard> listed = model.listed();
    return listed.stream().filter(vessel -> !vessel.id().equals(chosen.id())).findFirst();
  }

  private static void one(Canvas canvas, Area area, Model model, VesselBoard vessel) {
    drawTitle(canvas, area, model, vessel);
    Area body = area.below(1);
    boolean table = model.whatIf().open();
    int chartRows = body.rows() < 16 ? 7 : body.rows() * 2 / 5;
    int lowerRows = !table ? chartRows : body.rows() < ROOMY ? body.rows() : TABLE_ROWS;
    Area upper = body.top(body.rows() - lowerRows);
    Area lower = body.below(upper.rows());
    if (upper.rows() > 0) {
      detail(canvas, upper, model, vessel);
    }
    if (table) {
      WhatIfView.draw(canvas, lower, model.look().units(), vessel.assessment(), model.whatIf());
    } else {
      ChartView.draw(canvas, lower, model, vessel);
    }
  }

  /** Ladder and panel side by side. */
  static void detail(Canvas canvas, Area area, Model model, VesselBoard vessel) {
    int ladder = Math.max(LEAST_LADDER, area.columns() / 2);
    Display units = model.look().units();
    LadderView.draw(canvas, area.left(ladder), units, vessel, model.board());
    GasPanel.draw(canvas, area.without(ladder + 1), units, vessel, model.board());
  }

  static void drawTitle(Canvas canvas, Area area, Model model, VesselBoard vessel) {
    Assessment assessment = vessel.assessment();
    Standing standing = Standing.of(vessel, model.board());
    int y = area.y();
    canvas.fill(area.x(), y, area.columns(), " ", Role.BAR);
    int x = canvas.put(area.x() + 1, y, assessment.vessel().id() + "  ", Role.BAR_STRONG);
    Display units = model.look().units();
    String age = age(standing);
    int end = area.right() - 1;
    end = canvas.putRight(end, y, age, standing.stale() ? Mood.CAUTION.bar() : Role.BAR) - 2;
    String now = reading(assessment.pressure(), units) + "  " + temperature(assessment, units);
    end = canvas.putRight(end, y, now, Role.BAR_STRONG) - 2;
    canvas.put(x, y, Math.max(0, end - x), describe(assessment.vessel()), Role.BAR);
  }

  static String age(Standing standing) {
    Duration age = standing.age().orElse(null);
    if (age == null) {
      return " NO READING ";
    }
    return standing.stale() ? " STALE " + Words.age(age) + " " : Words.age(age) + " old";
  }

  private static String reading(Observed pressure, Display units) {
    return pressure.value().isPresent()
        ? units.gauge(pressure.value().getAsDouble())
        : "? " + units.pressure().symbol();
  }

  private static String temperature(Assessment assessment, Display units) {
    Observed t = assessment.temperature();
    return t.value().isPresent()
        ? units.temperature(t.value().getAsDouble())
        : "? °" + units.temperature().symbol();
  }

  private static String describe(Vessel vessel) {
    String fill = Display.number(Unit.HECTOLITRE.fromSi(vessel.fillM3()), 1);
    String volume = Display.number(Unit.HECTOLITRE.fromSi(vessel.volumeM3()), 1);
    String title = vessel.title().isEmpty() ? vessel.liquid().kind().word() : vessel.title();
    return title + "  " + fill + " of " + volume + " hL";
  }
}

package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.room.RoomAir;
import tunwarden.forecast.vent.RoomAfter;
import tunwarden.forecast.vent.Stage;
import tunwarden.forecast.vent.StagedPlan;
import tunwarden.forecast.vent.VentAnswer;
import tunwarden.forecast.vent.VentQuestion;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.VentState;
import tunwarden.screen.model.VesselBoard;
import tunwarden.units.Display;
import tunwarden.units.InUnits;
import tunwarden.vessel.Vessel;

/** The vent bench: what a vent would do, tried before anyone turns a handle. */
final class VentView {
  private static final int NAME_COLUMNS = 15;
  private static final int ROOMY = 24;
  private static final double MILLI = 1e3;

  private final Canvas canvas;
  private final Area area;
  private final Model model;
  private final Display units;
  private int y;

  private VentView(Canvas canvas, Area area, Model model) {
    this.canvas = canvas;
    this.area = area;
    this.model = model;
    this.units = model.look().units();
    this.y = area.y() + 1;
  }

  static void draw(Canvas canvas, Area area, Model model) {
    Optional<VesselBoard> vessel = model.vessel();
    if (vessel.isEmpty()) {
      canvas.put(area.x() + 2, area.y() + 1, "Nothing has been read yet.", Role.NORMAL);
      return;
    }
    VesselView.drawTitle(canvas, area, model, vessel.get());
    new VentView(canvas, area, model).draw(vessel.get());
  }

  private void draw(VesselBoard vessel) {
    Optional<Estimate> estimate = vessel.assessment().estimate();
    if (estimate.isEmpty()) {
      text("A vent can be tried once pressure and temperature are read.", Role.NORMAL);
      return;
    }
    text("Tried on paper only: nothing here moves a valve.", Role.DIM);
    double now = estimate.get().pressurePaGauge();
    VentState vent = model.vent();
    double target = vent.targetOr(now);
    Vessel described = vessel.assessment().vessel();
    VentQuestion question =
        new VentQuestion(
            target, Optional.of(vent.path()), described.site().room(), VentQuestion.USUAL_BOUND);
    drawQuestion(vent, target, now);
    VentBench.Outcome outcome = VentBench.of(described, estimate.get(), question);
    if (outcome.answer().isEmpty()) {
      y++;
      paragraph("", outcome.fault(), Role.CAUTION);
      return;
    }
    drawAnswer(outcome.answer().get(), now, target);
  }

  private void drawQuestion(VentState vent, double target, double now) {
    String to = units.gauge(target) + "   from " + units.gauge(now);
    String kd = Display.number(vent.dischargeCoefficient(), 1);
    String path = Display.number(MILLI * vent.orificeM(), 0) + " mm, discharge coefficient " + kd;
    if (isRoomy()) {
      line("vent to", to, Role.STRONG);
      line("through", path, Role.NORMAL);
    } else {
      line(
          "vent to", to + "   through " + path.replace("discharge coefficient", "Kd"), Role.STRONG);
    }
  }

  private boolean isRoomy() {
    return area.rows() >= ROOMY;
  }

  private void drawAnswer(VentAnswer answer, double now, double target) {
    drawBar(now, target, answer.reboundPaGauge().middle());
    gap();
    String normal = Display.number(MILLI * answer.once().normalM3().middle(), 0);
    String once = range(answer.once().kg(), 1, 2) + " kg, " + normal + " L at 0 °C and 1 atm";
    line("leaves at once", once, Role.STRONG);
    answer
        .blowdownS()
        .ifPresent(s -> line("in", range(s, 1, 0) + " s, the vent full open", Role.NORMAL));
    drawFollowing(answer);
    line("or shut again", "back to " + pressureRange(answer.reboundPaGauge()), Role.STRONG);
    drawFoam(answer.supersaturation());
    answer.room().ifPresent(this::drawRoom);
    gap();
    for (Caution caution : answer.cautions()) {
      paragraph("! ", caution.text(), caution.grave() ? Role.DANGER : Role.CAUTION);
    }
    drawPlan(answer.plan());
  }

  /** What the vent takes for good and what comes back, on a line from atmosphere to now. */
  private void drawBar(double now, double target, double rebound) {
    int width = Math.min(60, area.columns() - NAME_COLUMNS - 4);
    int x = area.x() + 2 + NAME_COLUMNS;
    for (int i = 0; i < width; i++) {
      double pa = (i + 0.5) * now / width;
      String cell = pa <= target ? "█" : pa <= rebound ? "▒" : "·";
      canvas.put(x + i, y, cell, pa <= target ? Role.NORMAL : Role.DIM);
    }
    canvas.put(area.x() + 2, y++, "0 to now", Role.DIM);
    double kept = Math.max(0, now - rebound);
    String words =
        "█ left in   ▒ comes back once shut   · gone for good: " + units.pressureDifference(kept);
    canvas.put(x, y++, area.right() - x, words, Role.DIM);
  }

  private void drawFollowing(VentAnswer answer) {
    String more = range(answer.followsKg(), 1, 2) + " kg more";
    if (isRoomy()) {
      line("then, if held", more + " from the liquid", Role.STRONG);
      line("", "most of it within " + Words.range(answer.followTime()), Role.NORMAL);
    } else {
      String time = Words.briefRange(answer.followTime());
      line("then, if held", more + ", most of it in " + time, Role.STRONG);
    }
  }

  private void drawFoam(Spread supersaturation) {
    boolean foams = supersaturation.high() > VentQuestion.USUAL_BOUND;
    String bound = Display.number(100 * VentQuestion.USUAL_BOUND, 0);
    String word = (foams ? "! may foam" : "quiet") + " (foams from about " + bound + " %)";
    String text = range(supersaturation, 100, 0) + " % above rest, " + word;
    line("supersaturated", text, foams ? Role.CAUTION : Role.NORMAL);
  }

  private void drawRoom(RoomAfter room) {
    String once = ppm(room.onceCo2());
    String held = ppm(room.heldCo2());
    if (isRoomy() || room.ventilatedCo2().isEmpty()) {
      line("room CO2", once + " at once, " + held + " if held open, no fan", Role.STRONG);
      room.ventilatedCo2()
          .ifPresent(with -> line("", ppm(with) + " at most with the air changes", Role.NORMAL));
    } else {
      String with = ppm(room.ventilatedCo2().get());
      line(
          "room CO2", once + " at once, " + held + " held, " + with + " with the fan", Role.STRONG);
    }
  }

  private static String ppm(Spread share) {
    return String.format(java.util.Locale.ROOT, "%,.0f ppm", RoomAir.ppm(share.middle()));
  }

  private void drawPlan(StagedPlan plan) {
    if (plan.stages().size() < 2) {
      return;
    }
    String bound = Display.number(100 * VentQuestion.USUAL_BOUND, 0);
    text("In steps that stay below " + bound + " %:", Role.DIM);
    int number = 1;
    for (Stage stage : plan.stages()) {
      String wait = stage.hold().map(hold -> ", hold " + Words.range(hold)).orElse("");
      line("step " + number++, "to " + units.gauge(stage.toPaGauge()) + wait, Role.NORMAL);
    }
    if (!plan.isComplete()) {
      line("", "and more steps than anyone would follow", Role.NORMAL);
    }
  }

  private String pressureRange(Spread pa) {
    return units.gauge(pa.middle())
        + " ("
        + units.pressureNumber(pa.low())
        + " to "
        + units.pressureNumber(pa.high())
        + ")";
  }

  private static String range(Spread value, double scale, int decimals) {
    return Display.number(scale * value.middle(), decimals)
        + " ("
        + Display.number(scale * value.low(), decimals)
        + " to "
        + Display.number(scale * value.high(), decimals)
        + ")";
  }

  private void line(String name, String text, Role role) {
    if (y < area.bottom()) {
      canvas.put(area.x() + 2, y, NAME_COLUMNS, name, Role.DIM);
      int x = area.x() + 2 + NAME_COLUMNS;
      canvas.put(x, y, area.right() - x, text, role);
    }
    y++;
  }

  /** A blank line where there is room for one. */
  private void gap() {
    y += isRoomy() ? 1 : 0;
  }

  private void text(String text, Role role) {
    if (y < area.bottom()) {
      canvas.put(area.x() + 2, y, area.columns() - 2, text, role);
    }
    y++;
  }

  private void paragraph(String sign, String text, Role role) {
    List<String> parts = new ArrayList<>(Words.wrap(InUnits.of(text, units), area.columns() - 6));
    for (int i = 0; i < parts.size(); i++) {
      text((i == 0 ? sign : " ".repeat(sign.length())) + parts.get(i), role);
    }
  }
}

package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tunwarden.assess.Assessment;
import tunwarden.assess.Margins;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Mode;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.WhatIf;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.VesselBoard;
import tunwarden.units.Display;
import tunwarden.units.InUnits;
import tunwarden.units.Unit;

/** What is in the liquid, where it is heading, and what to mind. */
final class GasPanel {
  private static final int NAME_COLUMNS = 10;
  private static final double SETTLED = 0.995;

  /** Columns from which a line may say how soon as well; narrower, the table does. */
  private static final int ROOMY = 45;

  private static final Set<WhatIf.Kind> ON_LADDER =
      EnumSet.of(WhatIf.Kind.WARM, WhatIf.Kind.CHILL, WhatIf.Kind.REBOUND, WhatIf.Kind.FULL);

  private final Display units;
  private final Assessment assessment;
  private final Standing standing;
  private final String lately;
  private final List<String> goingOn;
  private final List<Line> lines = new ArrayList<>();
  private final int width;

  /** One line: a faint name, then the value. */
  private record Line(String name, String text, Role role) {}

  private GasPanel(int width, Display units, VesselBoard vessel, Board board) {
    this.width = width;
    this.units = units;
    this.assessment = vessel.assessment();
    this.standing = Standing.of(vessel, board);
    this.lately = Lately.of(vessel, board.now(), units);
    this.goingOn = Happenings.goingOn(vessel, board, units);
  }

  static void draw(Canvas canvas, Area area, Display units, VesselBoard vessel, Board board) {
    GasPanel panel = new GasPanel(area.columns(), units, vessel, board);
    panel.write();
    int y = area.y();
    for (Line line : panel.lines) {
      if (y >= area.bottom()) {
        break;
      }
      canvas.put(area.x(), y, NAME_COLUMNS, line.name, Role.DIM);
      int x = area.x() + (line.name.isEmpty() && line.text.startsWith("!") ? 0 : NAME_COLUMNS);
      canvas.put(x, y, area.right() - x, line.text, line.role);
      y++;
    }
  }

  private void write() {
    assessment.estimate().ifPresentOrElse(this::writeEstimate, this::writeNothingYet);
    if (!lately.isEmpty()) {
      named("lately", lately, Role.NORMAL);
    }
    goingOn.forEach(words -> named("now", words, Role.STRONG));
    writeMargin();
    writeOutlook(assessment.outlook());
    for (Caution caution : assessment.outlook().cautions()) {
      paragraph(
          "! ", InUnits.of(caution.text(), units), caution.grave() ? Role.CAUTION : Role.NORMAL);
    }
    assessment
        .estimate()
        .map(Estimate::ignorance)
        .filter(text -> !text.isEmpty())
        .ifPresent(text -> named("unknown", InUnits.of(text, units), Role.NORMAL));
    writeNotes();
    writeWhatIfs(assessment.outlook().whatIfs());
  }

  private void writeNotes() {
    String ignorance = assessment.estimate().map(Estimate::ignorance).orElse("");
    for (String note : assessment.notes()) {
      if (note.equals(ignorance)) {
        continue;
      }
      named("note", InUnits.of(note, units), Role.NORMAL);
    }
  }

  private void writeNothingYet() {
    named("dissolved", "not known until pressure and temperature are read", Role.NORMAL);
  }

  private void writeEstimate(Estimate e) {
    Role role = standing.stale() ? Role.DIM : Role.STRONG;
    String u95 = Display.number(units.gasContent().differenceFromSi(e.dissolvedU95KgPerM3()), 2);
    Unit other = units.gasContent() == Unit.GRAM_PER_LITRE ? Unit.VOLUMES : Unit.GRAM_PER_LITRE;
    String also = Display.number(other.fromSi(e.dissolvedKgPerM3()), 2) + " " + other.symbol();
    String content =
        units.gasContentNumber(e.dissolvedKgPerM3())
            + " ± "
            + u95
            + " "
            + units.gasContent().symbol();
    lines.add(new Line("dissolved", content + "  " + also, role));
    lines.add(new Line("at rest", atRest(e), Role.NORMAL));
    String air = Display.number(100 * e.airFraction(), 0);
    String airU95 = Display.number(100 * e.airFractionU95(), 0);
    lines.add(new Line("headspace", "air " + air + " ± " + airU95 + " %", Role.NORMAL));
    String sure = Display.number(100 * e.modeConfidence(), 0);
    String mode = e.mode() == Mode.UNKNOWN ? "" : "  " + sure + " % sure";
    lines.add(new Line("closure", e.mode().word() + mode, Role.NORMAL));
  }

  private String atRest(Estimate e) {
    String equilibrium = units.gasContent(e.equilibriumKgPerM3());
    if (e.settled() >= SETTLED) {
      return equilibrium + "  settled";
    }
    double share = Math.floor(100 * e.settled());
    return equilibrium + "  " + Display.number(share, 0) + " % of the way";
  }

  private void writeMargin() {
    Optional<Margins> margins = assessment.margins();
    if (margins.isEmpty()) {
      boolean set = assessment.vessel().limits().relief().isPresent();
      String why = set ? "not known without a reading" : "no relief setting stated";
      lines.add(new Line("margin", why, set ? Role.CAUTION : Role.DIM));
      return;
    }
    Margins m = margins.get();
    String share = Display.number(100 * m.shareOfSet(), 0) + " % of set";
    Role role = standing.mood() == Mood.DANGER ? Role.DANGER : Role.STRONG;
    String past = m.reliefPa() <= 0 ? "  !! past it" : "";
    lines.add(
        new Line("margin", units.pressureDifference(m.reliefPa()) + "  " + share + past, role));
  }

  private void writeOutlook(Outlook outlook) {
    boolean relief = assessment.vessel().limits().relief().isPresent();
    if (relief && assessment.estimate().isPresent()) {
      String when =
          outlook
              .timeToLift()
              .map(range -> "in " + Words.range(range))
              .orElse("not within " + Words.length(outlook.horizon()));
      Role role = outlook.timeToLift().isPresent() ? Role.STRONG : Role.NORMAL;
      named("lifts", when + " at this trend", role);
    }
    if (outlook.liftTemperatureK().isPresent()) {
      String at = units.temperature(outlook.liftTemperatureK().getAsDouble());
      String soon =
          outlook
              .whatIf(WhatIf.Kind.WARM)
              .flatMap(WhatIf::toLift)
              .filter(time -> width >= ROOMY)
              .map(time -> ", " + Words.briefRange(time) + " after cooling is lost")
              .orElse("");
      named(relief ? "" : "lifts", "if warmed to " + at + soon, Role.NORMAL);
    }
    if (outlook.liquidFullK().isPresent()) {
      String at = units.temperature(outlook.liquidFullK().getAsDouble());
      lines.add(new Line("full", "if warmed to " + at, Role.NORMAL));
    }
  }

  /** What the ladder does not show, as far as there is room. */
  private void writeWhatIfs(List<WhatIf> whatIfs) {
    boolean first = true;
    for (WhatIf each : whatIfs) {
      if (!ON_LADDER.contains(each.kind())) {
        named(first ? "if" : "", whatIf(each), Role.NORMAL);
        first = false;
      }
    }
  }

  private String whatIf(WhatIf each) {
    String pressure =
        each.paGauge()
            .map(
                pa ->
                    ": "
                        + units.gauge(pa.middle())
                        + (pa.high() > pa.low()
                            ? " ("
                                + units.pressureNumber(pa.low())
                                + " to "
                                + units.pressureNumber(pa.high())
                                + ")"
                            : ""))
            .orElse("");
    String lift = each.toLift().map(time -> ", lifts in " + Words.briefRange(time)).orElse("");
    String detail = pressure.isEmpty() ? " " + InUnits.of(each.detail(), units) : "";
    return InUnits.of(each.words(), units) + pressure + lift + detail;
  }

  private void named(String name, String text, Role role) {
    List<String> parts = Words.wrap(text, Math.max(10, width - NAME_COLUMNS));
    for (int i = 0; i < parts.size(); i++) {
      lines.add(new Line(i == 0 ? name : "", parts.get(i), role));
    }
  }

  private void paragraph(String sign, String text, Role role) {
    List<String> parts = Words.wrap(text, Math.max(10, width - NAME_COLUMNS));
    for (int i = 0; i < parts.size(); i++) {
      lines.add(new Line(i == 0 ? sign + "mind" : "", parts.get(i), role));
    }
  }
}

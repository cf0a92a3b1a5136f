package tunwarden.screen.view;

import java.util.List;
import java.util.Optional;
import tunwarden.assess.Assessment;
import tunwarden.assess.Margins;
import tunwarden.assess.Rung;
import tunwarden.forecast.Projection;
import tunwarden.forecast.Scenario;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.VesselBoard;
import tunwarden.units.Display;
import tunwarden.units.InUnits;
import tunwarden.vessel.ReliefSetting;

/**
 * The pressure ladder: a true scale with the present pressure as a column on it, the zone in which
 * the relief valve may be open hatched, the forecast shaded above the column, and beside it every
 * pressure that matters with its distance from now.
 */
final class LadderView {
  private static final int SCALE_COLUMNS = 4;
  private static final int COLUMN_COLUMNS = 2;
  private static final int VALUE_COLUMNS = 7;
  private static final int DISTANCE_COLUMNS = 7;
  private static final String[] EIGHTHS = {" ", "▁", "▂", "▃", "▄", "▅", "▆", "▇", "█"};

  private final Canvas canvas;
  private final Area area;
  private final Display units;
  private final Assessment assessment;
  private final Standing standing;
  private final LadderLayout layout;

  private LadderView(Canvas canvas, Area area, Display units, VesselBoard vessel, Board board) {
    this.canvas = canvas;
    this.area = area;
    this.units = units;
    this.assessment = vessel.assessment();
    this.standing = Standing.of(vessel, board);
    this.layout = LadderLayout.of(assessment.ladder(), area.rows() - 1);
  }

  static void draw(Canvas canvas, Area area, Display units, VesselBoard vessel, Board board) {
    if (area.rows() < 3) {
      return;
    }
    new LadderView(canvas, area, units, vessel, board).draw();
  }

  private void draw() {
    String head = " " + units.pressure().symbol() + " g";
    canvas.put(area.x(), area.y(), head, Role.DIM);
    canvas.put(labelX(), area.y(), area.right() - labelX(), "pressure ladder", Role.DIM);
    canvas.putRight(
        valueX() + VALUE_COLUMNS + DISTANCE_COLUMNS - 1, area.y(), "from now", Role.DIM);
    if (layout.rungs().isEmpty()) {
      canvas.put(area.x() + 1, area.y() + 2, "no pressure is known yet", standing.mood().role());
      return;
    }
    drawScale();
    drawColumn();
    drawRungs();
    drawMargin();
  }

  private int columnX() {
    return area.x() + SCALE_COLUMNS + 1;
  }

  private int leaderX() {
    return columnX() + COLUMN_COLUMNS;
  }

  private int valueX() {
    return leaderX() + 1;
  }

  private int labelX() {
    return valueX() + VALUE_COLUMNS + DISTANCE_COLUMNS + 1;
  }

  private int rowY(int row) {
    return area.y() + 1 + row;
  }

  /** Round numbers at their true places left of the column. */
  private void drawScale() {
    for (int row = 0; row < layout.rows(); row++) {
      canvas.put(area.x() + SCALE_COLUMNS, rowY(row), "│", Role.DIM);
    }
    double span = units.pressure().differenceFromSi(layout.topPa() - layout.bottomPa());
    double step = NiceSteps.step(span, Math.max(2, layout.rows() / 3));
    double first = units.pressure().fromSi(layout.bottomPa());
    for (double v = Math.ceil(first / step) * step; ; v += step) {
      double pa = units.pressure().toSi(v);
      if (pa > layout.topPa()) {
        break;
      }
      int y = rowY(layout.trueRow(pa));
      canvas.putRight(area.x() + SCALE_COLUMNS, y, NiceSteps.text(v, step) + " ", Role.DIM);
      canvas.put(area.x() + SCALE_COLUMNS, y, "┤", Role.DIM);
    }
  }

  private void drawColumn() {
    Optional<Rung> now =
        layout.rungs().stream().filter(rung -> rung.kind() == Rung.Kind.NOW).findFirst();
    double reliefFrom = reliefZone();
    double nowPa = now.map(Rung::paGauge).orElse(Double.NaN);
    double trendTo =
        assessment.outlook().projection(Scenario.TREND).map(Projection::highPaGauge).orElse(nowPa);
    for (int row = 0; row < layout.rows(); row++) {
      double middle = layout.topPa() - (row + 0.5) / layout.rows() * (layout.topPa() - bottom());
      String cell = " ";
      Role role = Role.DIM;
      if (middle >= reliefFrom) {
        cell = "▒";
      } else if (middle > nowPa && middle <= trendTo) {
        cell = "░";
      }
      int filled = eighths(row, nowPa);
      if (filled > 0) {
        cell = filled == 8 || cell.equals(" ") ? EIGHTHS[filled] : cell;
        role = filled == 8 || !cell.equals("▒") ? fillRole() : role;
      }
      canvas.fill(columnX(), rowY(row), COLUMN_COLUMNS, cell, role);
    }
  }

  private double bottom() {
    return layout.bottomPa();
  }

  private Role fillRole() {
    return standing.mood() == Mood.CALM ? Role.NORMAL : standing.mood().role();
  }

  /** How much of a row lies between atmosphere and the present pressure, in eighths. */
  private int eighths(int row, double nowPa) {
    if (!Double.isFinite(nowPa)) {
      return 0;
    }
    double top = layout.position(Math.max(nowPa, 0));
    double end = layout.position(Math.min(nowPa, 0));
    double share = Math.min(row + 1, end) - Math.max(row, top);
    if (share <= 0) {
      return 0;
    }
    return row + 1 <= end ? (int) Math.max(1, Math.round(8 * share)) : 8;
  }

  private double reliefZone() {
    return assessment
        .vessel()
        .limits()
        .relief()
        .map(ReliefSetting::earliestLiftPaGauge)
        .orElse(Double.POSITIVE_INFINITY);
  }

  private void drawRungs() {
    LeaderLines leaders = new LeaderLines(layout.rows());
    List<Rung> rungs = layout.rungs();
    for (int i = 0; i < rungs.size(); i++) {
      leaders.join(layout.trueRow(rungs.get(i).paGauge()), layout.labelRow()[i]);
    }
    for (int row = 0; row < layout.rows(); row++) {
      canvas.put(leaderX(), rowY(row), leaders.at(row), Role.DIM);
    }
    double nowPa =
        rungs.stream()
            .filter(rung -> rung.kind() == Rung.Kind.NOW)
            .mapToDouble(Rung::paGauge)
            .findFirst()
            .orElse(Double.NaN);
    for (int i = 0; i < rungs.size(); i++) {
      drawRung(rungs.get(i), rowY(layout.labelRow()[i]), nowPa);
    }
  }

  private void drawRung(Rung rung, int y, double nowPa) {
    boolean now = rung.kind() == Rung.Kind.NOW;
    boolean reached = !now && rung.kind().isLimit() && isReached(rung, nowPa);
    Role role = now ? standing.mood().value() : reached ? Role.DANGER : roleOf(rung.kind());
    canvas.putRight(valueX() + VALUE_COLUMNS - 1, y, units.pressureNumber(rung.paGauge()), role);
    int end = valueX() + VALUE_COLUMNS + DISTANCE_COLUMNS - 1;
    canvas.putRight(end, y, distance(rung, nowPa), now ? Role.DIM : role);
    String label =
        signOf(rung.kind()) + " " + (now ? nowWords(rung) : InUnits.of(rung.label(), units));
    int x = canvas.put(labelX(), y, area.right() - labelX(), label, role);
    String more = reached ? " ! reached" : now ? "" : rangeOf(rung);
    if (canvas.width(more) <= area.right() - x) {
      canvas.put(x, y, more, reached ? Role.DANGER : Role.DIM);
    }
  }

  private static boolean isReached(Rung rung, double nowPa) {
    return switch (rung.kind()) {
      case VACUUM_LIMIT -> nowPa <= rung.paGauge();
      case ATMOSPHERE, RESEAT -> false;
      default -> nowPa >= rung.paGauge();
    };
  }

  private String nowWords(Rung rung) {
    String said = standing.word();
    return standing.mood() == Mood.CALM
        ? rung.label()
        : rung.label() + "  " + standing.mood().sign() + " " + said;
  }

  private String distance(Rung rung, double nowPa) {
    if (rung.kind() != Rung.Kind.NOW) {
      return Double.isFinite(nowPa) ? signed(rung.paGauge() - nowPa) : "";
    }
    return assessment
        .margins()
        .map(margins -> "±" + units.pressureNumber(margins.readingU95Pa()))
        .orElse("");
  }

  /** With its sign, unless it rounds to nothing. */
  private String signed(double pa) {
    String text = units.signedPressureNumber(pa);
    return text.chars().anyMatch(c -> c >= '1' && c <= '9') ? text : text.substring(1);
  }

  /** The 95 % range of the projection a forecast rung stands for. */
  private String rangeOf(Rung rung) {
    if (rung.kind() != Rung.Kind.FORECAST) {
      return "";
    }
    return assessment.outlook().projections().stream()
        .filter(p -> p.words().equals(rung.label()) && p.highPaGauge() > p.lowPaGauge())
        .findFirst()
        .map(
            p ->
                "  ("
                    + units.pressureNumber(p.lowPaGauge())
                    + " to "
                    + units.pressureNumber(p.highPaGauge())
                    + ")")
        .orElse("");
  }

  /** The distance that matters most, written into the gap it measures where a row is free. */
  private void drawMargin() {
    Optional<Margins> margins = assessment.margins();
    int lift = labelRowOf(Rung.Kind.EARLIEST_LIFT);
    int now = labelRowOf(Rung.Kind.NOW);
    if (margins.isEmpty() || lift < 0 || now - lift < 2) {
      return;
    }
    int middle = (lift + now) / 2;
    for (int away = 0; away < now - lift; away++) {
      for (int row : new int[] {middle - away, middle + away}) {
        if (row > lift && row < now && isFree(row)) {
          String words = "↕ margin " + units.pressureDifference(margins.get().reliefPa());
          canvas.put(labelX(), rowY(row), area.right() - labelX(), words, standing.mood().role());
          return;
        }
      }
    }
  }

  private int labelRowOf(Rung.Kind kind) {
    for (int i = 0; i < layout.rungs().size(); i++) {
      if (layout.rungs().get(i).kind() == kind) {
        return layout.labelRow()[i];
      }
    }
    return -1;
  }

  private boolean isFree(int row) {
    for (int taken : layout.labelRow()) {
      if (taken == row) {
        return false;
      }
    }
    return true;
  }

  private static Role roleOf(Rung.Kind kind) {
    return switch (kind) {
      case RELIEF_SET, NOW -> Role.STRONG;
      case ATMOSPHERE, RESEAT, ACCUMULATION -> Role.DIM;
      default -> Role.NORMAL;
    };
  }

  private static String signOf(Rung.Kind kind) {
    return switch (kind) {
      case VESSEL_LIMIT, RELIEF_SET, VACUUM_LIMIT -> "═";
      case EARLIEST_LIFT, OPERATING_CEILING, ACCUMULATION, RESEAT -> "┄";
      case FORECAST -> "▹";
      case NOW -> "◀";
      case ATMOSPHERE -> "─";
    };
  }
}

package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.WhatIf;
import tunwarden.screen.model.WhatIfState;
import tunwarden.units.Display;
import tunwarden.units.InUnits;
import tunwarden.vessel.ReliefSetting;

/**
 * What may happen to a vessel or be done to it, one row each: where the pressure goes with its
 * range, and whether and when the relief valve may open. Below, the chosen row in full with what it
 * assumes and what to mind.
 */
final class WhatIfView {
  private static final int WORDS_COLUMNS = 27;
  private static final int VALUE_COLUMNS = 7;
  private static final int RANGE_COLUMNS = 16;
  private static final int LIFT_COLUMNS = 28;
  private static final int LEAST_DETAIL_COLUMNS = 20;
  private static final int TOLD_COLUMNS = 9;

  private final Canvas canvas;
  private final Area area;
  private final Display units;
  private final Optional<ReliefSetting> relief;
  private int y;

  private WhatIfView(Canvas canvas, Area area, Display units, Assessment assessment) {
    this.canvas = canvas;
    this.area = area;
    this.units = units;
    this.relief = assessment.vessel().limits().relief();
    this.y = area.y();
  }

  static void draw(
      Canvas canvas, Area area, Display units, Assessment assessment, WhatIfState state) {
    List<WhatIf> all = assessment.outlook().whatIfs();
    WhatIfView view = new WhatIfView(canvas, area, units, assessment);
    view.drawHead();
    if (all.isEmpty()) {
      canvas.put(
          area.x() + 2,
          view.y,
          "Nothing is forecast until pressure and temperature are read.",
          Role.NORMAL);
      return;
    }
    int chosen = state.within(all.size());
    for (int i = 0; i < all.size(); i++) {
      view.drawRow(all.get(i), i == chosen);
    }
    view.drawInFull(all.get(chosen));
  }

  private void drawHead() {
    canvas.put(area.x() + 2, y, WORDS_COLUMNS, "if", Role.DIM);
    canvas.putRight(valueEnd(), y, units.pressure().symbol() + " g", Role.DIM);
    canvas.put(valueEnd() + 2, y, RANGE_COLUMNS, "95 % range", Role.DIM);
    String lift = relief.isPresent() ? "may the valve open" : "";
    canvas.put(liftX(), y, area.right() - liftX(), lift, Role.DIM);
    y++;
  }

  private int valueEnd() {
    return area.x() + 2 + WORDS_COLUMNS + VALUE_COLUMNS - 1;
  }

  private int liftX() {
    return valueEnd() + 2 + RANGE_COLUMNS;
  }

  private void drawRow(WhatIf row, boolean chosen) {
    if (y >= area.bottom()) {
      return;
    }
    Role role = chosen ? Role.STRONG : Role.NORMAL;
    boolean grave = row.cautions().stream().anyMatch(Caution::grave);
    canvas.put(area.x(), y, chosen ? "▸" : " ", Role.STRONG);
    canvas.put(area.x() + 1, y, grave ? "!" : " ", Role.CAUTION);
    String words = InUnits.of(row.words(), units);
    canvas.put(area.x() + 2, y, WORDS_COLUMNS - 1, words, role);
    row.paGauge().ifPresent(pa -> drawPressure(pa, role));
    String lift = lift(row);
    canvas.put(liftX(), y, area.right() - liftX(), lift, role);
    int detailX = liftX() + Math.max(LIFT_COLUMNS, lift.isEmpty() ? 0 : canvas.width(lift) + 2);
    if (row.paGauge().isEmpty()) {
      detailX = area.x() + 2 + Math.max(12, canvas.width(words)) + 2;
    }
    if (row.paGauge().isEmpty() || area.right() - detailX >= LEAST_DETAIL_COLUMNS) {
      canvas.put(detailX, y, area.right() - detailX, InUnits.of(row.detail(), units), Role.DIM);
    }
    y++;
  }

  private void drawPressure(Spread pa, Role role) {
    canvas.putRight(valueEnd(), y, units.pressureNumber(pa.middle()), role);
    if (pa.high() > pa.low()) {
      String range = units.pressureNumber(pa.low()) + " to " + units.pressureNumber(pa.high());
      canvas.put(valueEnd() + 2, y, RANGE_COLUMNS - 1, range, Role.DIM);
    }
  }

  private String lift(WhatIf row) {
    if (relief.isEmpty() || row.paGauge().isEmpty()) {
      return "";
    }
    if (row.toLift().isPresent()) {
      return "in " + Words.briefRange(row.toLift().get());
    }
    double lift = relief.get().earliestLiftPaGauge();
    if (row.paGauge().get().high() < lift) {
      return "no";
    }
    return row.paGauge().get().middle() >= lift ? "yes" : "perhaps";
  }

  private void drawInFull(WhatIf row) {
    y++;
    tell("", row.detail(), Role.NORMAL);
    tell("assumes", row.assumes() + ".", Role.DIM);
    for (Caution caution : row.cautions()) {
      tell("! mind", caution.text(), caution.grave() ? Role.CAUTION : Role.NORMAL);
    }
  }

  private void tell(String name, String text, Role role) {
    int width = area.columns() - 2 - TOLD_COLUMNS;
    List<String> parts = new ArrayList<>(Words.wrap(InUnits.of(text, units), width));
    for (int i = 0; i < parts.size() && y < area.bottom(); i++, y++) {
      canvas.put(area.x() + 2, y, TOLD_COLUMNS, i == 0 ? name : "", role);
      canvas.put(area.x() + 2 + TOLD_COLUMNS, y, width, parts.get(i), role);
    }
  }
}

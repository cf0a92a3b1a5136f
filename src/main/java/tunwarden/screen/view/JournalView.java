package tunwarden.screen.view;

import java.util.List;
import java.util.Optional;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmState;
import tunwarden.screen.model.JournalEntry;
import tunwarden.screen.model.JournalRows;
import tunwarden.screen.model.Model;

/** Standing alarms, then what was written down, newest first; the chosen row in full below. */
final class JournalView {
  private static final int TIME = 15;
  private static final int VESSEL = 9;
  private static final int KIND = 24;
  private static final int MOST_FULL_ROWS = 7;

  private JournalView() {}

  static void draw(Canvas canvas, Area area, Model model) {
    JournalRows rows = JournalRows.of(model.board(), model.journal().filter());
    drawHead(canvas, area, model, rows);
    int chosen = Math.min(model.journal().row(), Math.max(0, rows.size() - 1));
    List<String> full = rows.size() == 0 ? List.of() : full(model, rows, chosen, area.columns());
    int fullRows = Math.min(MOST_FULL_ROWS, full.size() + 1);
    int shown = area.rows() - 1 - fullRows;
    int first = Math.max(0, Math.min(chosen - shown / 2, rows.size() - shown));
    for (int i = 0; i < Math.min(shown, rows.size() - first); i++) {
      drawRow(canvas, area, area.y() + 1 + i, model, rows, first + i, first + i == chosen);
    }
    if (rows.size() > 0) {
      drawFull(canvas, area.below(area.rows() - fullRows), full);
    }
  }

  private static void drawHead(Canvas canvas, Area area, Model model, JournalRows rows) {
    String filter =
        model.journal().filter().isEmpty()
            ? ""
            : ", only '" + model.journal().filter() + "' (Esc shows all)";
    String head =
        count(rows.alarms().size(), "alarm", "alarms")
            + ", "
            + count(rows.entries().size(), "entry", "entries")
            + filter;
    canvas.put(
        area.x() + 2,
        area.y(),
        rows.size() == 0 && filter.isEmpty() ? "Nothing has been written down yet." : head,
        Role.DIM);
  }

  private static String count(int number, String one, String many) {
    return number + " " + (number == 1 ? one : many);
  }

  private static void drawRow(
      Canvas canvas, Area area, int y, Model model, JournalRows rows, int row, boolean chosen) {
    canvas.put(area.x(), y, chosen ? "▸" : " ", Role.STRONG);
    Optional<Alarm> alarm = rows.alarm(row);
    if (alarm.isPresent()) {
      drawAlarm(canvas, area, y, model, alarm.get());
    } else {
      JournalEntry e = rows.entries().get(row - rows.alarms().size());
      int x = area.x() + 3;
      canvas.put(x, y, TIME - 1, time(model, e.time()), Role.DIM);
      canvas.put(x + TIME, y, VESSEL - 1, e.vessel(), Role.NORMAL);
      canvas.put(x + TIME + VESSEL, y, KIND - 1, e.kind(), Role.NORMAL);
      int textX = x + TIME + VESSEL + KIND;
      canvas.put(textX, y, area.right() - textX, told(e.text(), model), Role.NORMAL);
    }
    if (chosen) {
      for (int x = area.x(); x < area.right(); x++) {
        Role role = canvas.role(x, y);
        boolean plain = role == Role.NORMAL || role == Role.DIM || role == Role.STRONG;
        canvas.tint(x, y, 1, plain ? Role.CHOSEN : role);
      }
    }
  }

  private static void drawAlarm(Canvas canvas, Area area, int y, Model model, Alarm alarm) {
    Mood mood = Mood.of(alarm.priority());
    boolean aside = !alarm.state().wantsAcknowledging() && alarm.state() != AlarmState.ACKNOWLEDGED;
    Role role = aside ? Role.DIM : mood.role();
    int x = area.x() + 3;
    canvas.put(area.x() + 1, y, aside ? "" : mood.sign(), role);
    canvas.put(x, y, TIME - 1, time(model, alarm.since()), Role.DIM);
    String where = alarm.vessel().isEmpty() ? "station" : alarm.vessel();
    canvas.put(x + TIME, y, VESSEL - 1, where, Role.STRONG);
    canvas.put(x + TIME + VESSEL, y, KIND - 1, alarm.kind().word(), role);
    int textX = x + TIME + VESSEL + KIND;
    canvas.put(textX, y, area.right() - textX, stateWords(model, alarm), Role.NORMAL);
  }

  private static String stateWords(Model model, Alarm alarm) {
    String until =
        alarm.shelvedUntil().map(t -> " until " + Words.when(t, model.board())).orElse("");
    return alarm.priority().word()
        + ", "
        + alarm.state().word()
        + until
        + ": "
        + told(alarm.text(), model);
  }

  private static String told(String text, Model model) {
    return Told.of(text, model.look().units(), model.board());
  }

  private static String time(Model model, java.time.Instant time) {
    return Words.full(time, model.board().zone()).substring(5);
  }

  /** The chosen row, unshortened. */
  private static List<String> full(Model model, JournalRows rows, int chosen, int columns) {
    String text =
        rows.alarm(chosen)
            .map(a -> a.text() + " " + a.action())
            .orElseGet(() -> rows.entries().get(chosen - rows.alarms().size()).text());
    return Words.wrap(told(text, model), columns - 4);
  }

  private static void drawFull(Canvas canvas, Area area, List<String> lines) {
    canvas.fill(area.x(), area.y(), area.columns(), "─", Role.DIM);
    int y = area.y() + 1;
    for (String line : lines) {
      if (y < area.bottom()) {
        canvas.put(area.x() + 2, y++, line, Role.NORMAL);
      }
    }
  }
}

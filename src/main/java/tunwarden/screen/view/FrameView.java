package tunwarden.screen.view;

import java.util.List;
import java.util.Optional;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmState;
import tunwarden.screen.model.AlarmList;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Page;
import tunwarden.screen.model.Progress;
import tunwarden.screen.model.Prompt;

/**
 * What stands around every page: header, alarm strip, and the bottom line with keys or a question.
 */
final class FrameView {
  /** Columns kept for the answer beside a long question. */
  private static final int LEAST_ANSWER = 16;

  private FrameView() {}

  /** Draws the frame and returns what is left for the page. */
  static Area draw(Canvas canvas, Model model) {
    drawHeader(canvas, model);
    drawStrip(canvas, model);
    int top = 2;
    if (model.board().replay().isPresent()) {
      ReplayBar.draw(canvas, top++, model.board());
    }
    int bottom = canvas.rows() - 1;
    drawBottom(canvas, bottom, model);
    if (model.board().progress().isPresent()) {
      drawProgress(canvas, --bottom, model.board().progress().get());
    }
    Optional<String> trouble = model.prompt().map(Prompt::trouble).filter(text -> !text.isEmpty());
    if (trouble.isPresent()) {
      drawLine(canvas, --bottom, " ! " + trouble.get(), Role.CAUTION_BAR);
    }
    return new Area(0, top, canvas.columns(), bottom - top);
  }

  private static void drawLine(Canvas canvas, int y, String text, Role role) {
    canvas.fill(0, y, canvas.columns(), " ", role);
    canvas.put(0, y, text, role);
  }

  private static void drawHeader(Canvas canvas, Model model) {
    drawLine(canvas, 0, "", Role.BAR);
    Board board = model.board();
    String origin = originWords(board, canvas.columns() >= 100);
    Role role = board.origin() == Origin.LIVE ? Role.BAR_STRONG : Role.ORIGIN;
    int end = canvas.putRight(canvas.columns(), 0, origin, role) - 1;
    String name = " Tunwarden ";
    int tabs = 0;
    for (Page page : Page.values()) {
      tabs += page.title().length() + 2;
    }
    int x = tabs + name.length() <= end ? canvas.put(0, 0, name, Role.BAR_STRONG) : 0;
    for (Page page : Page.values()) {
      boolean here = page == model.page();
      if (here || x + tabs <= end || tabs <= end) {
        String tab = here ? "[" + page.title() + "]" : " " + page.title() + " ";
        x = canvas.put(x, 0, Math.max(0, end - x), tab, here ? Role.BAR_STRONG : Role.BAR);
      }
    }
  }

  private static String originWords(Board board, boolean wide) {
    String clock =
        wide ? Words.full(board.now(), board.zone()) : Words.clock(board.now(), board.zone());
    return switch (board.origin()) {
      case LIVE -> " LIVE  " + clock + " ";
      case REPLAY -> " REPLAY  log time " + clock + " ";
      case REHEARSAL -> (wide ? " REHEARSAL, nothing real  " : " REHEARSAL  ") + clock + " ";
    };
  }

  /** The worst alarm nobody has acknowledged, or how many stand. */
  private static void drawStrip(Canvas canvas, Model model) {
    List<Alarm> alarms = AlarmList.of(model.board());
    List<Alarm> open = alarms.stream().filter(a -> a.state().wantsAcknowledging()).toList();
    if (open.isEmpty()) {
      drawLine(canvas, 1, " " + quietWords(alarms), Role.DIM);
      return;
    }
    Alarm worst = open.get(0);
    Mood mood = Mood.of(worst.priority());
    Role role = mood == Mood.CALM ? Role.BAR_STRONG : mood.bar();
    drawLine(canvas, 1, "", role);
    String more = open.size() > 1 ? "  " + (open.size() - 1) + " more" : "";
    int end = canvas.putRight(canvas.columns(), 1, "  a acknowledge" + more + " ", role);
    String gone = worst.state() == AlarmState.RETURNED_UNACKNOWLEDGED ? " (gone again)" : "";
    String sign = mood.sign().isEmpty() ? "" : mood.sign() + " ";
    String where = worst.vessel().isEmpty() ? "station" : worst.vessel();
    String text =
        " "
            + sign
            + worst.priority().word().toUpperCase(java.util.Locale.ROOT)
            + "  "
            + where
            + "  "
            + worst.kind().word()
            + gone
            + ": "
            + Told.of(worst.text(), model.look().units(), model.board());
    canvas.put(0, 1, end, text, role);
  }

  private static String quietWords(List<Alarm> alarms) {
    long shelved = alarms.stream().filter(a -> a.state() == AlarmState.SHELVED).count();
    long acknowledged = alarms.stream().filter(a -> a.state() == AlarmState.ACKNOWLEDGED).count();
    if (shelved == 0 && acknowledged == 0) {
      return "no alarms";
    }
    String standing = acknowledged + " acknowledged";
    return "no alarm waits; " + standing + (shelved > 0 ? ", " + shelved + " shelved" : "");
  }

  private static void drawProgress(Canvas canvas, int y, Progress progress) {
    drawLine(canvas, y, "", Role.BAR);
    int x = canvas.put(1, y, progress.words() + "  ", Role.BAR_STRONG);
    int width = Math.max(10, canvas.columns() / 4);
    int done = (int) Math.round(width * Math.max(0, Math.min(1, progress.share())));
    canvas.fill(x, y, done, "█", Role.BAR);
    canvas.fill(x + done, y, width - done, "░", Role.BAR);
    String left = progress.left().map(l -> ", about " + Words.length(l) + " left").orElse("");
    String words = "  " + Math.round(100 * progress.share()) + " %" + left + "   x stops it";
    canvas.put(x + width, y, words, Role.BAR);
  }

  private static void drawBottom(Canvas canvas, int y, Model model) {
    if (model.prompt().isPresent()) {
      drawPrompt(canvas, y, model.prompt().get());
      return;
    }
    if (!model.said().isEmpty()) {
      drawLine(canvas, y, " " + model.said(), Role.BAR_STRONG);
      return;
    }
    drawLine(canvas, y, "", Role.BAR);
    int x = 1;
    for (KeyHints.Hint hint : KeyHints.brief(model)) {
      if (x + canvas.width(hint.key() + " " + hint.words()) > canvas.columns()) {
        break;
      }
      x = canvas.put(x, y, hint.key() + " ", Role.BAR_STRONG);
      x = canvas.put(x, y, hint.words(), Role.BAR) + 2;
    }
  }

  private static void drawPrompt(Canvas canvas, int y, Prompt prompt) {
    drawLine(canvas, y, "", Role.ASK);
    String tail = prompt.purpose().isYesOrNo() ? "  y yes   n no " : "  Enter take   Esc leave ";
    int end = canvas.putRight(canvas.columns(), y, tail, Role.ASK);
    if (prompt.purpose().isYesOrNo()) {
      canvas.put(1, y, end - 1, prompt.question(), Role.ASK);
      return;
    }
    int room = Math.max(end * 2 / 3, end - LEAST_ANSWER);
    int x = canvas.put(1, y, room, prompt.question(), Role.ASK);
    x = canvas.put(x, y, ": ", Role.ASK);
    String text = prompt.text();
    while (canvas.width(text) > Math.max(1, end - x - 1)) {
      text = text.substring(Character.charCount(text.codePointAt(0)));
    }
    x = canvas.put(x, y, text, Role.ASK);
    canvas.put(x, y, "_", Role.ASK);
  }
}

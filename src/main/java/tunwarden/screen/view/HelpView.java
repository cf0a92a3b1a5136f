package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.List;
import tunwarden.screen.model.Model;

/** The keys of the page one is on, over the page. */
final class HelpView {
  private static final int KEY_COLUMNS = 12;
  private static final int COLUMN = 40;

  private HelpView() {}

  static void draw(Canvas canvas, Area area, Model model) {
    List<String> headings = new ArrayList<>();
    List<List<KeyHints.Hint>> groups = new ArrayList<>();
    if (!KeyHints.ofPage(model.page()).isEmpty()) {
      headings.add(model.page().title() + " page");
      groups.add(KeyHints.ofPage(model.page()));
    }
    headings.add("Everywhere");
    groups.add(KeyHints.everywhere());
    if (model.board().replay().isPresent()) {
      headings.add("Replay");
      groups.add(KeyHints.replay());
    }
    blank(canvas, area);
    canvas.put(area.x() + 2, area.y(), "Keys; any key closes this", Role.DIM);
    int x = area.x() + 2;
    int y = area.y() + 1;
    for (int i = 0; i < groups.size(); i++) {
      if (y > area.y() + 1 && y + 1 + groups.get(i).size() > area.bottom()) {
        x += Math.min(COLUMN, area.columns() / 2);
        y = area.y() + 1;
      }
      y = group(canvas, x, y, headings.get(i), groups.get(i)) + 1;
    }
  }

  private static void blank(Canvas canvas, Area area) {
    for (int y = area.y(); y < area.bottom(); y++) {
      canvas.fill(area.x(), y, area.columns(), " ", Role.NORMAL);
    }
  }

  private static int group(
      Canvas canvas, int x, int top, String heading, List<KeyHints.Hint> hints) {
    int y = top;
    canvas.put(x, y++, heading, Role.STRONG);
    for (KeyHints.Hint hint : hints) {
      canvas.put(x + 2, y, KEY_COLUMNS - 1, hint.key(), Role.STRONG);
      canvas.put(x + 2 + KEY_COLUMNS, y, hint.words(), Role.NORMAL);
      y++;
    }
    return y;
  }
}

package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.List;
import tunwarden.screen.model.Model;

/** The keys of the page one is on, over the page, in as many columns as they need. */
final class HelpView {
  private static final int KEY_COLUMNS = 11;
  private static final int MOST_COLUMN = 42;

  private HelpView() {}

  /** A heading, or a key; a blank line when both are empty. */
  private record Line(String heading, KeyHints.Hint hint) {
    static final Line BLANK = new Line("", null);

    boolean isHeading() {
      return !heading.isEmpty();
    }
  }

  static void draw(Canvas canvas, Area area, Model model) {
    blank(canvas, area);
    canvas.put(area.x() + 2, area.y(), "Keys; any key closes this", Role.DIM);
    Area body = area.below(1);
    List<Line> lines = lines(model);
    int columns = columns(lines, body.rows());
    int width = Math.min(MOST_COLUMN, (body.columns() - 2) / columns);
    int x = body.x() + 2;
    int y = body.y();
    for (int i = 0; i < lines.size(); i++) {
      Line line = lines.get(i);
      boolean alone = line.isHeading() && y == body.bottom() - 1;
      if (y >= body.bottom() || alone) {
        x += width;
        y = body.y();
      }
      if (line != Line.BLANK) {
        put(canvas, x, y++, width - 1, line);
      } else if (y > body.y()) {
        y++;
      }
    }
  }

  private static List<Line> lines(Model model) {
    List<Line> lines = new ArrayList<>();
    if (!KeyHints.ofPage(model.page()).isEmpty()) {
      group(lines, model.page().title() + " page", KeyHints.ofPage(model.page()));
    }
    if (model.board().replay().isPresent()) {
      group(lines, "Replay", KeyHints.replay());
    }
    group(lines, "Everywhere", KeyHints.everywhere());
    return lines;
  }

  private static void group(List<Line> lines, String heading, List<KeyHints.Hint> hints) {
    if (!lines.isEmpty()) {
      lines.add(Line.BLANK);
    }
    lines.add(new Line(heading, null));
    hints.forEach(hint -> lines.add(new Line("", hint)));
  }

  private static int columns(List<Line> lines, int rows) {
    // One line more: a heading that would stand alone at the foot goes to the next column.
    return (lines.size() + rows) / Math.max(1, rows);
  }

  private static void blank(Canvas canvas, Area area) {
    for (int y = area.y(); y < area.bottom(); y++) {
      canvas.fill(area.x(), y, area.columns(), " ", Role.NORMAL);
    }
  }

  private static void put(Canvas canvas, int x, int y, int width, Line line) {
    if (line.isHeading()) {
      canvas.put(x, y, width, line.heading(), Role.STRONG);
      return;
    }
    canvas.put(x + 2, y, KEY_COLUMNS - 1, line.hint().key(), Role.STRONG);
    int words = x + 2 + KEY_COLUMNS;
    canvas.put(words, y, x + width - words, line.hint().words(), Role.NORMAL);
  }
}

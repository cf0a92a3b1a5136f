package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Page;

/** What the keys do, for the bottom line and the help. */
final class KeyHints {
  private KeyHints() {}

  /**
   * One key.
   *
   * @param key as written on the key cap
   * @param words what it does, short
   */
  record Hint(String key, String words) {}

  /** Keys that belong to the page. */
  static List<Hint> ofPage(Page page) {
    return switch (page) {
      case CELLAR ->
          List.of(
              new Hint("arrows", "choose a vessel"),
              new Hint("Enter", "open it"),
              new Hint("/", "find by name"),
              new Hint("o", "order of the list"));
      case VESSEL ->
          List.of(
              new Hint("up down", "other vessel"),
              new Hint("f", "what may happen"),
              new Hint("left right", "read chart or table"),
              new Hint("w", "10 min, 2 h, 24 h, 7 d"),
              new Hint("+ -", "zoom"),
              new Hint("[ ]", "back, forth in time"),
              new Hint("End", "follow the present"),
              new Hint("y", "0 to relief set, or close"),
              new Hint("l", "enter a laboratory value"));
      case VENT ->
          List.of(
              new Hint("left right", "vent less, more"),
              new Hint("Enter", "type the target"),
              new Hint("+ -", "wider, narrower path"),
              new Hint("d", "type the path's diameter"),
              new Hint("up down", "other vessel"));
      case JOURNAL ->
          List.of(
              new Hint("arrows", "choose a row"),
              new Hint("/", "show only what contains"),
              new Hint("a", "acknowledge the alarm"),
              new Hint("h", "shelve, or bring back"));
      case SIGNALS -> List.of();
    };
  }

  /** Keys that work on every page. */
  static List<Hint> everywhere() {
    List<Hint> hints = new ArrayList<>();
    hints.add(letters(Page.CELLAR, Page.VESSEL));
    hints.add(letters(Page.VENT, Page.JOURNAL));
    hints.add(letters(Page.SIGNALS));
    hints.add(new Hint("a", "acknowledge the worst"));
    hints.add(new Hint("h", "shelve the alarm"));
    hints.add(new Hint("n", "write a note"));
    hints.add(new Hint("r", "write a report"));
    hints.add(new Hint("u", "units"));
    hints.add(new Hint("t", "theme"));
    hints.add(new Hint("g", "drawing characters"));
    hints.add(new Hint("Esc", "back"));
    hints.add(new Hint("Ctrl-L", "draw afresh"));
    hints.add(new Hint("q", "leave"));
    return hints;
  }

  private static Hint letters(Page... pages) {
    String keys = Stream.of(pages).map(p -> "" + p.letter()).collect(Collectors.joining(" "));
    return new Hint(keys, Stream.of(pages).map(Page::title).collect(Collectors.joining(", ")));
  }

  /** Keys of a replay. */
  static List<Hint> replay() {
    return List.of(
        new Hint("space", "pause, go on"),
        new Hint("< >", "slower, faster"),
        new Hint(".", "one row"),
        new Hint("e E", "next, earlier event"),
        new Hint("k", "go to a time"),
        new Hint("Enter", "in the journal: go there"),
        new Hint("m", "mark this moment"));
  }

  /** The few for the bottom line, most useful first. */
  static List<Hint> brief(Model model) {
    List<Hint> hints = new ArrayList<>();
    hints.add(new Hint("?", "keys"));
    List<Hint> own = ofPage(model.page());
    if (model.board().replay().isPresent()) {
      hints.addAll(replay().subList(0, 2));
    }
    hints.addAll(own.subList(0, Math.min(4, own.size())));
    if (model.page() != Page.JOURNAL) {
      hints.add(new Hint("a", "acknowledge"));
    }
    hints.add(new Hint("u", "units"));
    hints.add(new Hint("q", "leave"));
    return hints;
  }
}

package tunwarden.screen.model;

import java.util.Optional;

/** Keys of the journal page. */
final class JournalKeys {
  private static final int PAGE_STEP = 10;

  private JournalKeys() {}

  static Optional<Model> press(Model model, Key key) {
    JournalState journal = model.journal();
    int last = JournalRows.of(model.board(), journal.filter()).size() - 1;
    return switch (key.kind()) {
      case UP -> to(model, journal.row() - 1, last);
      case DOWN -> to(model, journal.row() + 1, last);
      case PAGE_UP -> to(model, journal.row() - PAGE_STEP, last);
      case PAGE_DOWN -> to(model, journal.row() + PAGE_STEP, last);
      case HOME -> to(model, 0, last);
      case END -> to(model, last, last);
      default -> Optional.empty();
    };
  }

  private static Optional<Model> to(Model model, int row, int last) {
    return Optional.of(model.edit().journal(model.journal().withRow(Math.min(row, last))).done());
  }
}

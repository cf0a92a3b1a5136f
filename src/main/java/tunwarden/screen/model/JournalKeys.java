package tunwarden.screen.model;

import java.util.Optional;

/** Keys of the journal page. */
final class JournalKeys {
  private static final int PAGE_STEP = 10;

  private JournalKeys() {}

  static Optional<Turn> press(Model model, Key key) {
    JournalState journal = model.journal();
    int last = JournalRows.of(model.board(), journal.filter()).size() - 1;
    return switch (key.kind()) {
      case UP -> to(model, journal.row() - 1, last);
      case DOWN -> to(model, journal.row() + 1, last);
      case PAGE_UP -> to(model, journal.row() - PAGE_STEP, last);
      case PAGE_DOWN -> to(model, journal.row() + PAGE_STEP, last);
      case HOME -> to(model, 0, last);
      case END -> to(model, last, last);
      case ENTER -> goThere(model);
      default -> Optional.empty();
    };
  }

  /** In a replay, goes to the time of the chosen row. */
  private static Optional<Turn> goThere(Model model) {
    JournalRows rows = JournalRows.of(model.board(), model.journal().filter());
    return model.board().replay().isEmpty()
        ? Optional.empty()
        : rows.time(model.journal().row()).map(time -> Turn.asking(model, desk -> desk.seek(time)));
  }

  private static Optional<Turn> to(Model model, int row, int last) {
    JournalState there = model.journal().withRow(Math.min(row, last));
    return Optional.of(Turn.to(model.edit().journal(there).done()));
  }
}

package tunwarden.screen.model;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import tunwarden.alarm.Alarm;

/**
 * The rows of the journal page that match a filter: standing alarms first, then entries newest
 * first.
 *
 * @param alarms alarms not in state normal
 * @param entries journal entries
 */
public record JournalRows(List<Alarm> alarms, List<JournalEntry> entries) {
  /** The rows of a board. */
  public static JournalRows of(Board board, String filter) {
    String wanted = filter.toLowerCase(Locale.ROOT);
    List<Alarm> alarms =
        AlarmList.of(board).stream()
            .filter(a -> matches(wanted, a.vessel(), a.kind().word(), a.text()))
            .toList();
    List<JournalEntry> entries = new ArrayList<>();
    for (int i = board.journal().size() - 1; i >= 0; i--) {
      JournalEntry entry = board.journal().get(i);
      if (matches(wanted, entry.vessel(), entry.kind(), entry.text())) {
        entries.add(entry);
      }
    }
    return new JournalRows(alarms, entries);
  }

  private static boolean matches(String wanted, String... texts) {
    for (String text : texts) {
      if (text.toLowerCase(Locale.ROOT).contains(wanted)) {
        return true;
      }
    }
    return false;
  }

  public int size() {
    return alarms.size() + entries.size();
  }

  /** When what stands on that row began, if there is one. */
  public Optional<Instant> time(int row) {
    if (row < 0 || row >= size()) {
      return Optional.empty();
    }
    return Optional.of(
        row < alarms.size() ? alarms.get(row).since() : entries.get(row - alarms.size()).time());
  }

  /** The alarm on that row, if it is one. */
  public Optional<Alarm> alarm(int row) {
    return row >= 0 && row < alarms.size() ? Optional.of(alarms.get(row)) : Optional.empty();
  }
}

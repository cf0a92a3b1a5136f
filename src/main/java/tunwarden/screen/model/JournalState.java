package tunwarden.screen.model;

/**
 * Where a person is in the journal.
 *
 * @param row chosen row, alarms first, then entries newest first; 0 is the top
 * @param filter part of a vessel, kind or text; empty shows all
 */
public record JournalState(int row, String filter) {
  public static final JournalState TOP = new JournalState(0, "");

  public JournalState withRow(int other) {
    return new JournalState(Math.max(0, other), filter);
  }
}

package tunwarden.journal;

import java.time.Instant;
import java.util.Map;
import java.util.TreeMap;

/**
 * One event worth keeping for months.
 *
 * @param time data time
 * @param vessel identity of the vessel; empty for the station itself
 * @param kind a plain word: {@code alarm}, {@code vent}, {@code repair}, {@code start} ...
 * @param text one sentence
 * @param values numbers and words by name, the unit in the name
 */
public record JournalEntry(
    Instant time, String vessel, String kind, String text, Map<String, Object> values) {
  private static final int LONGEST_TEXT = 1000;

  /** Keeps its own copy, and makes over-long texts short. */
  public JournalEntry {
    values = new TreeMap<>(values);
    text = text.length() <= LONGEST_TEXT ? text : text.substring(0, LONGEST_TEXT) + " ...";
  }

  /** Kind of the entry that keeps an alarm transition. */
  public static final String ALARM = "alarm";

  /** An entry of the station itself, without values. */
  public static JournalEntry station(Instant time, String kind, String text) {
    return new JournalEntry(time, "", kind, text, Map.of());
  }
}

package tunwarden.replay;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** What a pass over a log met, counted; read it when the pass is over. Not thread-safe. */
public final class LogNotes {
  private final List<String> guesses;
  private long rows;
  private long unreadable;
  private long duplicates;
  private long conflicts;
  private long moved;
  private long late;
  private long missing;
  private long skippedHour;
  private String firstUnreadable = "";
  private String firstLate = "";
  private String torn = "";

  LogNotes(List<String> guesses) {
    this.guesses = List.copyOf(guesses);
  }

  void countRow() {
    rows++;
  }

  void countUnreadable(long line, String field, String reason) {
    if (unreadable++ == 0) {
      firstUnreadable = "line " + line + (field.isEmpty() ? "" : ", " + field) + ": " + reason;
    }
  }

  void countDuplicate(boolean same) {
    if (same) {
      duplicates++;
    } else {
      conflicts++;
    }
  }

  void countMoved() {
    moved++;
  }

  void countLate(long line) {
    if (late++ == 0) {
      firstLate = "line " + line;
    }
  }

  void countMissing() {
    missing++;
  }

  void noteTorn(long line) {
    torn = "line " + line;
  }

  void noteSkippedHour(long count) {
    skippedHour = count;
  }

  /** Rows delivered. */
  public long rows() {
    return rows;
  }

  /** Lines that are no row. */
  public long unreadable() {
    return unreadable;
  }

  /** Rows that repeat an earlier time, with the same or with other values. */
  public long duplicates() {
    return duplicates + conflicts;
  }

  /** Rows put into the order of their times. */
  public long moved() {
    return moved;
  }

  /** Rows too far out of order to be used. */
  public long late() {
    return late;
  }

  /** Where the first unreadable line stands and why; empty for none. */
  public String firstUnreadable() {
    return firstUnreadable;
  }

  /** What was guessed before reading. */
  public List<String> guesses() {
    return guesses;
  }

  /** Everything a person should hear about this pass, one sentence each. */
  public List<String> sentences() {
    List<String> out = new ArrayList<>(guesses);
    if (unreadable > 0) {
      out.add(count(unreadable, "row") + " could not be read; the first is " + firstUnreadable);
    }
    if (missing > 0) {
      out.add(count(missing, "cell") + " said that there was no value");
    }
    if (duplicates > 0) {
      out.add(count(duplicates, "repeated row") + " left out");
    }
    if (conflicts > 0) {
      out.add(count(conflicts, "row") + " repeated a time with other values; the first was kept");
    }
    if (moved > 0) {
      out.add(count(moved, "row") + " put into the order of their times");
    }
    if (late > 0) {
      out.add(count(late, "row") + " too far out of order to be used; the first is " + firstLate);
    }
    if (skippedHour > 0) {
      out.add(
          count(skippedHour, "row")
              + " inside the hour that the zone's clocks skip: the logger may not keep daylight"
              + " saving, then give a fixed offset such as --zone +01:00");
    }
    if (!torn.isEmpty()) {
      out.add("the last row, " + torn + ", is torn and was ignored");
    }
    return out;
  }

  private static String count(long number, String noun) {
    return String.format(Locale.ROOT, "%,d %s%s", number, noun, number == 1 ? "" : "s");
  }
}

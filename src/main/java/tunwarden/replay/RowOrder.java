package tunwarden.replay;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tunwarden.reading.Sample;

/**
 * Puts rows that arrive a little out of order right and leaves out repeated ones, in constant
 * memory: a row may be at most {@link #WINDOW} rows late.
 */
final class RowOrder {
  /** Rows held back while looking for stragglers. */
  static final int WINDOW = 64;

  private final LogNotes notes;
  private final List<LogRow> held = new ArrayList<>(WINDOW + 1);
  private final ArrayDeque<LogRow> ready = new ArrayDeque<>();
  private final Map<String, LogRow> newest = new HashMap<>();
  private LogRow released;

  RowOrder(LogNotes notes) {
    this.notes = notes;
  }

  /** Takes one row in. */
  void add(LogRow row) {
    if (!held.isEmpty() && row.time().isBefore(held.get(held.size() - 1).time())) {
      insert(row);
    } else {
      held.add(row);
    }
    if (held.size() > WINDOW) {
      release(held.remove(0)); // a shift of 64 references is cheaper than a cleverer structure
    }
  }

  private void insert(LogRow row) {
    int place = held.size();
    while (place > 0 && row.time().isBefore(held.get(place - 1).time())) {
      place--;
    }
    held.add(place, row);
    notes.countMoved();
  }

  private void release(LogRow row) {
    LogRow last = newestOf(row.vessel());
    if (last != null && !row.time().isAfter(last.time())) {
      if (row.time().equals(last.time())) {
        notes.countDuplicate(sameValues(row.samples(), last.samples()));
      } else {
        notes.countLate(row.line());
      }
      return;
    }
    released = row;
    ready.add(row);
  }

  /** Most logs speak of one vessel for long, so the map is asked only when that changes. */
  private LogRow newestOf(String vessel) {
    if (released == null || released.vessel().equals(vessel)) {
      return released;
    }
    newest.put(released.vessel(), released);
    released = newest.get(vessel);
    return released;
  }

  /** Samples are records, so equality is equality of values. */
  private static boolean sameValues(List<Sample> some, List<Sample> others) {
    return some.equals(others);
  }

  /** No more rows will come. */
  void finish() {
    for (LogRow row : held) {
      release(row);
    }
    held.clear();
  }

  /** The next row in order, or null when more must be added first. */
  LogRow poll() {
    return ready.poll();
  }
}

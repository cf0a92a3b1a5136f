package tunwarden.replay.text;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.util.Arrays;

/**
 * One line of a text file and its fields, as a view that the next line overwrites. Quoting is left
 * to FastCSV; a line without a quote is cut at the separator in place.
 */
public final class Line {
  private static final int FIRST_FIELDS = 16;

  char[] chars = new char[0];
  int start;
  int end;
  long number;
  boolean terminated;
  boolean tooLong;

  private char[] cells;
  private int[] from = new int[FIRST_FIELDS];
  private int[] to = new int[FIRST_FIELDS];
  private int count;

  /** Counted from 1. */
  public long number() {
    return number;
  }

  /** Whether a line end followed; the last line of a torn file has none. */
  public boolean isTerminated() {
    return terminated;
  }

  /** Whether the line passed {@link LineSource#LONGEST} and was cut. */
  public boolean isTooLong() {
    return tooLong;
  }

  /** Nothing but blanks. */
  public boolean isBlank() {
    for (int i = start; i < end; i++) {
      if (chars[i] > ' ') {
        return false;
      }
    }
    return true;
  }

  /** Starts with {@code #}. */
  public boolean isComment() {
    return start < end && chars[start] == '#';
  }

  /** The whole line. */
  public String text() {
    return new String(chars, start, end - start);
  }

  /**
   * Cuts the line into fields, each trimmed of blanks.
   *
   * @return false when the quoting is broken; there are then no fields
   */
  public boolean split(char separator) {
    count = 0;
    cells = chars;
    int begin = start;
    for (int i = start; i < end; i++) {
      char c = chars[i];
      if (c == '"') {
        return splitQuoted(separator);
      }
      if (c == separator) {
        add(begin, i);
        begin = i + 1;
      }
    }
    add(begin, end);
    return true;
  }

  private boolean splitQuoted(char separator) {
    count = 0;
    try {
      CsvRecord row =
          CsvReader.builder()
              .fieldSeparator(separator)
              .trimWhitespacesAroundQuotes(true)
              .ofSingleCsvRecord(text());
      StringBuilder all = new StringBuilder();
      int[] cuts = new int[row.getFieldCount() + 1];
      for (int i = 0; i < row.getFieldCount(); i++) {
        all.append(row.getField(i));
        cuts[i + 1] = all.length();
      }
      cells = all.toString().toCharArray();
      for (int i = 0; i < row.getFieldCount(); i++) {
        add(cuts[i], cuts[i + 1]);
      }
      return true;
    } catch (CsvParseException broken) {
      return false;
    }
  }

  private void add(int begin, int stop) {
    if (count == from.length) {
      from = Arrays.copyOf(from, 2 * count);
      to = Arrays.copyOf(to, 2 * count);
    }
    int a = begin;
    int b = stop;
    while (a < b && cells[a] <= ' ') {
      a++;
    }
    while (b > a && (cells[b - 1] <= ' ' || cells[b - 1] == '\u00a0')) {
      b--;
    }
    from[count] = a;
    to[count++] = b;
  }

  /** Number of fields after {@link #split}. */
  public int fields() {
    return count;
  }

  /** The characters that {@link #from} and {@link #to} point into. */
  public char[] cells() {
    return cells;
  }

  public int from(int field) {
    return from[field];
  }

  public int to(int field) {
    return to[field];
  }

  /** Length of a field; 0 for one the line does not have. */
  public int length(int field) {
    return field < count ? to[field] - from[field] : 0;
  }

  /** A field as text; empty for one the line does not have. */
  public String field(int field) {
    return field < count ? new String(cells, from[field], to[field] - from[field]) : "";
  }
}

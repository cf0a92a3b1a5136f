package tunwarden.replay;

import java.io.EOFException;
import java.io.IOException;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.zip.ZipException;
import tunwarden.replay.layout.Layout;
import tunwarden.replay.text.Line;
import tunwarden.replay.text.LineSource;

/**
 * One pass over a log: lines in, rows out in order of time, everything odd counted in {@link
 * #notes}. Memory does not grow with the file. Not thread-safe.
 */
public final class LogReader implements RowSource {
  private final String file;
  private final Layout layout;
  private final LineSource lines;
  private final Line line = new Line();
  private final LogNotes notes;
  private final RowParser parser;
  private final RowOrder order;
  private final Hash hash;
  private final List<LogRow> parsed = new ArrayList<>();
  private final int lastColumn;
  private int lastColumnLength;
  private ZoneOffset firstOffset;
  private boolean finished;
  private boolean anyValue;

  /** Gives the hash of the file. */
  interface Hash {
    Optional<String> get() throws IOException;
  }

  LogReader(String file, Layout layout, LogOptions options, LineSource lines, Hash hash) {
    this.file = file;
    this.hash = hash;
    this.layout = layout;
    this.lines = lines;
    this.notes = new LogNotes(layout.guesses());
    this.parser = new RowParser(layout, options, notes);
    this.order = new RowOrder(notes);
    this.lastColumn = layout.fields() - 1;
  }

  /** What this pass has met so far. */
  public LogNotes notes() {
    return notes;
  }

  /** How the log is read. */
  public Layout layout() {
    return layout;
  }

  /** The offset the first row's time was written in; null before it was read. */
  public ZoneOffset offset() {
    return firstOffset;
  }

  /**
   * SHA-256 of the file as it lies on the disk, hexadecimal, if it was opened for that; reads what
   * is left of it, so ask when the pass is over.
   */
  public Optional<String> sha256() throws IOException {
    return hash.get();
  }

  /**
   * The next row, or null at the end.
   *
   * @throws BadLogException at the end, when the log held no row or no value at all
   */
  @Override
  public LogRow next() throws IOException {
    while (true) {
      LogRow row = order.poll();
      if (row != null) {
        notes.countRow();
        return row;
      }
      if (finished) {
        return null;
      }
      advance();
    }
  }

  private void advance() throws IOException {
    if (!nextLine()) {
      finished = true;
      order.finish();
      notes.noteSkippedHour(parser.skippedHours());
      refuseAUselessLog();
      return;
    }
    if (line.number() < layout.firstRow() || line.isComment() || line.isBlank()) {
      return;
    }
    parsed.clear();
    if (!readLine()) {
      return;
    }
    for (LogRow row : parsed) {
      anyValue |= !row.samples().isEmpty();
      order.add(row);
    }
  }

  private boolean nextLine() throws IOException {
    try {
      return lines.next(line);
    } catch (EOFException | ZipException damaged) {
      notes.countUnreadable(line.number() + 1, "", "the compressed file is damaged from here on");
      return false;
    }
  }

  private boolean readLine() {
    if (line.isTooLong()) {
      notes.countUnreadable(line.number(), "", "longer than " + LineSource.LONGEST + " characters");
      return false;
    }
    if (!line.split(layout.separator())) {
      notes.countUnreadable(line.number(), "", "a quote is opened and not closed on this line");
      return false;
    }
    if (isTorn()) {
      notes.noteTorn(line.number());
      return false;
    }
    if (!parser.read(line, parsed)) {
      if (line.isTerminated()) {
        notes.countUnreadable(line.number(), parser.badField(), parser.badReason());
      } else {
        notes.noteTorn(line.number());
      }
      return false;
    }
    lastColumnLength = line.length(lastColumn);
    firstOffset = firstOffset == null ? parser.offset() : firstOffset;
    return true;
  }

  /**
   * A last line without its end is torn when fields are missing or the last one is shorter than in
   * the row above; many programs leave out the very last line end, so that alone proves nothing.
   */
  private boolean isTorn() {
    return !line.isTerminated()
        && (line.fields() < layout.fields() || line.length(lastColumn) < lastColumnLength);
  }

  private void refuseAUselessLog() {
    if (notes.late() > notes.rows() + RowOrder.WINDOW) {
      throw new BadLogException(
          file,
          0,
          "time",
          "most rows are older than the ones above them; turn the log round so that the oldest row"
              + " comes first below the line of names");
    }
    if (anyValue) {
      return;
    }
    if (notes.unreadable() > 0) {
      throw new BadLogException(
          file, 0, "", "no row could be read; the first is " + notes.firstUnreadable());
    }
    throw new BadLogException(
        file,
        0,
        "",
        "it holds no rows of readings; a log needs a line of names such as"
            + " time,pressure_bar_g,temperature_c and rows below it");
  }

  @Override
  public void close() throws IOException {
    lines.close();
  }
}

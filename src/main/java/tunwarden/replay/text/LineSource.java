package tunwarden.replay.text;

import java.io.Closeable;
import java.io.IOException;
import java.io.Reader;

/** Lines of bounded length out of a reader; memory does not grow with the file. */
public final class LineSource implements Closeable {
  /** Characters of the longest line kept; the rest of a longer one is skipped. */
  public static final int LONGEST = 65_536;

  private final Reader in;
  private final char[] buffer = new char[2 * LONGEST];
  private int start;
  private int end;
  private long number;
  private boolean drained;

  public LineSource(Reader in) {
    this.in = in;
  }

  /**
   * Points {@code line} at the next line.
   *
   * @return false at the end of the file
   * @throws IOException when the file cannot be read, or a compressed one is damaged
   */
  public boolean next(Line line) throws IOException {
    line.tooLong = false;
    int scanned = start;
    while (true) {
      int newline = newlineFrom(scanned);
      if (newline >= 0) {
        emit(line, newline, true);
        start = newline + 1;
        return true;
      }
      if (drained) {
        if (start == end) {
          return false;
        }
        emit(line, end, false);
        start = end;
        return true;
      }
      scanned = end - start;
      if (scanned > LONGEST) {
        return skipLongLine(line);
      }
      refill();
    }
  }

  private int newlineFrom(int position) {
    for (int i = position; i < end; i++) {
      if (buffer[i] == '\n') {
        return i;
      }
    }
    return -1;
  }

  private void refill() throws IOException {
    System.arraycopy(buffer, start, buffer, 0, end - start);
    end -= start;
    start = 0;
    int got = in.read(buffer, end, buffer.length - end);
    if (got < 0) {
      drained = true;
    } else {
      end += got;
    }
  }

  /** Keeps the head of the line and drops everything up to its end. */
  private boolean skipLongLine(Line line) throws IOException {
    char[] head = new char[LONGEST];
    System.arraycopy(buffer, start, head, 0, LONGEST);
    int newline = -1;
    while (newline < 0 && !drained) {
      start = end;
      refill();
      newline = newlineFrom(start);
    }
    line.chars = head;
    line.start = 0;
    line.end = LONGEST;
    line.number = ++number;
    line.terminated = newline >= 0;
    line.tooLong = true;
    start = newline >= 0 ? newline + 1 : end;
    return true;
  }

  private void emit(Line line, int stop, boolean terminated) {
    line.chars = buffer;
    line.start = start;
    line.end = stop > start && buffer[stop - 1] == '\r' ? stop - 1 : stop;
    line.number = ++number;
    line.terminated = terminated;
  }

  @Override
  public void close() throws IOException {
    in.close();
  }
}

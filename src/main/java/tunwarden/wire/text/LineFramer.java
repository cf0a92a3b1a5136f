package tunwarden.wire.text;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * Cuts a stream of bytes, arriving in pieces of any size, into lines. Keeps at most {@link #CAP}
 * bytes: a longer line is thrown away up to its end and counted. What comes first, up to a line
 * end, may be the tail of a line, in which a value could be mistaken for another; it is thrown away
 * too unless the stream is known to begin with a whole line.
 */
public final class LineFramer {
  /** Longest line that is kept, bytes. */
  public static final int CAP = 4096;

  private final byte end;
  private final byte[] pending = new byte[CAP];
  private int length;
  private boolean discarding;
  private long bytesDropped;
  private long linesDropped;

  /**
   * Begins a stream.
   *
   * @param end the character at which lines end, of code below 128
   * @param beginsWhole whether the first line is known to be whole, as an answer to a question is
   */
  public LineFramer(char end, boolean beginsWhole) {
    this.end = (byte) end;
    this.discarding = !beginsWhole;
  }

  /** Takes {@code count} bytes in; gives the lines they complete, without line ends or blanks. */
  public List<String> accept(byte[] bytes, int count) {
    List<String> lines = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      if (bytes[i] == end) {
        finish(lines);
      } else {
        keep(bytes[i]);
      }
    }
    return lines;
  }

  private void keep(byte next) {
    if (discarding) {
      bytesDropped++;
    } else if (length == CAP) {
      bytesDropped += length + 1;
      linesDropped++;
      length = 0;
      discarding = true;
    } else {
      pending[length++] = next;
    }
  }

  private void finish(List<String> lines) {
    String line = new String(pending, 0, length, StandardCharsets.ISO_8859_1).strip();
    if (!discarding && !line.isEmpty()) {
      lines.add(line);
    }
    discarding = false;
    length = 0;
  }

  /** Bytes thrown away in lines that were too long or cut off. */
  public long bytesDropped() {
    return bytesDropped;
  }

  /** Lines thrown away because they were too long. */
  public long linesDropped() {
    return linesDropped;
  }

  /** Bytes held of a line that has not ended. */
  public int pending() {
    return length;
  }
}

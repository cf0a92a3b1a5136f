package tunwarden.wire.text;

/**
 * Tells why a stream of bytes yields no values. At a wrong baud rate most bytes of a text come out
 * as something no text holds; a wrong line end gives clean text without lines; a wrong profile
 * gives clean lines without its fields. Counts only what came since the last line understood.
 */
public final class Garble {
  private static final int ENOUGH_BYTES = 48;
  private static final int ENOUGH_LINES = 3;
  private static final double FOUL_SHARE = 0.1;

  private final int end;
  private long seen;
  private long foul;
  private long lines;

  /** For lines that end at this character. */
  public Garble(char end) {
    this.end = end;
  }

  /** Why nothing is understood. */
  public enum Verdict {
    /** Values come, or too little has been seen to tell. */
    FINE,
    /** The bytes are no text. */
    GARBLED,
    /** Text without line ends. */
    ENDLESS,
    /** Lines without the fields that are looked for. */
    FOREIGN
  }

  /** Takes bytes in as they come. */
  public void accept(byte[] bytes, int count) {
    for (int i = 0; i < count; i++) {
      int b = bytes[i] & 0xFF;
      boolean text = (b >= ' ' && b < 0x7F) || b == '\t' || b == '\r' || b == '\n' || b == end;
      seen++;
      foul += text ? 0 : 1;
    }
  }

  /** A line came that was not understood. */
  public void strangeLine() {
    lines++;
  }

  /** A line was understood: all that went before is forgiven. */
  public void understood() {
    seen = 0;
    foul = 0;
    lines = 0;
  }

  /** What is wrong, if anything. */
  public Verdict verdict() {
    if (seen >= ENOUGH_BYTES && foul > FOUL_SHARE * seen) {
      return Verdict.GARBLED;
    }
    if (lines >= ENOUGH_LINES) {
      return Verdict.FOREIGN;
    }
    return lines == 0 && seen > LineFramer.CAP / 4 ? Verdict.ENDLESS : Verdict.FINE;
  }
}

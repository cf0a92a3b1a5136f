package tunwarden.wire.profile;

/**
 * How a line of text is cut and read.
 *
 * @param end the character that ends a line; carriage return and line feed beside it are dropped
 * @param start what a line must begin with to count; empty for any line
 * @param layout how the values stand in it
 * @param between the characters that part one value from the next
 * @param joinedBy the character that joins key and value
 * @param decimalComma whether numbers are written with a comma
 * @param check how the line proves itself
 */
public record Framing(
    char end,
    String start,
    Layout layout,
    String between,
    char joinedBy,
    boolean decimalComma,
    Check check) {
  /** Lines such as {@code P=0.873 T=5.25}. */
  public static final Framing PAIRS =
      new Framing('\n', "", Layout.PAIRS, " \t,;", '=', false, Check.NONE);

  /** How the values stand in a line. */
  public enum Layout {
    /** Key and value, joined by a character, in any order. */
    PAIRS,
    /** Values by their place, counted from 1. */
    COLUMNS
  }

  /** How a line proves itself. */
  public enum Check {
    NONE("none"),
    /** {@code $…*hh}: exclusive or of what stands between the marks, as in NMEA 0183. */
    XOR("xor"),
    /** Sum of the bytes before the mark, modulo 256, two hexadecimal digits. */
    SUM("sum"),
    /**
     * CRC-16 of Modbus over the bytes before the mark, four hexadecimal digits, high byte first.
     */
    CRC16_MODBUS("crc16-modbus"),
    /** CRC-16 with polynomial 1021, start FFFF, over the bytes before the mark, four digits. */
    CRC16_CCITT("crc16-ccitt");

    private final String word;

    Check(String word) {
      this.word = word;
    }

    /** Name in a device profile. */
    public String word() {
      return word;
    }
  }
}

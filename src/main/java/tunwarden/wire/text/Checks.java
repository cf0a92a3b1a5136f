package tunwarden.wire.text;

import java.nio.charset.StandardCharsets;
import java.util.HexFormat;
import java.util.Optional;
import tunwarden.wire.profile.Framing.Check;
import tunwarden.wire.signal.Crc16;

/** The proofs a line of text may carry behind a {@code *}. */
public final class Checks {
  private static final char MARK = '*';
  private static final int CCITT_POLYNOMIAL = 0x1021;

  private Checks() {}

  /**
   * The part of the line that was proved.
   *
   * @return the line before the mark; empty when the proof is missing or wrong
   */
  public static Optional<String> proved(String line, Check check) {
    if (check == Check.NONE) {
      return Optional.of(line);
    }
    int mark = line.lastIndexOf(MARK);
    if (mark < 0) {
      return Optional.empty();
    }
    String body = line.substring(0, mark);
    String said = line.substring(mark + 1).strip();
    return said.equalsIgnoreCase(digits(body, check)) ? Optional.of(body) : Optional.empty();
  }

  /** The line with its proof behind it. */
  public static String prove(String body, Check check) {
    return check == Check.NONE ? body : body + MARK + digits(body, check);
  }

  private static String digits(String body, Check check) {
    byte[] bytes = body.getBytes(StandardCharsets.ISO_8859_1);
    return switch (check) {
      case NONE -> "";
      case XOR -> hex(xor(bytes), 2);
      case SUM -> hex(sum(bytes), 2);
      case CRC16_MODBUS -> hex(Crc16.of(bytes, 0, bytes.length), 4);
      case CRC16_CCITT -> hex(ccitt(bytes), 4);
    };
  }

  private static String hex(int value, int digits) {
    return HexFormat.of().withUpperCase().toHexDigits(value, digits);
  }

  /**
   * NMEA 0183: exclusive or of the characters between, not counting, the {@code $} and the mark.
   */
  private static int xor(byte[] bytes) {
    int result = 0;
    boolean dollar = bytes.length > 0 && (bytes[0] == '$' || bytes[0] == '!');
    for (int i = dollar ? 1 : 0; i < bytes.length; i++) {
      result ^= bytes[i] & 0xFF;
    }
    return result;
  }

  private static int sum(byte[] bytes) {
    int result = 0;
    for (byte b : bytes) {
      result = (result + b) & 0xFF;
    }
    return result;
  }

  private static int ccitt(byte[] bytes) {
    int crc = 0xFFFF;
    for (byte b : bytes) {
      crc ^= (b & 0xFF) << 8;
      for (int bit = 0; bit < 8; bit++) {
        crc = (crc & 0x8000) != 0 ? (crc << 1) ^ CCITT_POLYNOMIAL : crc << 1;
      }
      crc &= 0xFFFF;
    }
    return crc;
  }
}

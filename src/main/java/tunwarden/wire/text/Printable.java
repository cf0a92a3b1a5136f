package tunwarden.wire.text;

import java.nio.charset.StandardCharsets;
import java.util.HexFormat;

/**
 * Bytes from a wire made fit to be shown: anything but printable ASCII becomes {@code <hh>}, so
 * that no escape sequence ever reaches the user's terminal.
 */
public final class Printable {
  private static final HexFormat HEX = HexFormat.of();

  private Printable() {}

  /** The last {@code most} bytes of {@code count}. */
  public static String of(byte[] bytes, int count, int most) {
    StringBuilder text = new StringBuilder();
    for (int i = Math.max(0, count - most); i < count; i++) {
      int b = bytes[i] & 0xFF;
      if (b >= ' ' && b < 0x7F && b != '<') {
        text.append((char) b);
      } else {
        text.append('<').append(HEX.toHexDigits((byte) b)).append('>');
      }
    }
    return text.toString();
  }

  /** A text, cut to {@code most} characters from its beginning. */
  public static String of(String text, int most) {
    byte[] bytes = text.getBytes(StandardCharsets.ISO_8859_1);
    int count = Math.min(bytes.length, most);
    return of(bytes, count, count);
  }

  /** Bytes in pairs of hexadecimal digits, as Modbus people read them. */
  public static String hex(byte[] bytes, int count, int most) {
    StringBuilder text = new StringBuilder();
    for (int i = Math.max(0, count - most); i < count; i++) {
      text.append(text.isEmpty() ? "" : " ").append(HEX.toHexDigits(bytes[i]));
    }
    return text.toString();
  }
}

package tunwarden.replay.text;

import java.io.IOException;
import java.io.InputStream;
import java.io.PushbackInputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.Charset;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;

/**
 * How the characters of a file are stored.
 *
 * @param charset to decode with
 * @param guess what to tell a person; empty for UTF-8
 */
public record Encoding(Charset charset, String guess) {
  private static final Charset WESTERN = Charset.forName("windows-1252");

  /**
   * Judges by the head of the file: a byte-order mark, zeros at every other byte, or UTF-8 that
   * does not decode.
   *
   * @param cut whether the head ends somewhere inside the file
   */
  public static Encoding guess(byte[] head, boolean cut) {
    if (startsWith(head, 0xff, 0xfe) || zeros(head, 1)) {
      return new Encoding(StandardCharsets.UTF_16LE, "the file is UTF-16");
    }
    if (startsWith(head, 0xfe, 0xff) || zeros(head, 0)) {
      return new Encoding(StandardCharsets.UTF_16BE, "the file is UTF-16");
    }
    CharsetDecoder strict =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    CoderResult result =
        strict.decode(ByteBuffer.wrap(head), CharBuffer.allocate(head.length + 1), !cut);
    return result.isError()
        ? new Encoding(WESTERN, "the file is not UTF-8 and was read as Windows-1252")
        : new Encoding(StandardCharsets.UTF_8, "");
  }

  private static boolean startsWith(byte[] head, int first, int second) {
    return head.length > 1 && (head[0] & 0xff) == first && (head[1] & 0xff) == second;
  }

  private static boolean zeros(byte[] head, int phase) {
    int zeros = 0;
    int looked = 0;
    for (int i = phase; i < Math.min(head.length, 400); i += 2) {
      looked++;
      zeros += head[i] == 0 ? 1 : 0;
    }
    return looked > 4 && zeros > 0.8 * looked;
  }

  /** The stream past its byte-order mark, if it has one. */
  public static InputStream withoutMark(InputStream in) throws IOException {
    PushbackInputStream bytes = new PushbackInputStream(in, 3);
    byte[] mark = bytes.readNBytes(3);
    boolean utf8 = mark.length == 3 && startsWith(mark, 0xef, 0xbb) && (mark[2] & 0xff) == 0xbf;
    boolean utf16 = startsWith(mark, 0xff, 0xfe) || startsWith(mark, 0xfe, 0xff);
    if (!utf8) {
      int keep = utf16 ? 2 : 0;
      bytes.unread(mark, keep, mark.length - keep);
    }
    return bytes;
  }
}

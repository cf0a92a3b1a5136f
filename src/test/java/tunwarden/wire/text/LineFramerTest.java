package tunwarden.wire.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Lines out of bytes that arrive in any pieces. */
class LineFramerTest {
  private static List<String> feed(LineFramer framer, String text, int piece) {
    byte[] all = text.getBytes(StandardCharsets.ISO_8859_1);
    List<String> lines = new ArrayList<>();
    for (int from = 0; from < all.length; from += piece) {
      byte[] part = Arrays.copyOfRange(all, from, Math.min(all.length, from + piece));
      lines.addAll(framer.accept(part, part.length));
    }
    return lines;
  }

  @Test
  void linesAreTheSameAtEveryChunkSize() {
    String text = "tail\r\nP=0.873 T=5.25\r\n\r\n\nP=0.874\n" + "y".repeat(5000) + "\nP=0.875\nP=";
    for (int piece = 1; piece <= text.length(); piece++) {
      LineFramer framer = new LineFramer('\n', false);
      assertEquals(List.of("P=0.873 T=5.25", "P=0.874", "P=0.875"), feed(framer, text, piece));
      assertEquals(1, framer.linesDropped());
      assertEquals("tail\r".length() + 5000, framer.bytesDropped());
      assertEquals(2, framer.pending());
    }
  }

  @Test
  void aLineOfExactlyTheCapIsKeptAndOneByteMoreIsNot() {
    LineFramer framer = new LineFramer('\n', true);
    String longest = "z".repeat(LineFramer.CAP);
    assertEquals(List.of(longest), feed(framer, longest + "\n", 64));
    assertEquals(List.of(), feed(framer, longest + "z\n", 64));
    assertEquals(List.of("after"), feed(framer, "after\n", 64));
  }

  @Test
  void aStreamWithoutLineEndsHoldsNoMoreThanTheCap() {
    LineFramer framer = new LineFramer('\n', true);
    for (int i = 0; i < 1000; i++) {
      assertTrue(feed(framer, "0123456789".repeat(100), 1000).isEmpty());
      assertTrue(framer.pending() <= LineFramer.CAP);
    }
  }
}

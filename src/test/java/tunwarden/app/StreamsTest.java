package tunwarden.app;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.Test;

class StreamsTest {
  @Test
  void theLocaleVariablesDecideInTheirOrder() {
    assertEquals(
        StandardCharsets.US_ASCII,
        Streams.charset(Map.of("LC_ALL", "C", "LANG", "en_GB.UTF-8"), "UTF-8"));
    assertEquals(StandardCharsets.UTF_8, Streams.charset(Map.of("LANG", "C.utf8"), ""));
    assertEquals(StandardCharsets.ISO_8859_1, Streams.charset(Map.of(), "ISO-8859-1"));
    assertEquals(StandardCharsets.US_ASCII, Streams.charset(Map.of(), "no-such-charset"));
  }

  @Test
  void aTerminalWithoutUnicodeReadsPlainLetters() throws IOException {
    StringWriter seen = new StringWriter();
    try (Streams.Folding folding = new Streams.Folding(seen)) {
      folding.write("5.31 ± 0.14 g/L at 4 °C, 2–3 m³");
    }
    assertEquals("5.31 +/- 0.14 g/L at 4 C, 2-3 m3", seen.toString());
  }
}

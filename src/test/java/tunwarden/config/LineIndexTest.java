package tunwarden.config;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;

import java.time.Duration;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class LineIndexTest {
  @Test
  void keysAreFoundWhereTheyStandWhateverTheirValuesHold() {
    LineIndex index =
        LineIndex.of(
            """
            # a = 1
            a = "x # [no] = {"
            b = '''
            [not.a.table]
            c = 1
            '''
            "quoted key" = [
              1, # two
              "]",
            ]
            [t.u]  # note
            d.e = { f = 1, g = { h = 2 }, i = [ { j = 1 } ] }
            k = 2024-01-01
            """);
    assertEquals(2, index.lineOf(List.of("a")));
    assertEquals(3, index.lineOf(List.of("b")));
    assertEquals(7, index.lineOf(List.of("quoted key")));
    assertEquals(11, index.lineOf(List.of("t", "u")));
    assertEquals(12, index.lineOf(List.of("t", "u", "d", "e", "g", "h")));
    assertEquals(12, index.lineOf(List.of("t", "u", "d", "e", "i")));
    assertEquals(13, index.lineOf(List.of("t", "u", "k")));
    assertEquals(1, index.lineOf(List.of("c")));
    assertEquals(11, index.lineOf(List.of("t", "u", "absent")), "the table around it");
  }

  @Test
  void anyTextIsScannedToItsEnd() {
    SplittableRandom random = new SplittableRandom(20_261_201);
    String signs = "ab=.[]{},\"'\\#\n \t";
    assertTimeoutPreemptively(
        Duration.ofSeconds(10),
        () -> {
          for (int run = 0; run < 20_000; run++) {
            StringBuilder text = new StringBuilder();
            for (int i = random.nextInt(40); i > 0; i--) {
              text.append(signs.charAt(random.nextInt(signs.length())));
            }
            LineIndex.of(text.toString());
          }
        });
  }
}

package tunwarden.screen.view;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.googlecode.lanterna.TextCharacter;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Columns of characters, and what may be drawn at all. */
class CellsTest {
  /** What the terminal library thinks wide must be what we think wide, or columns shift. */
  @Test
  void agreesWithTheTerminalLibraryOnEveryDrawableCharacter() {
    List<String> odd = new ArrayList<>();
    for (int c = 0x20; c <= 0x1FFFF; c++) {
      String text = Character.toString(c);
      boolean drawable = Cells.clean(text).equals(text);
      if (drawable) {
        TextCharacter[] theirs = TextCharacter.fromString(text);
        boolean wide = theirs.length == 1 && theirs[0].isDoubleWidth();
        if (wide != (Cells.width(c) == 2)) {
          odd.add(String.format("U+%04X", c));
        }
      }
    }
    assertTrue(odd.isEmpty(), odd.size() + " differ: " + odd.subList(0, Math.min(60, odd.size())));
  }

  @Test
  void marksAreComposedWithTheirLetterOrLeftOut() {
    assertEquals("\u00fcxyz", Cells.clean("u\u0308x\u0323yz"));
    Canvas canvas = new Canvas(10, 1, false);
    assertEquals(3, canvas.put(0, 0, "x\u0323yz", Role.NORMAL));
    assertEquals("y", canvas.glyph(1, 0));
  }

  @Test
  void wideCharactersAreCutWhole() {
    Canvas canvas = new Canvas(10, 1, false);
    canvas.put(0, 0, 4, "酒酒酒", Role.NORMAL);
    assertEquals("酒…", canvas.text().strip());
    canvas.put(1, 0, "|", Role.NORMAL);
    assertEquals(" |…", canvas.text().stripTrailing());
  }

  @Test
  void escapesAndOverridesNeverReachTheTerminal() {
    assertEquals("ab[31mc", Cells.clean("a\u0007b\u001b[31m\u202ec\u200d"));
  }

  @Test
  void everythingHasAnAsciiSpelling() {
    assertEquals("Marz 4 C +- 2 ??", Plain.of("März 4 °C ± 2 酒"));
    for (int c = 0xA0; c < 0x3000; c++) {
      assertTrue(Cells.isPlain(Plain.of(Character.toString(c))), Integer.toHexString(c));
    }
  }
}

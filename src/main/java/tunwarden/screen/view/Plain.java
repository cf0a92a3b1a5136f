package tunwarden.screen.view;

import java.text.Normalizer;
import java.util.HashMap;
import java.util.Map;

/** Plain-ASCII spelling of everything the dashboard writes and draws. */
final class Plain {
  private static final Map<Integer, String> SPELLING = new HashMap<>();

  static {
    spell("┄─━═╌╴╶", '-');
    spell("│┃║┊╵╷", '|');
    spell("├┤┬┴┼┌┐└┘╭╮╰╯", '+');
    spell("█▓■▇▆", '#');
    spell("▒▅▄", '=');
    spell("░▃▂▁", '.');
    spell("▸▷▹→▶", '>');
    spell("◀◂←◁", '<');
    spell("▲↑△", '^');
    spell("▼↓▽", 'v');
    spell("●◆•", '*');
    spell("·", '.');
    spell("…", '~');
    spell("–—−", '-');
    spell("×", 'x');
    spell("µ", 'u');
    spell("²₂", '2');
    spell("³", '3');
    spell("↕", ' ');
    SPELLING.put((int) '±', "+-");
    SPELLING.put((int) '°', "");
    SPELLING.put((int) '≤', "<=");
    SPELLING.put((int) '≥', ">=");
    SPELLING.put((int) '≈', "~");
  }

  private Plain() {}

  private static void spell(String characters, char as) {
    characters.codePoints().forEach(c -> SPELLING.put(c, String.valueOf(as)));
  }

  /** The text in ASCII; accents are dropped, what has no spelling becomes a question mark. */
  static String of(String text) {
    if (Cells.isPlain(text)) {
      return text;
    }
    StringBuilder plain = new StringBuilder();
    text.codePoints().forEach(c -> plain.append(of(c)));
    return plain.toString();
  }

  private static String of(int codePoint) {
    if (codePoint >= ' ' && codePoint <= '~') {
      return Character.toString(codePoint);
    }
    String spelled = SPELLING.get(codePoint);
    if (spelled != null) {
      return spelled;
    }
    String parted = Normalizer.normalize(Character.toString(codePoint), Normalizer.Form.NFD);
    int base = parted.codePointAt(0);
    if (base >= ' ' && base <= '~') {
      return Character.toString(base);
    }
    return "?".repeat(Cells.width(codePoint));
  }
}

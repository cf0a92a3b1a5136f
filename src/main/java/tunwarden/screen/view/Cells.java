package tunwarden.screen.view;

import java.text.Normalizer;

/**
 * How many columns text takes. East Asian wide and fullwidth characters and pictographs take two
 * (Unicode Standard Annex #11, ranges in outline), every other drawable character one.
 */
final class Cells {
  /** First and last code point of each stretch of two-column characters. */
  private static final int[][] WIDE = {
    {0x1100, 0x115F},
    {0x2E80, 0x303E},
    {0x3041, 0x33FF},
    {0x3400, 0x4DBF},
    {0x4E00, 0x9FFF},
    {0xA000, 0xA4CF},
    {0xAC00, 0xD7A3},
    {0xF900, 0xFAFF},
    {0xFE30, 0xFE4F},
    {0xFF00, 0xFF60},
    {0xFFE0, 0xFFE6},
    {0x1F300, 0x1F64F},
    {0x1F680, 0x1F6FF},
    {0x1F900, 0x1F9FF},
    {0x20000, 0x3FFFD},
  };

  /** Stretches whose width the terminal library and terminals judge differently; not drawn. */
  private static final int[][] DISPUTED = {
    {0x1160, 0x11FF},
    {0x2F00, 0x2FFB},
    {0x303F, 0x303F},
    {0x3105, 0x312F},
    {0x3190, 0x31E3},
    {0x3300, 0x33FF},
    {0xA000, 0xA4C6},
    {0xFFE0, 0xFFE6},
  };

  private static final int STAND_IN = '?';

  private Cells() {}

  /** Columns of one drawable code point: 1 or 2. */
  static int width(int codePoint) {
    return isIn(WIDE, codePoint) ? 2 : 1;
  }

  private static boolean isIn(int[][] stretches, int codePoint) {
    for (int[] stretch : stretches) {
      if (codePoint <= stretch[1]) {
        return codePoint >= stretch[0];
      }
    }
    return false;
  }

  /** Columns of a text. */
  static int width(String text) {
    int sum = 0;
    for (int i = 0; i < text.length(); i += Character.charCount(text.codePointAt(i))) {
      sum += width(text.codePointAt(i));
    }
    return sum;
  }

  /** Whether every character is printable ASCII, which is nearly always and cheap to know. */
  static boolean isPlain(String text) {
    for (int i = 0; i < text.length(); i++) {
      if (text.charAt(i) < ' ' || text.charAt(i) > '~') {
        return false;
      }
    }
    return true;
  }

  /**
   * Text safe to draw, one character to the cell: letters composed with their marks where Unicode
   * has the composed letter; other marks, control and invisible formatting characters (escapes,
   * direction overrides, joiners, variation selectors) and unpaired surrogates taken out. The
   * terminal library takes a letter with a loose mark for two columns, so none may reach it.
   */
  static String clean(String text) {
    if (isPlain(text)) {
      return text;
    }
    StringBuilder kept = new StringBuilder();
    Normalizer.normalize(text, Normalizer.Form.NFC)
        .codePoints()
        .filter(Cells::isDrawable)
        .map(Cells::standIn)
        .forEach(kept::appendCodePoint);
    return kept.toString();
  }

  /** Narrow characters beyond the basic plane are taken for wide by the terminal library. */
  private static int standIn(int codePoint) {
    boolean narrowBeyond = codePoint > Character.MAX_VALUE && width(codePoint) == 1;
    return narrowBeyond || isIn(DISPUTED, codePoint) ? STAND_IN : codePoint;
  }

  private static boolean isDrawable(int codePoint) {
    return switch (Character.getType(codePoint)) {
      case Character.NON_SPACING_MARK,
          Character.ENCLOSING_MARK,
          Character.CONTROL,
          Character.FORMAT,
          Character.SURROGATE,
          Character.PRIVATE_USE,
          Character.UNASSIGNED,
          Character.LINE_SEPARATOR,
          Character.PARAGRAPH_SEPARATOR ->
          false;
      default -> codePoint < 0xFE00 || codePoint > 0xFE0F;
    };
  }
}

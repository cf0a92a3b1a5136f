package tunwarden.screen.view;

import java.text.Normalizer;

/**
 * How many columns text takes. East Asian wide and fullwidth characters and pictographs take two
 * (Unicode Standard Annex #11, ranges in outline), combining marks none.
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

  private Cells() {}

  /** Columns of one code point: 0, 1 or 2. */
  static int width(int codePoint) {
    if (codePoint < 0x300) {
      return 1;
    }
    int type = Character.getType(codePoint);
    if (type == Character.NON_SPACING_MARK || type == Character.ENCLOSING_MARK) {
      return 0;
    }
    for (int[] stretch : WIDE) {
      if (codePoint <= stretch[1]) {
        return codePoint >= stretch[0] ? 2 : 1;
      }
    }
    return 1;
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
   * Text safe to draw: composed where possible, with control and invisible formatting characters
   * (escapes, direction overrides, joiners, variation selectors) and unpaired surrogates taken out.
   */
  static String clean(String text) {
    if (isPlain(text)) {
      return text;
    }
    StringBuilder kept = new StringBuilder();
    Normalizer.normalize(text, Normalizer.Form.NFC)
        .codePoints()
        .filter(Cells::isDrawable)
        .forEach(kept::appendCodePoint);
    return kept.toString();
  }

  private static boolean isDrawable(int codePoint) {
    return switch (Character.getType(codePoint)) {
      case Character.CONTROL,
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

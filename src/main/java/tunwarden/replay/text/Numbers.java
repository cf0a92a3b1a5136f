package tunwarden.replay.text;

/** Decimal numbers in a stretch of characters, with a decimal point or comma. */
public final class Numbers {
  private static final double[] POWER = {
    1e0, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15
  };
  private static final int EXACT_DIGITS = 15;

  private Numbers() {}

  /**
   * Reads a number. Up to fifteen digits are exact in a double and so is a power of ten that small,
   * so one division rounds as the language does; anything longer goes through the JDK.
   *
   * @param decimal the decimal sign, {@code .} or {@code ,}
   * @return NaN when the stretch is not a finite number in plain or exponent notation
   */
  public static double parse(char[] chars, int from, int to, char decimal) {
    int i = from;
    boolean negative = false;
    if (i < to && (chars[i] == '-' || chars[i] == '+')) {
      negative = chars[i++] == '-';
    }
    long digits = 0;
    int count = 0;
    int point = -1;
    for (; i < to; i++) {
      char c = chars[i];
      if (c >= '0' && c <= '9') {
        digits = digits * 10 + (c - '0');
        count++;
      } else if (c == decimal && point < 0) {
        point = count;
      } else {
        return slow(chars, from, to, decimal);
      }
      if (count > EXACT_DIGITS) {
        return slow(chars, from, to, decimal);
      }
    }
    if (count == 0) {
      return Double.NaN;
    }
    double value = point < 0 ? digits : digits / POWER[count - point];
    return negative ? -value : value;
  }

  /**
   * Exponents, long numbers and groups of three. A lone group ("1,013" beside decimal points) could
   * be either, so it is no number; "1.013,25" and "1,234,567" can only be one thing.
   */
  private static double slow(char[] chars, int from, int to, char decimal) {
    StringBuilder plain = new StringBuilder(to - from);
    int groups = 0;
    int sinceMark = -1;
    boolean fraction = false;
    for (int i = from; i < to; i++) {
      char c = chars[i];
      if (isGroupMark(c, decimal)) {
        if (fraction || plain.isEmpty() || (groups > 0 && sinceMark != 3)) {
          return Double.NaN;
        }
        groups++;
        sinceMark = 0;
      } else if (c == decimal) {
        if (fraction || (groups > 0 && sinceMark != 3)) {
          return Double.NaN;
        }
        fraction = true;
        plain.append('.');
      } else if (c >= '0' && c <= '9' || "+-eE\u2212".indexOf(c) >= 0) {
        plain.append(c == '\u2212' ? '-' : c);
        sinceMark++;
      } else {
        return Double.NaN;
      }
    }
    if (groups > 0 && !fraction && (groups < 2 || sinceMark != 3)) {
      return Double.NaN;
    }
    return finiteOrNaN(plain.toString());
  }

  private static boolean isGroupMark(char c, char decimal) {
    char other = decimal == '.' ? ',' : '.';
    return c == other || c == '\'' || c == '\u00a0' || c == '\u202f';
  }

  private static double finiteOrNaN(String plain) {
    try {
      double value = Double.parseDouble(plain);
      return Double.isFinite(value) ? value : Double.NaN;
    } catch (NumberFormatException notANumber) {
      return Double.NaN;
    }
  }

  /** Whether the stretch says that there is no value: blank, a dash, or a word for it. */
  public static boolean isMissing(char[] chars, int from, int to) {
    int length = to - from;
    if (length == 0) {
      return true;
    }
    if (length > 8) {
      return false;
    }
    return switch (new String(chars, from, length).toLowerCase(java.util.Locale.ROOT)) {
      case "nan", "-nan", "na", "n/a", "#n/a", "null", "none", "nil", "-", "--", "---", "----" ->
          true;
      default -> false;
    };
  }
}

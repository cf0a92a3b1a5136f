package tunwarden.replay.layout;

import java.util.List;
import tunwarden.replay.text.Numbers;

/** Numbers before it is known whether comma or point is the decimal sign. */
final class NumberGuess {
  private NumberGuess() {}

  static boolean looksLikeNumber(String cell) {
    return !Double.isNaN(value(cell, '.')) || !Double.isNaN(value(cell, ','));
  }

  /** The number at the start of a cell, a unit behind it allowed; NaN for none. */
  static double value(String cell, char decimal) {
    int end = 0;
    while (end < cell.length() && "+-.,eE0123456789\u2212".indexOf(cell.charAt(end)) >= 0) {
      end++;
    }
    boolean unitBehind = end < cell.length() && HeaderText.anyUnit(cell.substring(end).trim());
    if (end < cell.length() && !unitBehind) {
      return Double.NaN;
    }
    return Numbers.parse(cell.toCharArray(), 0, end, decimal);
  }

  /** The decimal sign that reads more cells; a point when nothing decides. */
  static char decimalSign(List<String> cells) {
    int point = 0;
    int comma = 0;
    for (String cell : cells) {
      point += cell.indexOf('.') >= 0 && !Double.isNaN(value(cell, '.')) ? 1 : 0;
      comma += cell.indexOf(',') >= 0 && !Double.isNaN(value(cell, ',')) ? 1 : 0;
    }
    return comma > point ? ',' : '.';
  }
}

package tunwarden.screen.view;

/**
 * The strokes that join true places on the scale with labels that had to move: one column of box
 * characters, where strokes that meet become one brace.
 */
final class LeaderLines {
  private static final int UP = 1;
  private static final int DOWN = 2;
  private static final int LEFT = 4;
  private static final int RIGHT = 8;

  /** Box character by the sides it reaches: up 1, down 2, left 4, right 8. */
  private static final String[] BOX = {
    " ", "╵", "╷", "│", "╴", "╯", "╮", "┤", "╶", "╰", "╭", "├", "─", "┴", "┬", "┼"
  };

  private final int[] sides;

  LeaderLines(int rows) {
    sides = new int[rows];
  }

  /** A stroke from the scale at one row to a label at another. */
  void join(int scaleRow, int labelRow) {
    sides[scaleRow] |= LEFT;
    sides[labelRow] |= RIGHT;
    int step = Integer.signum(labelRow - scaleRow);
    for (int row = scaleRow; row != labelRow; row += step) {
      sides[row] |= step > 0 ? DOWN : UP;
      sides[row + step] |= step > 0 ? UP : DOWN;
    }
  }

  String at(int row) {
    return BOX[sides[row]];
  }
}

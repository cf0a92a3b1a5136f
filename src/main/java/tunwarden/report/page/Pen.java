package tunwarden.report.page;

/** Draws a course through points, lifting where a value is missing. */
final class Pen {
  private final StringBuilder path = new StringBuilder();
  private boolean down;

  void to(double x, double y) {
    if (Double.isNaN(y) || Double.isInfinite(y)) {
      down = false;
      return;
    }
    path.append(down ? 'L' : 'M').append(Svg.number(x)).append(' ').append(Svg.number(y));
    down = true;
  }

  void lift() {
    down = false;
  }

  String path() {
    return path.toString();
  }
}

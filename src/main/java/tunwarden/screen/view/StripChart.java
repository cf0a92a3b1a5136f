package tunwarden.screen.view;

import java.time.Duration;
import tunwarden.assess.History.Trace;
import tunwarden.screen.model.Glyphs;

/** Draws one measured quantity as a line that shows the least and greatest value of every dot. */
final class StripChart {
  private StripChart() {}

  /**
   * Draws a trace into an area.
   *
   * @param bridge longest silence that is drawn across
   */
  static void draw(
      Canvas canvas, Area area, Trace trace, ChartScale scale, Pen pen, Duration bridge) {
    Raster raster = new Raster(area.columns(), area.rows(), pen.glyphs());
    int last = -1;
    long widest = Math.max(2, bridge.toMillis() / pen.dotMs());
    for (int x = 0; x < Math.min(trace.columns(), raster.width()); x++) {
      if (!trace.has(x)) {
        continue;
      }
      int low = scale.row(trace.min()[x], raster.height());
      int high = scale.row(trace.max()[x], raster.height());
      raster.column(x, low, high);
      if (last >= 0 && x - last <= widest) {
        int from = scale.row(trace.last()[last], raster.height());
        connect(raster, last, from, x, nearest(from, high, low));
      }
      last = x;
    }
    raster.draw(canvas, area.x(), area.y(), pen.role());
  }

  /**
   * How a line is drawn.
   *
   * @param glyphs characters
   * @param role of its cells
   * @param dotMs time of one dot, ms
   */
  record Pen(Glyphs glyphs, Role role, long dotMs) {}

  private static int nearest(int from, int top, int bottom) {
    return Math.max(Math.min(top, bottom), Math.min(Math.max(top, bottom), from));
  }

  /** A straight line between two dots, steep parts filled in. */
  static void connect(Raster raster, int fromX, int fromY, int toX, int toY) {
    int steps = toX - fromX;
    int before = fromY;
    for (int i = 1; i <= steps; i++) {
      int y = fromY + Math.round((toY - fromY) * (float) i / steps);
      int start = y == before ? y : before + Integer.signum(y - before);
      raster.column(fromX + i, start, y);
      before = y;
    }
  }
}

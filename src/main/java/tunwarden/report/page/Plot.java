package tunwarden.report.page;

import java.util.List;
import java.util.Locale;
import java.util.function.IntToDoubleFunction;
import tunwarden.estimate.Event;
import tunwarden.report.analysis.Bins;

/** One plot over the time of the log: frame, axes, courses, bands, levels, events. */
final class Plot {
  static final int WIDTH = 780;
  private static final int LEFT = 62;
  private static final int RIGHT = 62;
  private static final int TOP = 26;
  private static final int BELOW = 26;
  private static final int LANE = 13;

  private final Svg svg;
  private final TimeScale time;
  private final Scale left;
  private final Bins bins;
  private final int height;
  private final int lanes;
  private double labelEnds = TOP - 100;

  /**
   * An empty plot.
   *
   * @param shape how large, and what it is called
   * @param bins the course
   * @param time scale made by {@link #timeScale}
   * @param least lowest value on the left axis
   * @param greatest highest value on the left axis
   */
  Plot(Shape shape, Bins bins, TimeScale time, double least, double greatest) {
    this.height = shape.height();
    this.lanes = shape.lanes();
    this.svg = new Svg(WIDTH, shape.height(), shape.title());
    this.bins = bins;
    this.time = time;
    this.left = Scale.over(least, greatest, bottom(), TOP);
    svg.rectangle(LEFT, TOP, WIDTH - LEFT - RIGHT, bottom() - TOP, "frame");
    for (TimeScale.Mark mark : time.marks()) {
      svg.line(mark.at(), TOP, mark.at(), bottom(), "grid");
      svg.text(mark.at(), height - 8, "middle", "tick", mark.label());
    }
    svg.text(LEFT, 14, "start", "axis", shape.leftAxis());
    for (double mark : left.marks(6)) {
      svg.line(LEFT, left.at(mark), WIDTH - RIGHT, left.at(mark), "grid");
      svg.text(LEFT - 6, left.at(mark) + 4, "end", "tick", label(mark, left.step(6)));
    }
  }

  /**
   * Size and words of a plot.
   *
   * @param height in picture units
   * @param lanes lanes for events below the frame
   * @param title for those who cannot see it
   * @param leftAxis what the left axis shows
   */
  record Shape(int height, int lanes, String title, String leftAxis) {}

  /** The time axis all plots of a log share. */
  static TimeScale timeScale(long fromMs, long untilMs, java.time.ZoneId zone) {
    return new TimeScale(fromMs, untilMs, LEFT, WIDTH - RIGHT, zone);
  }

  private int bottom() {
    return height - BELOW - lanes * LANE;
  }

  private static String label(double value, double step) {
    int decimals = step >= 1 ? 0 : step >= 0.1 ? 1 : 2;
    return tunwarden.units.Display.number(value, decimals);
  }

  /** A second axis on the right, in its own unit. */
  Scale rightAxis(double least, double greatest, String name) {
    Scale right = Scale.over(least, greatest, bottom(), TOP);
    svg.text(WIDTH - RIGHT, 14, "end", "axis second", name);
    for (double mark : right.marks(6)) {
      svg.text(
          WIDTH - RIGHT + 6,
          right.at(mark) + 4,
          "start",
          "tick second",
          label(mark, right.step(6)));
    }
    return right;
  }

  /** A course of means on the left axis. */
  Plot course(IntToDoubleFunction value, String style) {
    return course(value, left, style);
  }

  /** A course on a scale of its own. */
  Plot course(IntToDoubleFunction value, Scale scale, String style) {
    Pen pen = new Pen();
    for (int i = 0; i < bins.size(); i++) {
      double v = value.applyAsDouble(i);
      if (!Double.isNaN(v)) {
        pen.to(time.at(bins.middleMs(i)), scale.at(v));
      } else if (isSilent(i)) {
        pen.lift();
      }
    }
    svg.path(pen.path(), style);
    return this;
  }

  /** Whether the emptiness is a silence and not only rows further apart than the stretches. */
  private boolean isSilent(int bin) {
    int empty = 0;
    for (int i = bin; i >= 0 && empty < 5 && Double.isNaN(bins.pressurePa(i)); i--) {
      empty++;
    }
    return empty >= 5;
  }

  /** Everything between the extremes of each stretch, so that no spike is lost. */
  Plot extremes(IntToDoubleFunction low, IntToDoubleFunction high, String style) {
    Pen pen = new Pen();
    for (int i = 0; i < bins.size(); i++) {
      double a = left.at(low.applyAsDouble(i));
      double b = left.at(high.applyAsDouble(i));
      if (Double.isFinite(a) && a - b > 1) {
        pen.lift();
        pen.to(time.at(bins.middleMs(i)), a);
        pen.to(time.at(bins.middleMs(i)), b);
      }
    }
    svg.path(pen.path(), style);
    return this;
  }

  /** A band between two courses on the left axis, cut off at the frame. */
  Plot band(IntToDoubleFunction low, IntToDoubleFunction high, String style) {
    StringBuilder upper = new StringBuilder();
    StringBuilder lower = new StringBuilder();
    for (int i = 0; i < bins.size(); i++) {
      double a = low.applyAsDouble(i);
      double b = high.applyAsDouble(i);
      if (Double.isNaN(a) || Double.isNaN(b)) {
        continue;
      }
      String x = Svg.number(time.at(bins.middleMs(i)));
      upper.append(upper.isEmpty() ? 'M' : 'L').append(x).append(' ').append(held(b));
      lower.insert(0, "L" + x + " " + held(a));
    }
    svg.path(upper.isEmpty() ? "" : upper.append(lower).append('Z').toString(), style);
    return this;
  }

  private String held(double value) {
    return Svg.number(Math.max(TOP, Math.min(bottom(), left.at(value))));
  }

  /** A level across the plot with its name; nothing when it lies outside. */
  Plot level(double value, String name, String style) {
    if (left.holds(value)) {
      double y = left.at(value);
      svg.line(LEFT, y, WIDTH - RIGHT, y, style);
      boolean crowded = Math.abs(y - labelEnds) < 12;
      svg.text(LEFT + (crowded ? 240 : 6), y - 3, "start", "level", name);
      labelEnds = y;
    }
    return this;
  }

  /** A marked moment, drawn down through the frame. */
  Plot moment(long ms, String name) {
    if (time.holds(ms)) {
      svg.line(time.at(ms), TOP, time.at(ms), bottom(), "moment");
      svg.text(time.at(ms) + 4, TOP + 12, "start", "level", name);
    }
    return this;
  }

  /** Events of some kinds in a lane below the frame: a bar each, numbered where there is room. */
  Plot lane(int lane, String name, List<Event> all, List<Event> shown, String style) {
    double y = bottom() + 3 + lane * LANE;
    svg.text(LEFT - 6, y + 9, "end", "tick", name);
    double taken = LEFT - 100;
    for (Event event : shown) {
      double from = Math.max(LEFT, time.at(event.time().toEpochMilli()));
      double until = Math.min(WIDTH - RIGHT, time.at(event.until().toEpochMilli()));
      svg.rectangle(from - 1, y, Math.max(2, until - from), LANE - 3, style);
      if (from - taken > 20) {
        String number = String.format(Locale.ROOT, "%d", all.indexOf(event) + 1);
        svg.text(Math.max(from, until) + 3, y + 9, "start", "number", number);
        taken = Math.max(from, until);
      }
    }
    return this;
  }

  String end() {
    return svg.end();
  }
}

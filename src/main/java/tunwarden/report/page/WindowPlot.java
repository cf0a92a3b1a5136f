package tunwarden.report.page;

import java.time.ZoneId;
import tunwarden.physics.closed.ClosedVessel;
import tunwarden.physics.closed.Inventory;
import tunwarden.report.analysis.EventWindow;
import tunwarden.units.Constants;
import tunwarden.vessel.Vessel;

/** What was seen around one event, and what a shut vessel at rest would have shown. */
final class WindowPlot {
  private static final int WIDTH = 460;
  private static final int HEIGHT = 190;
  private static final int LEFT = 48;
  private static final int TOP = 20;
  private static final int BOTTOM = HEIGHT - 24;

  private WindowPlot() {}

  static String draw(EventWindow window, Vessel vessel, ZoneId zone) {
    double[] shut = shut(window, vessel);
    double least = Double.POSITIVE_INFINITY;
    double greatest = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < shut.length; i++) {
      double bar = window.seen().get(i).paGauge() / 1e5;
      least = Math.min(least, Double.isNaN(shut[i]) ? bar : Math.min(bar, shut[i]));
      greatest = Math.max(greatest, Double.isNaN(shut[i]) ? bar : Math.max(bar, shut[i]));
    }
    if (least > greatest) {
      return "";
    }
    Svg svg = new Svg(WIDTH, HEIGHT, "Readings around the event");
    TimeScale time = new TimeScale(window.fromMs(), window.untilMs(), LEFT, WIDTH - 12, zone);
    Scale scale = Scale.over(least, greatest, BOTTOM, TOP);
    axes(svg, time, scale);
    double from = time.at(window.event().time().toEpochMilli());
    double until = time.at(window.event().until().toEpochMilli());
    svg.rectangle(from - 1, TOP, Math.max(2, until - from), BOTTOM - TOP, "band");
    Pen seen = new Pen();
    Pen model = new Pen();
    for (int i = 0; i < shut.length; i++) {
      double x = time.at(window.seen().get(i).ms());
      seen.to(x, scale.at(window.seen().get(i).paGauge() / 1e5));
      model.to(x, scale.at(shut[i]));
    }
    svg.path(model.path(), "equilibrium").path(seen.path(), "pressure");
    return svg.end();
  }

  private static void axes(Svg svg, TimeScale time, Scale scale) {
    svg.rectangle(LEFT, TOP, WIDTH - 12 - LEFT, BOTTOM - TOP, "frame");
    for (double mark : scale.marks(5)) {
      double y = scale.at(mark);
      int decimals = scale.step(5) >= 0.1 ? 1 : scale.step(5) >= 0.01 ? 2 : 3;
      svg.line(LEFT, y, WIDTH - 12, y, "grid");
      svg.text(LEFT - 5, y + 4, "end", "tick", tunwarden.units.Display.number(mark, decimals));
    }
    for (TimeScale.Mark mark : time.marks()) {
      svg.text(mark.at(), HEIGHT - 8, "middle", "tick", mark.label());
    }
    svg.text(LEFT, 13, "start", "axis", "bar gauge");
  }

  /** From the last reading before the event on: all gas kept, temperature as read; bar gauge. */
  private static double[] shut(EventWindow window, Vessel vessel) {
    double[] bar = new double[window.seen().size()];
    java.util.Arrays.fill(bar, Double.NaN);
    int start = -1;
    for (int i = 0; i < bar.length; i++) {
      boolean before = window.seen().get(i).ms() <= window.event().time().toEpochMilli();
      start = before && !Double.isNaN(window.seen().get(i).kelvin()) ? i : start;
    }
    if (start < 0) {
      return bar;
    }
    EventWindow.Seen first = window.seen().get(start);
    double ambient = vessel.site().ambientPaAbsolute();
    ClosedVessel closed =
        new ClosedVessel(
            vessel.volumeM3(), vessel.fillM3(), 4 + Constants.ZERO_CELSIUS_K, vessel.liquid());
    Inventory gas =
        closed.inventoryAt(
            first.paGauge() + ambient,
            first.kelvin(),
            vessel.gas(),
            vessel.contents().airPaAbsolute());
    for (int i = start; i < bar.length; i++) {
      double kelvin = window.seen().get(i).kelvin();
      bar[i] = (closed.settle(gas, kelvin).totalPaAbsolute() - ambient) / 1e5;
    }
    return bar;
  }
}

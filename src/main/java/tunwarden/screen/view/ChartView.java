package tunwarden.screen.view;

import java.time.Duration;
import java.time.Instant;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.LongStream;
import tunwarden.assess.History;
import tunwarden.assess.History.Trace;
import tunwarden.forecast.TrendPoint;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.ChartState;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.ReplayStatus.TimeMark;
import tunwarden.screen.model.VesselBoard;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;

/** Pressure and temperature over time, the forecast as a band, limits as lines, events as ticks. */
final class ChartView {
  private static final int LABEL_COLUMNS = 8;
  private static final double LEAST_PRESSURE_SPAN_PA = 4_000;
  private static final double LEAST_TEMPERATURE_SPAN_K = 1;

  /** A limit is drawn if the scale need grow by no more than this share to hold it. */
  private static final double LIMIT_REACH = 1.0;

  private final Canvas canvas;
  private final Look look;
  private final Board board;
  private final VesselBoard vessel;
  private final ChartState chart;
  private final ChartTime time;
  private final Area plot;
  private final History.Window window;

  private ChartView(Canvas canvas, Area area, Model model, VesselBoard vessel) {
    this.canvas = canvas;
    this.look = model.look();
    this.board = model.board();
    this.vessel = vessel;
    this.chart = model.chart();
    this.plot =
        new Area(
            area.x() + LABEL_COLUMNS,
            area.y() + 1,
            area.columns() - LABEL_COLUMNS - 1,
            area.rows() - 2);
    int dots = Raster.dotsAcross(look.glyphs());
    this.time = ChartTime.of(chart, vessel, board, plot.columns(), dots);
    this.window = vessel.history().window(time.start(), time.pastEnd(), time.pastDots());
  }

  static void draw(Canvas canvas, Area area, Model model, VesselBoard vessel) {
    if (area.rows() >= 4 && area.columns() >= 30) {
      new ChartView(canvas, area, model, vessel).draw();
    }
  }

  private void draw() {
    drawHead();
    int below = temperatureRows();
    Area upper = plot.top(plot.rows() - below);
    Display units = look.units();
    drawPressure(upper);
    if (below > 0) {
      Area lower = plot.below(plot.rows() - below);
      drawTemperature(lower, units);
    }
    drawNow();
    drawCursor();
    drawAxis();
  }

  private int temperatureRows() {
    if (plot.rows() < 5) {
      return 0;
    }
    return plot.rows() < 8 ? 2 : plot.rows() / 3;
  }

  private void drawHead() {
    int y = plot.y() - 1;
    int x = plot.x() - LABEL_COLUMNS;
    String span = Words.length(Duration.ofSeconds(chart.spanS()));
    String held = chart.heldEnd().isPresent() ? "up to " : "last ";
    String end = chart.heldEnd().map(t -> Words.dayAndMinute(t, board.zone()) + ", ").orElse("");
    String head = " " + look.units().pressure().symbol() + " g, " + held + end + span;
    x = canvas.put(x, y, head, Role.DIM);
    String read = chart.cursor().map(this::readOut).orElse("");
    if (!read.isEmpty()) {
      canvas.putRight(plot.right(), y, read, Role.STRONG);
    } else if (time.pastColumns() < time.columns()) {
      int nowX = plot.x() + time.pastColumns();
      canvas.put(Math.max(x + 2, nowX), y, "now ▸ forecast", Role.DIM);
    }
  }

  /** The values under the cursor. */
  private String readOut(Instant at) {
    long dot = time.dot(at);
    String when =
        Words.dayAndMinute(at, board.zone()).substring(6) + at.toString().substring(16, 19);
    if (dot < 0 || dot >= time.pastDots() || !window.pressure().has((int) dot)) {
      return when + "  nothing was read";
    }
    Display units = look.units();
    Trace p = window.pressure();
    int i = (int) dot;
    String text = when + "  " + units.gauge(p.last()[i]);
    String low = units.pressureNumber(p.min()[i]);
    String high = units.pressureNumber(p.max()[i]);
    if (!low.equals(high)) {
      text += " (" + low + " to " + high + ")";
    }
    Trace t = window.temperature();
    return t.has(i) ? text + "  " + units.temperature(t.last()[i]) : text;
  }

  private void drawPressure(Area area) {
    Trace trace = window.pressure();
    double least = ChartScale.least(trace);
    double most = ChartScale.most(trace);
    List<TrendPoint> trend = shownTrend();
    for (TrendPoint point : trend) {
      least = Math.min(least, point.lowPaGauge());
      most = Math.max(most, point.highPaGauge());
    }
    if (least > most) {
      canvas.put(area.x() + 1, area.y() + area.rows() / 2, "no reading in this time", Role.DIM);
      return;
    }
    Optional<ReliefSetting> relief = vessel.assessment().vessel().limits().relief();
    ChartScale scale = pressureScale(least, most, relief);
    relief.ifPresent(r -> drawLimits(area, scale, r, false));
    drawBand(area, scale, trend());
    StripChart.Pen pen = new StripChart.Pen(look.glyphs(), Role.TRACE, time.dotMs());
    Area past = area.left(time.pastColumns());
    StripChart.draw(canvas, past, trace, scale, pen, board.staleAfter());
    relief.ifPresent(r -> drawLimits(area, scale, r, true));
    Display units = look.units();
    label(area.y(), units.pressureNumber(scale.high()));
    label(area.bottom() - 1, units.pressureNumber(scale.low()));
  }

  private ChartScale pressureScale(double least, double most, Optional<ReliefSetting> relief) {
    double low = least;
    double high = most;
    if (relief.isPresent()) {
      double span = Math.max(most - least, LEAST_PRESSURE_SPAN_PA);
      double lift = relief.get().earliestLiftPaGauge();
      double set = relief.get().setPaGauge();
      if (chart.fullScale()) {
        low = Math.min(0, low);
        high = Math.max(set, high);
      } else if (lift > high && lift - high <= LIMIT_REACH * span) {
        high = lift;
      }
    }
    return ChartScale.around(low, high, LEAST_PRESSURE_SPAN_PA, look.units().pressure());
  }

  /** Lines first, under the data; their words last, over it. */
  private void drawLimits(Area area, ChartScale scale, ReliefSetting relief, boolean words) {
    drawLimit(area, scale, relief.setPaGauge(), words ? "relief set" : "");
    drawLimit(area, scale, relief.earliestLiftPaGauge(), words ? "earliest lift" : "");
  }

  private void drawLimit(Area area, ChartScale scale, double pa, String words) {
    if (!scale.holds(pa)) {
      return;
    }
    int y = area.y() + scale.row(pa, area.rows());
    if (words.isEmpty()) {
      canvas.fill(area.x(), y, area.columns(), "┄", Role.DIM);
    } else {
      String text = " " + words + " " + look.units().pressureNumber(pa) + " ";
      canvas.putRight(area.right(), y, text, Role.NORMAL);
    }
  }

  /** The forecast as far as it reaches into the chart; none while looking at the past. */
  private List<TrendPoint> shownTrend() {
    return trend().stream().filter(point -> point.at().isBefore(time.end())).toList();
  }

  private List<TrendPoint> trend() {
    boolean future = time.pastColumns() < time.columns();
    return future ? TrendLine.fromNow(vessel.assessment()) : List.of();
  }

  private void drawBand(Area area, ChartScale scale, List<TrendPoint> trend) {
    if (trend.size() < 2) {
      return;
    }
    Raster middle = new Raster(area.columns(), area.rows(), look.glyphs());
    int across = time.dotsAcross();
    int before = -1;
    for (int dot = time.pastDots(); dot < middle.width(); dot++) {
      Optional<TrendPoint> at = TrendLine.at(trend, time.at(dot));
      if (at.isEmpty()) {
        continue;
      }
      int top = scale.row(at.get().highPaGauge(), area.rows());
      int bottom = scale.row(at.get().lowPaGauge(), area.rows());
      for (int row = Math.max(0, top); row <= Math.min(area.rows() - 1, bottom); row++) {
        canvas.put(area.x() + dot / across, area.y() + row, 1, "░", Role.FORECAST);
      }
      int y = scale.row(at.get().paGauge(), middle.height());
      middle.column(dot, before < 0 ? y : before, y);
      before = y;
    }
    middle.draw(canvas, area.x(), area.y(), Role.FORECAST);
  }

  private void drawTemperature(Area area, Display units) {
    Trace trace = window.temperature();
    double least = ChartScale.least(trace);
    double most = ChartScale.most(trace);
    if (least > most) {
      return;
    }
    ChartScale scale =
        ChartScale.around(least, most, LEAST_TEMPERATURE_SPAN_K, units.temperature());
    StripChart.Pen pen = new StripChart.Pen(look.glyphs(), Role.TRACE_SECOND, time.dotMs());
    StripChart.draw(canvas, area.left(time.pastColumns()), trace, scale, pen, board.staleAfter());
    String top = units.temperature(scale.high());
    label(area.y(), top.replace(".0 ", " "));
    if (area.rows() > 1) {
      label(area.bottom() - 1, units.temperature(scale.low()).replace(".0 ", " "));
    }
  }

  private void label(int y, String text) {
    canvas.putRight(plot.x() - 1, y, text, Role.DIM);
  }

  /** The line between what was read and what is forecast. */
  private void drawNow() {
    if (time.pastColumns() == time.columns()) {
      return;
    }
    for (int y = plot.y(); y < plot.bottom(); y++) {
      int x = plot.x() + time.pastColumns();
      if (canvas.glyph(x, y).equals(" ")) {
        canvas.put(x, y, "┊", Role.DIM);
      }
    }
  }

  private void drawCursor() {
    if (chart.cursor().isEmpty()) {
      return;
    }
    long cell = time.cell(chart.cursor().get());
    if (cell < 0 || cell >= plot.columns()) {
      return;
    }
    int x = plot.x() + (int) cell;
    for (int y = plot.y(); y < plot.bottom(); y++) {
      if (canvas.glyph(x, y).equals(" ")) {
        canvas.put(x, y, "│", Role.DIM);
      } else {
        canvas.tint(x, y, 1, Role.CURSOR);
      }
    }
  }

  private void drawAxis() {
    int y = plot.bottom();
    canvas.fill(plot.x(), y, plot.columns(), "─", Role.DIM);
    if (time.pastColumns() < time.columns()) {
      canvas.put(plot.x() + time.pastColumns(), y, "┴", Role.NORMAL);
    }
    Set<Long> marked = new HashSet<>();
    for (TimeMark mark : Happenings.of(board, vessel.id())) {
      long cell = time.cell(mark.time());
      if (cell >= 0 && cell < plot.columns()) {
        canvas.put(plot.x() + (int) cell, y, 1, "▲", Role.STRONG);
        marked.add(cell);
      }
    }
    drawTicks(y, marked);
  }

  /** Times of day along the axis, where no event stands in the way. */
  private void drawTicks(int y, Set<Long> marked) {
    for (Instant tick : TimeTicks.of(time, board.zone())) {
      long cell = time.cell(tick);
      String text = "╵" + TimeTicks.text(tick, time, board.zone()) + " ";
      boolean free = LongStream.range(cell, cell + text.length()).noneMatch(marked::contains);
      if (free && cell + text.length() <= plot.columns()) {
        canvas.put(plot.x() + (int) cell, y, text, Role.DIM);
      }
    }
  }
}

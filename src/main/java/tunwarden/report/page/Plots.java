package tunwarden.report.page;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.IntToDoubleFunction;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.report.analysis.Bins;
import tunwarden.report.story.Chapter;
import tunwarden.report.story.Course;
import tunwarden.units.Constants;
import tunwarden.units.Unit;
import tunwarden.vessel.Limits;

/** The plots of one chapter. */
final class Plots {
  /** A thermometer's noise is not to fill the picture. */
  private static final double LEAST_SPAN_K = 2;

  private final Chapter chapter;
  private final Bins bins;
  private final TimeScale time;

  Plots(Chapter chapter) {
    this.chapter = chapter;
    this.bins = chapter.analysis().bins();
    this.time =
        Plot.timeScale(
            chapter.analysis().extremes().from().toEpochMilli(),
            chapter.analysis().extremes().until().toEpochMilli(),
            chapter.zone());
  }

  /** Pressure and temperature with limits, the band of rest, and the events. */
  String pressure() {
    Limits limits = chapter.analysis().vessel().limits();
    double least = Unit.BAR.fromSi(chapter.analysis().extremes().lowest().paGauge());
    double greatest = Unit.BAR.fromSi(chapter.analysis().extremes().peak().paGauge());
    double top =
        limits
            .relief()
            .map(r -> Math.max(greatest, Unit.BAR.fromSi(r.setPaGauge())))
            .orElse(greatest);
    OptionalDouble vessel = limits.vesselPaGauge();
    boolean near = vessel.isPresent() && Unit.BAR.fromSi(vessel.getAsDouble()) < 1.5 * top + 0.2;
    double highest = near ? Math.max(top, Unit.BAR.fromSi(vessel.getAsDouble())) : top;
    Plot plot =
        new Plot(
            new Plot.Shape(375, 4, "Pressure and temperature over time", "pressure, bar gauge"),
            bins,
            time,
            Math.min(0, least),
            highest);
    double coldest = chapter.analysis().signals().temperature().least();
    double warmest = chapter.analysis().signals().temperature().greatest();
    RestBand rest = new RestBand(chapter.analysis().vessel(), bins);
    plot.band(i -> rest.bar(i, low(i)), i -> rest.bar(i, high(i)), "band");
    if (coldest <= warmest) {
      double room = Math.max(0, LEAST_SPAN_K - (warmest - coldest)) / 2;
      Scale right =
          plot.rightAxis(celsius(coldest - room), celsius(warmest + room), "temperature, °C");
      plot.course(i -> celsius(bins.temperatureK(i)), right, "temperature");
    }
    plot.extremes(i -> bins.lowPa(i) / 1e5, i -> bins.highPa(i) / 1e5, "span");
    plot.course(i -> bins.pressurePa(i) / 1e5, "pressure");
    levels(plot, limits);
    lanes(plot);
    return plot.end();
  }

  private void levels(Plot plot, Limits limits) {
    plot.level(0, "atmosphere", "plain");
    limits
        .relief()
        .ifPresent(
            relief -> {
              plot.level(
                  relief.setPaGauge() / 1e5, "relief set " + bar(relief.setPaGauge()), "limit");
              plot.level(
                  relief.earliestLiftPaGauge() / 1e5,
                  "earliest conforming opening " + bar(relief.earliestLiftPaGauge()),
                  "early");
            });
    limits
        .vesselPaGauge()
        .ifPresent(pa -> plot.level(pa / 1e5, "vessel limit " + bar(pa), "limit"));
  }

  private static String bar(double pa) {
    return tunwarden.units.Display.METRIC.pressureNumber(pa);
  }

  private void lanes(Plot plot) {
    plot.lane(0, "gas out", events(), of(EventKind.VENT, EventKind.LIFT, EventKind.LEAK), "gas");
    plot.lane(1, "gas in", events(), of(EventKind.CHARGE), "gas");
    plot.lane(
        2,
        "signal",
        events(),
        of(
            EventKind.GAP,
            EventKind.FROZEN,
            EventKind.SPIKE,
            EventKind.DRIFT,
            EventKind.OVER_RELIEF,
            EventKind.UNEXPLAINED),
        "signal");
    plot.lane(3, "warming", events(), of(EventKind.WARMING, EventKind.COOLING_FAILURE), "heat");
  }

  private List<Event> events() {
    return chapter.analysis().events();
  }

  private List<Event> of(EventKind... kinds) {
    List<Event> chosen = new ArrayList<>();
    for (Event event : events()) {
      if (List.of(kinds).contains(event.kind())) {
        chosen.add(event);
      }
    }
    return chosen;
  }

  /** Dissolved gas with its band, and what the liquid would hold at rest. */
  String dissolved() {
    double least = Double.POSITIVE_INFINITY;
    double greatest = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < bins.size(); i++) {
      least = lesser(lesser(least, low(i)), bins.equilibrium(i));
      greatest = greater(greater(greatest, high(i)), bins.equilibrium(i));
    }
    if (least > greatest) {
      return "";
    }
    Plot plot =
        new Plot(
            new Plot.Shape(235, 0, "Dissolved CO2 over time", "dissolved CO2, g/L"),
            bins,
            time,
            least,
            greatest);
    plot.band(this::low, this::high, "band");
    plot.course(bins::equilibrium, "equilibrium");
    plot.course(i -> chapter.belief().dissolved(i), "dissolved");
    return plot.end();
  }

  /** The log's pressure beside what would have happened otherwise. */
  String otherwise(Course course) {
    double highest = Unit.BAR.fromSi(chapter.analysis().extremes().peak().paGauge());
    double lowest = Math.min(0, Unit.BAR.fromSi(chapter.analysis().extremes().lowest().paGauge()));
    IntToDoubleFunction other = i -> course.paGaugeAt(bins.middleMs(i)) / 1e5;
    for (int i = 0; i < bins.size(); i++) {
      highest = greater(highest, other.applyAsDouble(i));
      lowest = lesser(lowest, other.applyAsDouble(i));
    }
    Plot plot =
        new Plot(
            new Plot.Shape(300, 0, "What would have happened", "pressure, bar gauge"),
            bins,
            time,
            lowest,
            highest);
    plot.extremes(i -> bins.lowPa(i) / 1e5, i -> bins.highPa(i) / 1e5, "span");
    plot.course(i -> bins.pressurePa(i) / 1e5, "pressure");
    plot.course(other, "other");
    levels(plot, course.limits());
    plot.moment(course.fromMs(), "what-if begins");
    return plot.end();
  }

  private double low(int bin) {
    return chapter.belief().dissolved(bin) - chapter.belief().u95(bin);
  }

  private double high(int bin) {
    return chapter.belief().dissolved(bin) + chapter.belief().u95(bin);
  }

  private static double lesser(double a, double b) {
    return Double.isNaN(b) ? a : Math.min(a, b);
  }

  private static double greater(double a, double b) {
    return Double.isNaN(b) ? a : Math.max(a, b);
  }

  private static double celsius(double kelvin) {
    return kelvin - Constants.ZERO_CELSIUS_K;
  }
}

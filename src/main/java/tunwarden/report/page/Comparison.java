package tunwarden.report.page;

import java.time.Duration;
import java.util.List;
import java.util.function.Function;
import tunwarden.estimate.EventKind;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.Bins;
import tunwarden.report.story.Chapter;
import tunwarden.report.story.Telling;
import tunwarden.units.Display;

/** Several logs or vessels side by side: one table and one plot over the hours since each began. */
final class Comparison {
  private static final List<String> STYLES = List.of("pressure", "other", "temperature");
  private static final Display DISPLAY = Telling.DISPLAY;

  private final List<Chapter> chapters;
  private final Html html = new Html();

  Comparison(List<Chapter> chapters) {
    this.chapters = chapters;
  }

  String markup() {
    html.element("h2", "Side by side");
    html.open("table").open("tr").element("th", "");
    chapters.forEach(chapter -> html.element("th", chapter.title()));
    html.close("tr");
    row("from", c -> new Telling(c.zone()).at(c.analysis().extremes().from()));
    row("length", Comparison::length);
    row("highest pressure", c -> DISPLAY.gauge(c.analysis().extremes().peak().paGauge()));
    row("lowest pressure", c -> DISPLAY.gauge(c.analysis().extremes().lowest().paGauge()));
    row("least relief margin", Comparison::margin);
    row("lifts", c -> count(c, EventKind.LIFT));
    row("vents", c -> count(c, EventKind.VENT));
    row("charges", c -> count(c, EventKind.CHARGE));
    row("gas lost", c -> Telling.mass(c.analysis().gasLostKg()));
    html.close("table");
    html.open("figure").raw(plot());
    html.element("figcaption", "Pressure by the hours since each log began: " + legend() + ".");
    return html.close("figure").toString();
  }

  private void row(String name, Function<Chapter, String> value) {
    html.open("tr").element("td", name);
    chapters.forEach(chapter -> html.element("td", value.apply(chapter)));
    html.close("tr");
  }

  private static String length(Chapter chapter) {
    Analysis analysis = chapter.analysis();
    return Telling.duration(
        Duration.between(analysis.extremes().from(), analysis.extremes().until()));
  }

  private static String margin(Chapter chapter) {
    return chapter.analysis().extremes().closest() == null
        ? "no relief setting stated"
        : DISPLAY.pressureDifference(chapter.analysis().extremes().closest().marginPa());
  }

  private static String count(Chapter chapter, EventKind kind) {
    return String.valueOf(chapter.analysis().events(kind).size());
  }

  private String legend() {
    StringBuilder text = new StringBuilder();
    for (int i = 0; i < chapters.size(); i++) {
      text.append(i == 0 ? "" : ", ").append(chapters.get(i).title());
      text.append(i == 0 ? " black" : i == 1 ? " dashed blue" : " orange");
    }
    return text.toString();
  }

  private String plot() {
    double hours = 0;
    double least = 0;
    double greatest = 0;
    for (Chapter chapter : chapters) {
      Bins bins = chapter.analysis().bins();
      hours = Math.max(hours, bins.size() * bins.widthMs() / 3.6e6);
      least = Math.min(least, chapter.analysis().extremes().lowest().paGauge() / 1e5);
      greatest = Math.max(greatest, chapter.analysis().extremes().peak().paGauge() / 1e5);
    }
    Svg svg = new Svg(Plot.WIDTH, 300, "Pressures side by side");
    Scale across = new Scale(0, Math.max(hours, 1e-3), 62, Plot.WIDTH - 20);
    Scale up = Scale.over(least, greatest, 270, 24);
    svg.rectangle(62, 24, Plot.WIDTH - 82, 246, "frame");
    svg.text(62, 14, "start", "axis", "pressure, bar gauge");
    for (double mark : up.marks(6)) {
      svg.line(62, up.at(mark), Plot.WIDTH - 20, up.at(mark), "grid");
      svg.text(56, up.at(mark) + 4, "end", "tick", Display.number(mark, 2));
    }
    for (double mark : across.marks(10)) {
      svg.text(across.at(mark), 288, "middle", "tick", Display.number(mark, 1) + " h");
    }
    for (int i = 0; i < chapters.size(); i++) {
      Bins bins = chapters.get(i).analysis().bins();
      Pen pen = new Pen();
      for (int bin = 0; bin < bins.size(); bin++) {
        double pa = bins.pressurePa(bin);
        if (!Double.isNaN(pa)) {
          pen.to(across.at((bin + 0.5) * bins.widthMs() / 3.6e6), up.at(pa / 1e5));
        }
      }
      svg.path(pen.path(), STYLES.get(Math.min(i, STYLES.size() - 1)));
    }
    return svg.end();
  }
}

package tunwarden.report.page;

import java.time.Duration;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.report.analysis.EventWindow;
import tunwarden.report.story.Chapter;
import tunwarden.report.story.Hypothesis;
import tunwarden.report.story.Telling;
import tunwarden.units.Display;

/** The whole report as one page: nothing is loaded from elsewhere, nothing moves. */
public final class HtmlPage {
  /** Runs of one kind longer than this are told together. */
  private static final int LONG_RUN = 8;

  private final Html html = new Html();

  private HtmlPage() {}

  /** The page for one chapter, or for several side by side. */
  public static String of(List<Chapter> chapters) {
    HtmlPage page = new HtmlPage();
    page.head(chapters);
    if (chapters.size() > 1) {
      page.html.raw(new Comparison(chapters).markup());
    }
    for (Chapter chapter : chapters) {
      page.chapter(chapter, chapters.size() > 1);
    }
    page.html.raw("</body>\n</html>\n");
    return page.html.toString();
  }

  private void head(List<Chapter> chapters) {
    String title = String.join(" and ", chapters.stream().map(Chapter::title).toList());
    html.raw("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n");
    html.element("title", "Pressure report: " + title);
    html.raw("<style>\n" + Style.SHEET + "</style>\n</head>\n<body>\n");
    html.element("h1", "Pressure report: " + title);
  }

  private void chapter(Chapter chapter, boolean several) {
    Telling telling = new Telling(chapter.zone());
    if (several) {
      html.element("h1", "chapter", chapter.title());
    }
    html.element("p", "from", times(chapter));
    html.open("div", "lead");
    chapter.story().summary().forEach(text -> html.element("p", text));
    html.close("div");
    cautions(chapter);
    plots(chapter);
    timeline(chapter, telling);
    evidence(chapter, telling);
    causes(chapter);
    section("Instruments", chapter.story().sensors());
    section("How close, and what next", chapter.story().outlook());
    section("Assumed, and not known", chapter.story().unknowns());
    section("About reading the log", chapter.notes());
    origin(chapter);
  }

  private static String times(Chapter chapter) {
    boolean utc = chapter.zone().normalized().equals(ZoneOffset.UTC);
    return utc
        ? "Times are UTC."
        : "Times are of the log's own zone, " + chapter.zone() + "; the timeline gives UTC beside.";
  }

  private void cautions(Chapter chapter) {
    html.open("div", "caution").element("h3", "Before acting on this");
    html.list(chapter.story().cautions()).close("div");
  }

  private void plots(Chapter chapter) {
    Plots plots = new Plots(chapter);
    html.element("h2", "Pressure and temperature");
    figure(
        plots.pressure(),
        "Black: pressure as read. Orange: temperature (right). Blue band: the pressure at which the"
            + " liquid's gas would come to rest, 95 %. Bars below: events, numbered as in the"
            + " timeline.");
    String dissolved = plots.dissolved();
    if (!dissolved.isEmpty()) {
      html.element("h2", "Dissolved gas");
      figure(
          dissolved,
          "Blue: CO2 the liquid holds, with its 95 % band. Dashed: what it would hold at rest with"
              + " the present headspace."
              + (chapter.belief().smoother().isPresent()
                  ? " The whole log was used, also what came later."
                  : ""));
    }
    chapter
        .otherwise()
        .ifPresent(
            course -> {
              html.element("h2", "What if: " + course.words());
              figure(
                  plots.otherwise(course),
                  "Black: pressure as read. Dashed: what would have happened.");
              html.list(course.sentences());
            });
  }

  private void figure(String svg, String caption) {
    html.open("figure").raw(svg).element("figcaption", caption).close("figure");
  }

  private void timeline(Chapter chapter, Telling telling) {
    List<Event> events = chapter.analysis().events();
    html.element("h2", "Timeline");
    if (events.isEmpty()) {
      html.element("p", "No event was found.");
      return;
    }
    boolean utc = chapter.zone().normalized().equals(ZoneOffset.UTC);
    html.raw("<table>\n<tr><th class=\"n\">no.</th><th>from</th>");
    html.raw(utc ? "" : "<th>UTC</th>");
    html.raw("<th>lasted</th><th>what</th><th class=\"n\">bar g</th>");
    html.raw("<th class=\"n\">gas out</th><th class=\"n\">sure</th></tr>\n");
    for (int i = 0; i < events.size(); i++) {
      int run = run(events, i);
      if (run > LONG_RUN) {
        timelineRow(i, events.get(i), telling, utc);
        summaryRow(events.subList(i + 1, i + run - 1), i + 2);
        i += run - 1;
      }
      timelineRow(i, events.get(i), telling, utc);
    }
    html.close("table");
  }

  /** How many events of one kind follow each other from here on. */
  private static int run(List<Event> events, int from) {
    int end = from;
    while (end < events.size() && events.get(end).kind() == events.get(from).kind()) {
      end++;
    }
    return end - from;
  }

  private void timelineRow(int index, Event event, Telling telling, boolean utc) {
    html.open("tr").element("td", "n", String.valueOf(index + 1));
    html.element("td", "t", telling.at(event.time()));
    if (!utc) {
      html.element("td", "t", new Telling(ZoneOffset.UTC).at(event.time()));
    }
    html.element("td", "t", lasted(event));
    html.element("td", what(event));
    html.element("td", "n", pressures(event));
    html.element("td", "n", event.gasKg() == 0 ? "" : Telling.mass(event.gasKg()));
    html.element("td", "n", String.format(Locale.ROOT, "%.0f %%", 100 * event.confidence()));
    html.close("tr");
  }

  /** Many events of one kind in a row, told together; the JSON report lists each. */
  private void summaryRow(List<Event> same, int firstNumber) {
    double gasKg = same.stream().mapToDouble(Event::gasKg).sum();
    Duration span = Duration.between(same.get(0).time(), same.get(same.size() - 1).time());
    String text =
        same.size()
            + " more of the kind "
            + same.get(0).kind().word()
            + " (no. "
            + firstNumber
            + " to "
            + (firstNumber + same.size() - 1)
            + "), one every "
            + Telling.duration(span.dividedBy(Math.max(1, same.size() - 1)))
            + " on average"
            + (gasKg == 0 ? "" : ", " + Telling.mass(gasKg) + " of gas together");
    html.raw("<tr><td></td><td colspan=\"7\">" + Svg.escape(text) + "</td></tr>\n");
  }

  private static String lasted(Event event) {
    Duration duration = Duration.between(event.time(), event.until());
    return duration.isZero() ? "" : Telling.duration(duration);
  }

  private static String what(Event event) {
    return event.kind() == EventKind.MARK ? event.why() : event.kind().word();
  }

  private static String pressures(Event event) {
    if (Double.isNaN(event.fromPaGauge())) {
      return "";
    }
    Display display = Telling.DISPLAY;
    return display.pressureNumber(event.fromPaGauge())
        + " → "
        + display.pressureNumber(event.toPaGauge());
  }

  private void evidence(Chapter chapter, Telling telling) {
    if (chapter.windows().isEmpty()) {
      return;
    }
    html.element("h2", "Evidence, event by event");
    html.element(
        "p",
        "Black: what was read. Dashed: what a shut vessel at rest would have shown from the last"
            + " reading before the event on, at the temperatures read. Shaded: the event.");
    html.open("div", "columns");
    List<Event> all = chapter.analysis().events();
    for (EventWindow window : chapter.windows()) {
      Event event = window.event();
      html.open("div", "piece");
      html.element(
          "h3",
          (all.indexOf(event) + 1) + ". " + event.kind().word() + ", " + telling.at(event.time()));
      html.raw(WindowPlot.draw(window, chapter.analysis().vessel(), chapter.zone()));
      html.element("figcaption", event.why());
      html.close("div");
    }
    html.close("div");
  }

  private void causes(Chapter chapter) {
    html.element("h2", "What may have driven it");
    html.raw("<table>\n<tr><th>cause</th><th>stands</th><th>for</th><th>against</th></tr>\n");
    for (Hypothesis hypothesis : chapter.story().hypotheses()) {
      html.open("tr").element("td", hypothesis.cause()).element("td", hypothesis.standing());
      html.element("td", String.join("; ", hypothesis.evidenceFor()));
      html.element("td", String.join("; ", hypothesis.evidenceAgainst()));
      html.close("tr");
    }
    html.close("table");
  }

  private void section(String title, List<String> sentences) {
    if (!sentences.isEmpty()) {
      html.element("h2", title).list(sentences);
    }
  }

  private void origin(Chapter chapter) {
    html.element("h2", "How to make this again");
    html.open("p").element("code", chapter.command()).close("p");
    List<String> inputs = new ArrayList<>();
    chapter.inputs().forEach(i -> inputs.add(i.name() + "  SHA-256 " + i.sha256()));
    html.open("ul");
    inputs.forEach(text -> html.open("li").element("code", text).close("li"));
    html.close("ul");
    html.element("p", "from", "Made by " + chapter.program() + ".");
  }
}

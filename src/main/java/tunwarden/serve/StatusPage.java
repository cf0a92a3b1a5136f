package tunwarden.serve;

import java.time.Duration;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmBook;
import tunwarden.assess.Assessment;
import tunwarden.assess.Margins;
import tunwarden.assess.Observed;
import tunwarden.estimate.Estimate;
import tunwarden.forecast.TimeRange;
import tunwarden.units.Display;

/**
 * The page a person opens on a phone: plain HTML that refreshes itself, no script. Greys for what
 * is normal; a colour only where a person is needed, and always with a word beside it.
 */
final class StatusPage {
  private static final String STYLE =
      """
      :root{color-scheme:light dark;--ink:#222;--soft:#5c5c5c;--line:#b8b8b8;--paper:#f4f4f2;--card:#fff}
      @media(prefers-color-scheme:dark){:root{--ink:#e6e6e4;--soft:#a6a6a4;--line:#555;--paper:#181818;--card:#222}}
      *{box-sizing:border-box}body{margin:0;padding:.7rem;background:var(--paper);color:var(--ink);
      font:16px/1.4 system-ui,sans-serif}header,footer{max-width:76rem;margin:auto;color:var(--soft);font-size:.9rem}
      h1{font-size:1.1rem;margin:.2rem 0;color:var(--ink)}h2{font-size:1.05rem;margin:0}
      main{max-width:76rem;margin:.6rem auto;display:grid;gap:.7rem;grid-template-columns:repeat(auto-fill,minmax(min(100%,21rem),1fr))}
      section{background:var(--card);border:1px solid var(--line);border-radius:.4rem;padding:.7rem}
      .big{font-size:1.5rem;font-variant-numeric:tabular-nums}.soft{color:var(--soft);font-size:.9rem}
      dl{display:grid;grid-template-columns:auto 1fr;gap:.1rem .8rem;margin:.4rem 0}dt{color:var(--soft)}dd{margin:0;text-align:right}
      svg.ladder{width:100%;max-width:26rem;height:auto;font:15px system-ui,sans-serif}
      svg text{fill:var(--soft)}svg .end{text-anchor:end}svg line,svg polyline{stroke:var(--line);fill:none;stroke-width:1.5}
      svg text.limit{fill:var(--ink)}svg text.now{fill:var(--ink);font-weight:700}svg polyline.now{stroke:var(--ink);stroke-width:3}
      svg polyline.forecast{stroke-dasharray:3 3}
      .alarm{border-left:.4rem solid var(--line);padding:.3rem .6rem;margin:.4rem 0}
      .alarm b{text-transform:uppercase;font-size:.8rem;letter-spacing:.04em}
      .high.open{border-color:#c00;background:#c0000022}.warning.open{border-color:#b26b00;background:#e08a0022}
      .caution.open{border-color:#8a7a00;background:#c8b40022}
      """;

  private static final int REFRESH_S = 10;

  private StatusPage() {}

  static String of(Served served) {
    AlarmBook book = served.book().get();
    Display display = book.settings().display();
    StringBuilder page = new StringBuilder(8192);
    page.append("<!doctype html><html lang=\"en\"><head><meta charset=\"utf-8\">")
        .append("<meta name=\"viewport\" content=\"width=device-width,initial-scale=1\">")
        .append("<meta http-equiv=\"refresh\" content=\"" + REFRESH_S + "\">")
        .append("<title>")
        .append(title(book))
        .append("</title><style>")
        .append(STYLE)
        .append("</style></head><body><header><h1>")
        .append(title(book))
        .append("</h1>as of ")
        .append(time(served.clock().instant().toString()))
        .append(", refreshes every " + REFRESH_S + " s</header>");
    ailments(page, served.ailments().get());
    if (book.counts().flood()) {
      page.append("<div class=\"alarm caution open\"><b>flood</b> ")
          .append(
              "Alarms come faster than a person can follow; begin with the first vessel.</div>");
    }
    alarms(page, book.alarms(AlarmBook.STATION));
    page.append("<main>");
    served.state().assessments().stream()
        .sorted(Comparator.comparingDouble(StatusPage::shareLeft))
        .forEach(assessment -> vessel(page, assessment, book, display));
    page.append("</main><footer>");
    switchedOff(page, book);
    page.append("Advice beside the instruments, never a safety function. ")
        .append("Before going in to a vessel that vents: measure the CO2 in the room.</footer>")
        .append("</body></html>");
    return page.toString();
  }

  private static void switchedOff(StringBuilder page, AlarmBook book) {
    book.settings()
        .manner()
        .switchedOff()
        .forEach(
            (kind, why) ->
                page.append("Never raised here: ")
                    .append(Html.escape(kind.word()))
                    .append(" (")
                    .append(Html.escape(why))
                    .append("). "));
  }

  private static String title(AlarmBook book) {
    long open = book.alarms().stream().filter(a -> a.state().wantsAcknowledging()).count();
    return open == 0 ? "Tunwarden" : "(" + open + " to see) Tunwarden";
  }

  /** Closest to its relief setting first; those without a margin last. */
  private static double shareLeft(Assessment assessment) {
    return assessment.margins().map(Margins::shareOfSet).orElse(Double.MAX_VALUE);
  }

  private static void vessel(
      StringBuilder page, Assessment assessment, AlarmBook book, Display display) {
    String id = assessment.vessel().id();
    page.append("<section><h2>").append(Html.escape(id));
    if (!assessment.vessel().title().isEmpty()) {
      page.append(" <span class=\"soft\">")
          .append(Html.escape(assessment.vessel().title()))
          .append("</span>");
    }
    page.append("</h2>");
    alarms(page, book.alarms(id));
    page.append("<div class=\"big\">")
        .append(value(assessment.pressure(), display::gauge))
        .append(" &nbsp; ")
        .append(value(assessment.temperature(), display::temperature))
        .append("</div><div class=\"soft\">")
        .append(Html.escape(quality(assessment.pressure())))
        .append("</div>")
        .append(LadderSvg.of(assessment.ladder(), display));
    figures(page, assessment, display);
    page.append("</section>");
  }

  private static void figures(StringBuilder page, Assessment assessment, Display display) {
    page.append("<dl>");
    Optional<Margins> margins = assessment.margins();
    margins.ifPresent(m -> row(page, "relief margin", margin(m, display)));
    if (margins.isPresent()) {
      row(page, "may lift", lifts(assessment));
    }
    assessment.estimate().ifPresent(estimate -> row(page, "dissolved", gas(estimate, display)));
    assessment.estimate().ifPresent(estimate -> row(page, "headspace", estimate.mode().word()));
    page.append("</dl>");
    for (String note : assessment.notes()) {
      page.append("<div class=\"soft\">").append(Html.escape(note)).append("</div>");
    }
  }

  private static String margin(Margins margins, Display display) {
    return display.pressureDifference(margins.reliefPa())
        + ", "
        + Display.number(100 * margins.shareOfSet(), 0)
        + " % of set";
  }

  private static String gas(Estimate estimate, Display display) {
    return display.gasContentNumber(estimate.dissolvedKgPerM3())
        + " \u00b1 "
        + display.gasContent(estimate.dissolvedU95KgPerM3());
  }

  private static String lifts(Assessment assessment) {
    Optional<TimeRange> range = assessment.outlook().timeToLift();
    if (range.isPresent()) {
      return "in " + hours(range.get().middle()) + " at this trend";
    }
    long horizon = assessment.outlook().horizon().toHours();
    return horizon == 0 ? "not known" : "not within " + horizon + " h at this trend";
  }

  private static String hours(Duration duration) {
    return duration.toHours() + " h " + duration.toMinutesPart() + " min";
  }

  private static void row(StringBuilder page, String name, String value) {
    page.append("<dt>").append(name).append("</dt><dd>").append(Html.escape(value)).append("</dd>");
  }

  private static void ailments(StringBuilder page, List<String> ailments) {
    for (String ailment : ailments) {
      page.append("<div class=\"alarm caution open\"><b>program</b> ")
          .append(Html.escape(ailment))
          .append("</div>");
    }
  }

  private static void alarms(StringBuilder page, List<Alarm> alarms) {
    for (Alarm alarm : alarms) {
      String open = alarm.state().wantsAcknowledging() ? " open" : "";
      page.append("<div class=\"alarm ")
          .append(alarm.priority().word())
          .append(open)
          .append("\"><b>")
          .append(alarm.priority().word())
          .append(": ")
          .append(Html.escape(alarm.kind().word()))
          .append(alarm.chattering() ? ", chattering" : "")
          .append("</b> <span class=\"soft\">")
          .append(Html.escape(alarm.state().word()))
          .append(alarm.shelvedUntil().map(end -> " until " + time(end.toString())).orElse(""))
          .append(", since ")
          .append(time(alarm.since().toString()))
          .append(alarm.remark().isEmpty() ? "" : ", said: " + Html.escape(alarm.remark()))
          .append("</span><br>")
          .append(Html.escape(alarm.text()))
          .append("<br><span class=\"soft\">")
          .append(Html.escape(alarm.action()))
          .append("</span></div>");
    }
  }

  private interface Printer {
    String print(double si);
  }

  private static String value(Observed observed, Printer printer) {
    if (observed.value().isEmpty()) {
      return "no reading";
    }
    String text = printer.print(observed.value().getAsDouble());
    return Html.escape(observed.isUsable() ? text : "(" + text + ")");
  }

  private static String quality(Observed observed) {
    String age = observed.at().isPresent() ? ", " + observed.age().toSeconds() + " s old" : "";
    return "pressure: " + observed.quality().why() + age;
  }

  private static String time(String instant) {
    return instant.substring(0, Math.min(19, instant.length())).replace('T', ' ') + " UTC";
  }
}

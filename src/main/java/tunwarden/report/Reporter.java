package tunwarden.report;

import java.io.IOException;
import java.time.Duration;
import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import java.util.function.LongConsumer;
import tunwarden.estimate.Estimator;
import tunwarden.forecast.Forecaster;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Present;
import tunwarden.replay.BadLogException;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogRow;
import tunwarden.replay.ReadAhead;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.Analyst;
import tunwarden.report.analysis.ReportRow;
import tunwarden.report.analysis.RowSpool;
import tunwarden.report.analysis.Sifted;
import tunwarden.report.hindsight.OtherRoom;
import tunwarden.report.hindsight.Smoother;
import tunwarden.report.otherwise.Rerun;
import tunwarden.report.otherwise.WhatIf;
import tunwarden.report.page.HtmlPage;
import tunwarden.report.story.Belief;
import tunwarden.report.story.Chapter;
import tunwarden.report.story.Course;
import tunwarden.report.story.Story;
import tunwarden.vessel.Vessel;

/** Makes reports out of logs. Memory does not grow with the length of a log. */
public final class Reporter {
  private final Estimator estimator;
  private final Settings settings;

  /**
   * How a report is made.
   *
   * @param causal whether only what came before counts, not what came later
   * @param every least time between two lines of the series; zero for every row
   * @param whatIf what is to be tried, if anything
   * @param zone the zone to tell times in, if stated
   * @param command the command line, to be quoted in the report
   * @param program name and version, to be quoted in the report
   * @param page whether the report becomes a page, which shows the readings around events
   */
  public record Settings(
      boolean causal,
      Duration every,
      Optional<WhatIf> whatIf,
      Optional<ZoneId> zone,
      String command,
      String program,
      boolean page) {}

  /**
   * What a report is made from.
   *
   * @param title what it is called
   * @param vessel its description; its id is the one the rows name
   * @param logs one or several, put in order of time
   */
  public record Source(String title, Vessel vessel, List<LogFile> logs) {}

  public Reporter(Estimator estimator, Settings settings) {
    this.estimator = estimator;
    this.settings = settings;
  }

  /**
   * Reads one vessel's logs.
   *
   * @param series takes the series, if wanted
   * @param rowsDone told how many rows have been read
   * @throws BadLogException when a log is no log or speaks of other vessels only
   */
  public Chapter read(Source source, Optional<Appendable> series, LongConsumer rowsDone)
      throws IOException {
    Analyst analyst = new Analyst(source.vessel(), estimator);
    Spacing spacing = new Spacing(settings.every());
    try (VesselRows rows = new VesselRows(source.logs(), source.vessel().id(), true);
        ReadAhead<Sifted> sifted = new ReadAhead<>(() -> sift(analyst, rows.next()));
        RowSpool spool = new RowSpool()) {
      for (Sifted row = sifted.next(); row != null; row = sifted.next()) {
        ReportRow known = analyst.take(row);
        if (series.isPresent() && spacing.isDue(known.time())) {
          spool.add(known);
        }
        rowsDone.accept(analyst.rows());
      }
      rows.requireRows(analyst.rows());
      Analysis analysis = analyst.finish();
      requirePressure(source, analysis);
      Belief belief = new Belief(analysis.bins(), smoother(analysis));
      if (series.isPresent()) {
        writeSeries(series.get(), spool, analysis, belief);
      }
      ZoneId zone = settings.zone().orElse(rows.zone());
      Chapter.Origin origin =
          new Chapter.Origin(rows.inputs(), rows.notes(), settings.command(), settings.program());
      return chapter(source, analysis, belief, zone, origin);
    }
  }

  private static Sifted sift(Analyst analyst, LogRow row) {
    return row == null ? null : analyst.sifter().sift(row);
  }

  private static void requirePressure(Source source, Analysis analysis) {
    if (analysis.extremes().isEmpty()) {
      throw new BadLogException(
          source.logs().get(0).path().toString(),
          0,
          "pressure",
          "no row holds a pressure that can be used");
    }
  }

  private Optional<Smoother> smoother(Analysis analysis) {
    return settings.causal() ? Optional.empty() : Smoother.over(analysis);
  }

  private void writeSeries(Appendable out, RowSpool spool, Analysis analysis, Belief belief)
      throws IOException {
    SeriesWriter writer = new SeriesWriter(out, analysis.events());
    spool.replay(row -> writer.write(belief.smoother().map(s -> s.smooth(row)).orElse(row)));
  }

  private Chapter chapter(
      Source source, Analysis analysis, Belief belief, ZoneId zone, Chapter.Origin origin)
      throws IOException {
    Optional<Course> otherwise =
        settings.whatIf().map(whatIf -> Rerun.of(analysis, belief, whatIf, zone));
    return new Chapter(
        source.title(),
        analysis,
        Story.of(analysis, outlook(analysis), OtherRoom.share(analysis), zone),
        belief,
        settings.page() ? CloserLook.at(source, analysis) : List.of(),
        otherwise,
        zone,
        origin);
  }

  private static Outlook outlook(Analysis analysis) {
    return analysis
        .state()
        .estimate()
        .map(estimate -> Forecaster.outlook(Present.of(analysis.vessel(), estimate)))
        .orElse(Outlook.NONE);
  }

  /** The report as JSON. */
  public static String json(List<Chapter> chapters) {
    return JsonReport.text(chapters);
  }

  /** The report as one HTML page. */
  public static String html(List<Chapter> chapters) {
    return HtmlPage.of(chapters);
  }
}

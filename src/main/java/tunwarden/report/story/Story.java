package tunwarden.report.story;

import java.time.ZoneId;
import java.util.List;
import java.util.OptionalDouble;
import tunwarden.forecast.Outlook;
import tunwarden.report.analysis.Analysis;

/**
 * A log told in sentences.
 *
 * @param summary what happened, when and how sure
 * @param hypotheses what may have driven it
 * @param sensors whether the instruments can be believed
 * @param outlook how close it came and what would have come next
 * @param unknowns what was assumed and what cannot be known
 * @param cautions what to mind before acting
 */
public record Story(
    List<String> summary,
    List<Hypothesis> hypotheses,
    List<String> sensors,
    List<String> outlook,
    List<String> unknowns,
    List<String> cautions) {

  /**
   * Tells a log.
   *
   * @param analysis what the log says
   * @param next the futures as of its last row
   * @param otherRoom headspace over the stated one that would explain the log far better, if any
   * @param zone the zone times are told in
   */
  public static Story of(Analysis analysis, Outlook next, OptionalDouble otherRoom, ZoneId zone) {
    Telling telling = new Telling(zone);
    return new Story(
        new SummaryWords(analysis, otherRoom, telling).sentences(),
        Causes.of(analysis, otherRoom, telling),
        new SensorWords(analysis, telling).sentences(),
        NextWords.of(analysis, next, telling),
        Unknowns.of(analysis),
        Unknowns.cautions(analysis, next));
  }
}

package tunwarden.report.story;

import java.util.ArrayList;
import java.util.List;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Projection;
import tunwarden.forecast.TimeRange;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.ReportRow;
import tunwarden.units.Display;

/** How close it came, and what would have come after the last row. */
final class NextWords {
  private static final Display DISPLAY = Telling.DISPLAY;

  private NextWords() {}

  static List<String> of(Analysis analysis, Outlook next, Telling telling) {
    List<String> sentences = new ArrayList<>();
    ReportRow closest = analysis.extremes().closest();
    if (closest != null) {
      sentences.add(
          "The reading with the gauge's uncertainty came closest to the relief valve's earliest"
              + " conforming opening at "
              + telling.at(closest.time())
              + ": "
              + DISPLAY.pressureDifference(Math.abs(closest.marginPa()))
              + (closest.marginPa() < 0 ? " above it." : " below it."));
    }
    if (next == Outlook.NONE) {
      sentences.add("The last rows do not allow a forecast.");
      return sentences;
    }
    if (closest != null) {
      sentences.add(next.timeToLift().map(NextWords::toLift).orElse(notWithin(next)));
    }
    for (Projection projection : next.projections()) {
      sentences.add(
          after(projection.words())
              + ": "
              + DISPLAY.gauge(projection.paGauge())
              + " ("
              + DISPLAY.pressureNumber(projection.lowPaGauge())
              + " to "
              + DISPLAY.pressureNumber(projection.highPaGauge())
              + ").");
    }
    next.liftTemperatureK()
        .ifPresent(
            k ->
                sentences.add(
                    "Shut and at rest, the valve may open from "
                        + DISPLAY.temperature(k)
                        + " on."));
    return sentences;
  }

  /** Whether the future is one of waiting or of doing something. */
  private static String after(String words) {
    return words.startsWith("in ")
        ? "Had it been left alone after the last row, " + words
        : "Had it been " + words.replace(", shut", " and shut") + " after the last row";
  }

  private static String toLift(TimeRange range) {
    if (range.middle().toSeconds() < 60) {
      return "At the trend of the last rows the valve could open at any moment.";
    }
    return "At the trend of the last rows the valve could open after "
        + Telling.duration(range.middle())
        + " (from "
        + Telling.duration(range.low())
        + range.high().map(high -> " to " + Telling.duration(high)).orElse(", or later")
        + ").";
  }

  private static String notWithin(Outlook next) {
    return "At the trend of the last rows the valve would not open within "
        + Telling.duration(next.horizon())
        + ".";
  }
}

package tunwarden.report.analysis;

import java.time.Instant;

/** First, last, highest, lowest and closest rows of a log. Fed row by row. */
public final class Extremes {
  private ReportRow first;
  private ReportRow last;
  private ReportRow peak;
  private ReportRow lowest;
  private ReportRow closest;
  private Instant from;
  private Instant until;

  void take(ReportRow row) {
    from = from == null ? row.time() : from;
    until = row.time();
    if (Double.isNaN(row.paGauge()) || row.quality().isBad()) {
      return;
    }
    first = first == null || Double.isNaN(first.temperatureK()) ? row : first;
    last = row;
    peak = peak == null || row.paGauge() > peak.paGauge() ? row : peak;
    lowest = lowest == null || row.paGauge() < lowest.paGauge() ? row : lowest;
    boolean closer = closest == null || row.marginPa() < closest.marginPa();
    closest = !Double.isNaN(row.marginPa()) && closer ? row : closest;
  }

  /** Whether any pressure could be used. */
  public boolean isEmpty() {
    return peak == null;
  }

  /** Time of the first row. */
  public Instant from() {
    return from;
  }

  /** Time of the last row. */
  public Instant until() {
    return until;
  }

  /** First row with a usable pressure. */
  public ReportRow first() {
    return first;
  }

  /** Last row with a usable pressure. */
  public ReportRow last() {
    return last;
  }

  /** Row with the highest usable pressure. */
  public ReportRow peak() {
    return peak;
  }

  /** Row with the lowest usable pressure. */
  public ReportRow lowest() {
    return lowest;
  }

  /** Row with the least relief margin; null without a relief setting. */
  public ReportRow closest() {
    return closest;
  }
}

package tunwarden.screen.view;

import java.time.Duration;
import java.time.Instant;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.ChartState;
import tunwarden.screen.model.VesselBoard;

/**
 * The time scale of a chart: so many columns of past, then, while following the present, some of
 * future on the same scale. Edges move by whole dots, so that a still line is not sent again.
 *
 * @param start left edge
 * @param pastColumns cells up to the end of the past
 * @param columns all cells
 * @param dotMs time of one dot, ms
 * @param dotsAcross dots to the cell
 */
record ChartTime(Instant start, int pastColumns, int columns, long dotMs, int dotsAcross) {
  private static final int FUTURE_PART = 4;

  static ChartTime of(ChartState chart, VesselBoard vessel, Board board, int columns, int dots) {
    boolean future = chart.heldEnd().isEmpty() && !vessel.assessment().outlook().trend().isEmpty();
    int ahead = future ? columns / FUTURE_PART : 0;
    int past = columns - ahead;
    long dotMs = Math.max(1, chart.spanS() * 1000 / ((long) past * dots));
    long endMs = Math.floorDiv(chart.end(board.now()).toEpochMilli(), dotMs) * dotMs + dotMs;
    Instant start = Instant.ofEpochMilli(endMs - dotMs * past * dots);
    return new ChartTime(start, past, columns, dotMs, dots);
  }

  /** End of the past shown. */
  Instant pastEnd() {
    return start.plusMillis(dotMs * pastColumns * dotsAcross);
  }

  /** Right edge. */
  Instant end() {
    return start.plusMillis(dotMs * columns * dotsAcross);
  }

  int pastDots() {
    return pastColumns * dotsAcross;
  }

  /** Time at the middle of a dot. */
  Instant at(int dot) {
    return start.plusMillis(dotMs * dot + dotMs / 2);
  }

  /** Dot of a time; may lie outside. */
  long dot(Instant time) {
    return Math.floorDiv(Duration.between(start, time).toMillis(), dotMs);
  }

  /** Cell of a time; may lie outside. */
  long cell(Instant time) {
    return Math.floorDiv(dot(time), dotsAcross);
  }
}

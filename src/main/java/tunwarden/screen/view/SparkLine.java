package tunwarden.screen.view;

import java.time.Instant;
import tunwarden.assess.History.Trace;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.VesselBoard;

/** The pressure of the last day in one row, scaled to itself; the greatest value of each column. */
final class SparkLine {
  private static final String[] EIGHTHS = {"▁", "▂", "▃", "▄", "▅", "▆", "▇", "█"};
  private static final long DAY_MS = 86_400_000;
  private static final double LEAST_SPAN_PA = 10_000;

  private SparkLine() {}

  static void draw(Canvas canvas, int x, int y, int columns, VesselBoard vessel, Board board) {
    long step = DAY_MS / columns;
    Instant end =
        Instant.ofEpochMilli(Math.floorDiv(board.now().toEpochMilli(), step) * step + step);
    Trace trace = vessel.history().window(end.minusMillis(step * columns), end, columns).pressure();
    double least = ChartScale.least(trace);
    double most = Math.max(ChartScale.most(trace), least + LEAST_SPAN_PA);
    for (int i = 0; i < columns; i++) {
      if (trace.has(i)) {
        int eighth = (int) Math.round(7 * (trace.max()[i] - least) / (most - least));
        canvas.put(x + i, y, 1, EIGHTHS[Math.max(0, Math.min(7, eighth))], Role.DIM);
      }
    }
  }
}

package tunwarden.report.find;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** The longest stretches in which the pressure signal showed exactly the same value. */
final class StillTracker {
  private static final int KEPT = 24;
  private static final long AWAKE_MS = 60_000;

  /**
   * One stretch.
   *
   * @param fromMs first row with the value
   * @param untilMs last row with it
   * @param paGauge the value
   * @param afterPa the value that followed; NaN at the end of the log
   * @param fromK temperature at its start, K
   * @param untilK at its end
   */
  record Stretch(
      long fromMs, long untilMs, double paGauge, double afterPa, double fromK, double untilK) {
    double seconds() {
      return (untilMs - fromMs) / 1000.0;
    }

    /** A signal that wakes up jumps to where the pressure has gone meanwhile: no gas moved. */
    boolean explains(Movement movement) {
      return movement.fromMs() >= fromMs && movement.fromMs() <= untilMs + AWAKE_MS;
    }
  }

  private final List<Stretch> longest = new ArrayList<>();
  private long leastMs = -1; // what is no longer than this cannot be among the longest
  private Point first;
  private Point last;

  void add(Point point) {
    if (first != null && point.paGauge() != first.paGauge()) {
      close(point.paGauge());
      first = null;
    }
    first = first == null ? point : first;
    last = point;
  }

  void finish() {
    if (first != null) {
      close(Double.NaN);
    }
  }

  private void close(double after) {
    if (last.ms() - first.ms() <= leastMs) {
      return;
    }
    longest.add(
        new Stretch(first.ms(), last.ms(), first.paGauge(), after, first.kelvin(), last.kelvin()));
    if (longest.size() > 2 * KEPT) {
      trim();
    }
  }

  private void trim() {
    longest.sort(Comparator.comparingDouble(Stretch::seconds).reversed());
    longest.subList(KEPT, longest.size()).clear();
    Stretch shortest = longest.get(KEPT - 1);
    leastMs = shortest.untilMs() - shortest.fromMs();
  }

  /** The longest first. */
  List<Stretch> longest() {
    longest.sort(Comparator.comparingDouble(Stretch::seconds).reversed());
    return longest;
  }
}

package tunwarden.report.find;

import java.util.ArrayList;
import java.util.List;

/** Stretches in which the pressure stood above a level for more than a moment. */
final class OverTracker {
  private static final long LEAST_MS = 60_000;

  private final double levelPa;
  private final List<Movement> stretches = new ArrayList<>();
  private Point first;
  private Point top;
  private Point last;

  OverTracker(double levelPa) {
    this.levelPa = levelPa;
  }

  void add(Point point) {
    if (point.paGauge() > levelPa) {
      first = first == null ? point : first;
      top = top == null || point.paGauge() > top.paGauge() ? point : top;
      last = point;
    } else {
      finish();
    }
  }

  void finish() {
    if (first != null && last.ms() - first.ms() >= LEAST_MS) {
      stretches.add(new Movement(first.ms(), last.ms(), levelPa, top.paGauge(), last.kelvin(), 1));
    }
    first = null;
    top = null;
  }

  List<Movement> stretches() {
    return stretches;
  }
}

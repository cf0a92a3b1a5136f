package tunwarden.forecast;

import java.time.Duration;
import java.util.List;
import tunwarden.estimate.ForwardPoint;

/**
 * What is made of a gauge that rises faster than the upper edge of the forward run: the model has
 * missed something, most likely gas being made, and then the readings count. The median follows the
 * rise itself, the band spans half to half as much again of it, and the model's own band is kept
 * where it is wider.
 */
final class Contradiction {
  private static final Duration SOON = Duration.ofHours(2);
  private static final double LEAST_PA_PER_S = 500.0 / 3600;
  private static final double SLOWER = 0.5;
  private static final double FASTER = 1.5;

  private Contradiction() {}

  /** Whether the readings rise as the run does not allow for. */
  static boolean isThere(List<ForwardPoint> run, double paPerS) {
    int soon = (int) Math.min(run.size() - 1, SOON.toSeconds() / Trend.STEP.toSeconds());
    double line = run.get(0).paGauge() + paPerS * run.get(soon).after().toSeconds();
    return paPerS > LEAST_PA_PER_S && line > run.get(soon).highPaGauge();
  }

  /** The run with the rise put in. */
  static List<ForwardPoint> resolved(List<ForwardPoint> run, double paPerS) {
    double now = run.get(0).paGauge();
    return run.stream()
        .map(
            point -> {
              double rise = paPerS * point.after().toSeconds();
              return new ForwardPoint(
                  point.after(),
                  Math.max(point.paGauge(), now + rise),
                  Math.max(point.lowPaGauge(), now + SLOWER * rise - bandAtStart(run)),
                  Math.max(point.highPaGauge(), now + FASTER * rise + bandAtStart(run)));
            })
        .toList();
  }

  private static double bandAtStart(List<ForwardPoint> run) {
    return (run.get(0).highPaGauge() - run.get(0).lowPaGauge()) / 2;
  }
}

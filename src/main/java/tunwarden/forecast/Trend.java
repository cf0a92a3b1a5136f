package tunwarden.forecast;

import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.estimate.ForwardPoint;

/**
 * Where the pressure goes by itself, as a run of points with a band; between points it is straight.
 *
 * @param start time of the first point
 * @param run the points, evenly spaced, the first at zero; not empty
 */
record Trend(Instant start, List<ForwardPoint> run) {
  /** How far ahead the trend is run. */
  static final Duration HORIZON = Duration.ofHours(48);

  /** Distance between points. */
  static final Duration STEP = Duration.ofMinutes(30);

  /** Pressure after a time with its band, Pa gauge; at the end of the run where that is sooner. */
  Spread at(Duration after) {
    long index = after.toSeconds() / STEP.toSeconds();
    ForwardPoint point = run.get((int) Math.min(run.size() - 1, index));
    return new Spread(point.lowPaGauge(), point.paGauge(), point.highPaGauge());
  }

  /** The chart's points. */
  List<TrendPoint> points() {
    return run.stream()
        .map(
            p ->
                new TrendPoint(start.plus(p.after()), p.paGauge(), p.lowPaGauge(), p.highPaGauge()))
        .toList();
  }

  /** Time until a pressure is reached from below; empty: not within the horizon. */
  Optional<TimeRange> until(double paGauge) {
    Optional<Duration> soonest = soonest(paGauge);
    Optional<Duration> likely = crossing(ForwardPoint::paGauge, paGauge);
    if (soonest.isEmpty() || likely.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new TimeRange(likely.get(), soonest.get(), crossing(ForwardPoint::lowPaGauge, paGauge)));
  }

  /** Time until the band's upper edge reaches a pressure. */
  Optional<Duration> soonest(double paGauge) {
    return crossing(ForwardPoint::highPaGauge, paGauge);
  }

  private Optional<Duration> crossing(ToDoubleFunction<ForwardPoint> edge, double paGauge) {
    if (edge.applyAsDouble(run.get(0)) >= paGauge) {
      return Optional.of(Duration.ZERO);
    }
    for (int i = 1; i < run.size(); i++) {
      double before = edge.applyAsDouble(run.get(i - 1));
      double here = edge.applyAsDouble(run.get(i));
      if (here >= paGauge) {
        double share = (paGauge - before) / (here - before);
        Duration from = run.get(i - 1).after();
        long gone = Math.round(share * run.get(i).after().minus(from).toMillis());
        return Optional.of(from.plusMillis(gone));
      }
    }
    return Optional.empty();
  }
}

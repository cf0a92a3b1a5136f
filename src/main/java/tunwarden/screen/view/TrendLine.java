package tunwarden.screen.view;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.assess.Assessment;
import tunwarden.assess.Observed;
import tunwarden.forecast.TrendPoint;

/** Values between the points of a forecast. */
final class TrendLine {
  private TrendLine() {}

  /** The forecast led back to the present pressure, from which its first step goes out. */
  static List<TrendPoint> fromNow(Assessment assessment) {
    List<TrendPoint> trend = assessment.outlook().trend();
    Observed pressure = assessment.pressure();
    if (trend.isEmpty() || !pressure.isUsable() || pressure.at().isEmpty()) {
      return trend;
    }
    Instant at = pressure.at().get();
    double now = pressure.value().getAsDouble();
    List<TrendPoint> whole = new ArrayList<>();
    whole.add(new TrendPoint(at, now, now, now));
    trend.stream().filter(point -> point.at().isAfter(at)).forEach(whole::add);
    return whole;
  }

  /** The forecast at a time, linear between its neighbours; empty outside the forecast. */
  static Optional<TrendPoint> at(List<TrendPoint> trend, Instant time) {
    for (int i = 1; i < trend.size(); i++) {
      TrendPoint a = trend.get(i - 1);
      TrendPoint b = trend.get(i);
      if (!time.isBefore(a.at()) && !time.isAfter(b.at()) && a.at().isBefore(b.at())) {
        double whole = Duration.between(a.at(), b.at()).toMillis();
        double share = Duration.between(a.at(), time).toMillis() / whole;
        return Optional.of(
            new TrendPoint(
                time,
                mix(a.paGauge(), b.paGauge(), share),
                mix(a.lowPaGauge(), b.lowPaGauge(), share),
                mix(a.highPaGauge(), b.highPaGauge(), share)));
      }
    }
    return Optional.empty();
  }

  private static double mix(double from, double to, double share) {
    return from + (to - from) * share;
  }
}

package tunwarden.report.find;

/** The straight line through points, by least squares; times count from an origin, ms. */
final class Line {
  private final long originMs;
  private int n;
  private double sumT;
  private double sumP;
  private double sumTt;
  private double sumTp;

  Line(long originMs) {
    this.originMs = originMs;
  }

  void add(Point point) {
    double t = point.ms() - originMs;
    n++;
    sumT += t;
    sumP += point.paGauge();
    sumTt += t * t;
    sumTp += t * point.paGauge();
  }

  int count() {
    return n;
  }

  /** Pa for every millisecond. */
  double slope() {
    double spread = sumTt - sumT * sumT / n;
    return spread > 0 ? (sumTp - sumT * sumP / n) / spread : 0;
  }

  /** Pa at the origin. */
  double atOrigin() {
    return sumP / n - slope() * sumT / n;
  }

  /** Pa so many milliseconds after the origin. */
  double at(double ms) {
    return atOrigin() + slope() * ms;
  }
}

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
    add(point.ms(), point.paGauge());
  }

  void add(long ms, double value) {
    double t = ms - originMs;
    n++;
    sumT += t;
    sumP += value;
    sumTt += t * t;
    sumTp += t * value;
  }

  int count() {
    return n;
  }

  /** Change for every millisecond. */
  double slope() {
    double spread = sumTt - sumT * sumT / n;
    return spread > 0 ? (sumTp - sumT * sumP / n) / spread : 0;
  }

  /** Value at the origin. */
  double atOrigin() {
    return sumP / n - slope() * sumT / n;
  }

  /** Value so many milliseconds after the origin. */
  double at(double ms) {
    return atOrigin() + slope() * ms;
  }
}

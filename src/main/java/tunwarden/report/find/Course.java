package tunwarden.report.find;

/**
 * The last few rows and the straight line through them; made for one look per row of a long log.
 */
final class Course {
  private final long[] ms;
  private final double[] pa;
  private Point last;
  private int count;

  /** A course of at most that many rows. */
  Course(int rows) {
    ms = new long[rows];
    pa = new double[rows];
  }

  void add(Point point) {
    if (count == ms.length) {
      count--;
      System.arraycopy(ms, 1, ms, 0, count);
      System.arraycopy(pa, 1, pa, 0, count);
    }
    ms[count] = point.ms();
    pa[count++] = point.paGauge();
    last = point;
  }

  void clear() {
    count = 0;
    last = null;
  }

  int size() {
    return count;
  }

  boolean isEmpty() {
    return count == 0;
  }

  /** The newest row; null for none. */
  Point last() {
    return last;
  }

  /** The straight line carried on to a time, Pa gauge. */
  double at(long whenMs) {
    long originMs = ms[count - 1];
    double sumT = 0;
    double sumP = 0;
    double sumTt = 0;
    double sumTp = 0;
    for (int i = 0; i < count; i++) {
      double t = ms[i] - originMs;
      sumT += t;
      sumP += pa[i];
      sumTt += t * t;
      sumTp += t * pa[i];
    }
    double spread = sumTt - sumT * sumT / count;
    double slope = spread > 0 ? (sumTp - sumT * sumP / count) / spread : 0;
    return sumP / count + slope * (whenMs - originMs - sumT / count);
  }

  /** How much less certain the line is at a time outside its rows; 1 amid them. */
  double reach(long whenMs) {
    double sum = 0;
    double squares = 0;
    for (int i = 0; i < count; i++) {
      double t = ms[i] - whenMs;
      sum += t;
      squares += t * t;
    }
    double mean = sum / count;
    double spread = squares - sum * mean;
    return Math.sqrt(1 + 1.0 / count + (spread > 0 ? mean * mean / spread : 0));
  }
}

package tunwarden.report.find;

import java.util.ArrayList;
import java.util.List;

/**
 * Lasting rises of the liquid's temperature. Minutes are averaged; a rise begins where the line
 * through its first stretch meets the level held before, and ends when the temperature has stopped
 * rising.
 */
final class WarmingTracker {
  private static final long MINUTE_MS = 60_000;
  private static final double RISE_K = 0.8;
  private static final int BASE_MINUTES = 90;
  private static final double STILL_K_PER_H = 0.15;

  /**
   * One rise.
   *
   * @param fromMs start
   * @param untilMs end
   * @param fromK level before, K
   * @param toK highest minute, K
   * @param endsHigh whether it was still near its highest when it ended
   */
  record Rise(long fromMs, long untilMs, double fromK, double toK, boolean endsHigh) {}

  private final List<double[]> minutes = new ArrayList<>();
  private final List<Rise> rises = new ArrayList<>();
  private long minute = Long.MIN_VALUE;
  private double sum;
  private int count;
  private double sumMs;
  private double baseK = Double.NaN;
  private double topK;
  private double topMs;
  private double startMs = Double.NaN;
  private long lastMs;

  void add(Point point) {
    if (Double.isNaN(point.kelvin())) {
      return;
    }
    long now = Math.floorDiv(point.ms(), MINUTE_MS);
    if (now != minute && count > 0) {
      closeMinute();
    }
    minute = now;
    lastMs = point.ms();
    sum += point.kelvin();
    sumMs += point.ms() - minute * MINUTE_MS;
    count++;
  }

  private void closeMinute() {
    double mean = sum / count;
    double ms = minute * MINUTE_MS + sumMs / count;
    sum = 0;
    sumMs = 0;
    count = 0;
    minutes.add(new double[] {ms, mean});
    if (minutes.size() > 6 * BASE_MINUTES) {
      minutes.remove(0);
    }
    if (Double.isNaN(startMs)) {
      lookForStart(ms, mean);
    } else {
      follow(ms, mean);
    }
  }

  /** The level before is the mean of what stayed low in the last hours. */
  private void lookForStart(double ms, double mean) {
    double low = Double.POSITIVE_INFINITY;
    int from = Math.max(0, minutes.size() - 3 * BASE_MINUTES);
    for (double[] each : minutes.subList(from, minutes.size())) {
      low = Math.min(low, each[1]);
    }
    if (mean < low + RISE_K || !keepsRising()) {
      return;
    }
    int onset = onset(from);
    double sumK = 0;
    int first = Math.max(0, onset - BASE_MINUTES);
    for (double[] each : minutes.subList(first, Math.max(onset, first + 1))) {
      sumK += each[1];
    }
    baseK = sumK / Math.max(onset - first, 1);
    startMs = meeting(onset);
    topK = mean;
    topMs = Math.min(ms, lastMs);
  }

  /** Whether each of the last three ten-minute means is above the one before. */
  private boolean keepsRising() {
    int size = minutes.size();
    return size < 30
        || mean(size - 10, size) > mean(size - 20, size - 10)
            && mean(size - 20, size - 10) > mean(size - 30, size - 20);
  }

  private double mean(int from, int to) {
    double total = 0;
    for (double[] each : minutes.subList(from, to)) {
      total += each[1];
    }
    return total / (to - from);
  }

  /** Going back from now, the last minute that had not begun to rise. */
  private int onset(int from) {
    int onset = minutes.size() - 1;
    double lowest = minutes.get(onset)[1];
    for (int i = onset; i >= from; i--) {
      if (minutes.get(i)[1] <= lowest) {
        lowest = minutes.get(i)[1];
        onset = i;
      } else if (onset - i > 30) {
        break;
      }
    }
    return onset;
  }

  /** Where the line through the first part of the rise meets the level before it. */
  private double meeting(int onset) {
    int last = minutes.size() - 1;
    double top = minutes.get(last)[1];
    Line rise = new Line((long) minutes.get(onset)[0]);
    boolean begun = false;
    for (int i = onset; i <= last; i++) {
      double share = (minutes.get(i)[1] - baseK) / (top - baseK);
      begun |= share > 0.2;
      if (begun) {
        rise.add((long) minutes.get(i)[0], minutes.get(i)[1]);
      }
      if (share > 0.8) {
        break;
      }
    }
    boolean rises = rise.count() > 1 && rise.slope() > 0;
    return minutes.get(onset)[0] + (rises ? (baseK - rise.atOrigin()) / rise.slope() : 0);
  }

  private void follow(double ms, double mean) {
    if (mean > topK) {
      topK = mean;
      topMs = Math.min(ms, lastMs);
    }
    boolean fell = mean < topK - Math.max(0.5, 0.3 * (topK - baseK));
    boolean stopped = ms - topMs > 90 * MINUTE_MS || ms - startMs > 150 * MINUTE_MS && isLevel();
    if (fell || stopped) {
      rises.add(new Rise((long) startMs, (long) topMs, baseK, topK, !fell));
      startMs = Double.NaN;
      minutes.clear();
    }
  }

  private boolean isLevel() {
    int size = minutes.size();
    if (size < 120) {
      return false;
    }
    return mean(size - 30, size) - mean(size - 120, size - 90) < 1.5 * STILL_K_PER_H;
  }

  void finish() {
    if (count > 0) {
      closeMinute();
    }
    if (!Double.isNaN(startMs)) {
      rises.add(new Rise((long) startMs, (long) topMs, baseK, topK, true));
    }
  }

  List<Rise> rises() {
    return rises;
  }
}

package tunwarden.report.analysis;

import tunwarden.reading.Reading;

/** The mean of neighbouring readings of one quantity, and what was last passed on. */
final class Mean {
  private static final int MANY = 6;

  private double sum;
  private int count;
  private long firstMs;
  private long intervalMs;
  private Reading newest;
  private double passed = Double.NaN;

  boolean isEmpty() {
    return count == 0;
  }

  /** Whether a value lies off the present mean, or off the last one while this one is empty. */
  boolean isAway(double value, double telling) {
    double usual = isEmpty() ? passed : sum / count;
    return !(Math.abs(value - usual) <= telling);
  }

  /** Whether it is of enough readings to be worth more than each. */
  boolean isOfMany() {
    return count >= MANY;
  }

  /** How far the present mean lies from the one last passed on. */
  double moved() {
    return Math.abs(sum / count - passed);
  }

  /** Whether the newest reading was of another quality. */
  boolean isOtherQuality(Reading reading) {
    return newest != null && reading.quality() != newest.quality();
  }

  void add(Reading reading) {
    long ms = reading.time().toEpochMilli();
    intervalMs = newest == null ? Long.MAX_VALUE / 2 : ms - newest.time().toEpochMilli();
    firstMs = isEmpty() ? ms : firstMs;
    newest = reading;
    sum += reading.value();
    count++;
  }

  /** The time that the mean covers, if the next reading keeps its distance. */
  long lengthMs() {
    return newest.time().toEpochMilli() - firstMs + intervalMs;
  }

  /** Gives the mean at the time of its newest reading and begins another. */
  Reading pass() {
    passed = sum / count;
    Reading mean =
        new Reading(
            newest.time(),
            newest.vessel(),
            newest.quantity(),
            passed,
            newest.u95(),
            newest.quality());
    sum = 0;
    count = 0;
    return mean;
  }
}

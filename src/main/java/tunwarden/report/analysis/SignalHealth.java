package tunwarden.report.analysis;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import tunwarden.reading.Quality;

/** How one instrument behaved over the log. Fed row by row; read when done. */
public final class SignalHealth {
  private final long[] counts = new long[Quality.values().length];
  private double least = Double.POSITIVE_INFINITY;
  private double greatest = Double.NEGATIVE_INFINITY;
  private long values;

  void value(double si, Quality quality) {
    counts[quality.ordinal()]++;
    if (!quality.isBad()) {
      values++;
      least = Math.min(least, si);
      greatest = Math.max(greatest, si);
    }
  }

  void fault(Quality quality) {
    counts[quality.ordinal()]++;
  }

  /** Values that could be used. */
  public long values() {
    return values;
  }

  /** Least usable value, SI; infinite for none. */
  public double least() {
    return least;
  }

  /** Greatest usable value, SI; minus infinity for none. */
  public double greatest() {
    return greatest;
  }

  /** How many values had each quality; a quality that none had is left out. */
  public Map<Quality, Long> counts() {
    Map<Quality, Long> met = new EnumMap<>(Quality.class);
    for (Quality quality : Quality.values()) {
      if (counts[quality.ordinal()] > 0) {
        met.put(quality, counts[quality.ordinal()]);
      }
    }
    return met;
  }

  /** Share of values that were good, 0..1. */
  public double goodShare() {
    long all = Arrays.stream(counts).sum();
    return all == 0 ? 0 : counts[Quality.GOOD.ordinal()] / (double) all;
  }
}

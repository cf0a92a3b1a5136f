package tunwarden.report.analysis;

import java.util.EnumMap;
import java.util.Map;
import tunwarden.reading.Quality;

/** How one instrument behaved over the log. Fed row by row; read when done. */
public final class SignalHealth {
  private final Map<Quality, Long> counts = new EnumMap<>(Quality.class);
  private double least = Double.POSITIVE_INFINITY;
  private double greatest = Double.NEGATIVE_INFINITY;
  private long values;

  void value(double si, Quality quality) {
    counts.merge(quality, 1L, Long::sum);
    if (!quality.isBad()) {
      values++;
      least = Math.min(least, si);
      greatest = Math.max(greatest, si);
    }
  }

  void fault(Quality quality) {
    counts.merge(quality, 1L, Long::sum);
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

  /** How many values had each quality. */
  public Map<Quality, Long> counts() {
    return counts;
  }

  /** Share of values that were good, 0..1. */
  public double goodShare() {
    long all = counts.values().stream().mapToLong(Long::longValue).sum();
    return all == 0 ? 0 : counts.getOrDefault(Quality.GOOD, 0L) / (double) all;
  }
}

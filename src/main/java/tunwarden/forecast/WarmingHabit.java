package tunwarden.forecast;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.estimate.Estimate.Spread;

/**
 * How fast a vessel warms when nothing cools it, learnt from lasting rises of its temperature: by
 * Newton's law the gap to the surroundings closes exponentially, so the logarithm of the gap falls
 * along a straight line, and its slope is the time constant. Readings are averaged over ten
 * minutes. Of several rises the quickest counts: cooling that is merely weak warms more slowly than
 * cooling lost. Yeast and heaters warm too, and look the same. Immutable.
 *
 * @param rising means of the rise that goes on, oldest first
 * @param open the mean that is being gathered; null before any reading
 * @param learnt the quickest rise so far
 */
public record WarmingHabit(List<Mean> rising, Sum open, Optional<Learnt> learnt) {
  /** Nothing seen yet. */
  public static final WarmingHabit NONE = new WarmingHabit(List.of(), null, Optional.empty());

  private static final double MEAN_S = 600;
  private static final double GAP_S = 3 * MEAN_S;
  private static final int MOST_MEANS = 72;
  private static final int LEAST_MEANS = 6;
  private static final double LEAST_RISE_K = 1.5;
  private static final double LEAST_LEFT_K = 3;
  private static final double FLAT_K = 0.15;
  private static final double FALL_K = 0.05;

  /** How well anyone knows the air about a vessel, 95 %, K: judgement. */
  private static final double AMBIENT_U95_K = 2;

  /** How far another day's warming strays from this one's, 95 %, relative: judgement. */
  private static final double OTHER_DAY_U95 = 0.15;

  /**
   * A mean temperature.
   *
   * @param at middle of its readings
   * @param kelvin K
   */
  record Mean(Instant at, double kelvin) {}

  /**
   * Readings on their way to a mean.
   *
   * @param start time of the first
   * @param seconds sum of their times since, s
   * @param kelvin sum of their temperatures, K
   * @param count how many
   */
  record Sum(Instant start, double seconds, double kelvin, int count) {
    Mean mean() {
      return new Mean(start.plusMillis(Math.round(1000 * seconds / count)), kelvin / count);
    }
  }

  /**
   * What a rise taught.
   *
   * @param timeS time constant with its range, s
   * @param from when the rise began
   * @param until its newest mean
   * @param fromK temperature at its start, K
   * @param toK at its newest mean, K
   */
  public record Learnt(Spread timeS, Instant from, Instant until, double fromK, double toK) {}

  /** With one more reading, K; nothing can be learnt where the surroundings are not known. */
  WarmingHabit seen(Instant at, double kelvin, OptionalDouble ambientK) {
    if (ambientK.isEmpty()) {
      return this;
    }
    Sum fresh = new Sum(at, 0, kelvin, 1);
    if (open == null) {
      return new WarmingHabit(rising, fresh, learnt);
    }
    double since = seconds(open.start, at);
    if (since < 0) {
      return new WarmingHabit(List.of(), fresh, learnt);
    }
    if (since < MEAN_S) {
      Sum more = new Sum(open.start, open.seconds + since, open.kelvin + kelvin, open.count + 1);
      return new WarmingHabit(rising, more, learnt);
    }
    List<Mean> next = since > GAP_S ? List.of() : extended(open.mean());
    Optional<Learnt> taught = taught(next, ambientK.getAsDouble());
    return new WarmingHabit(
        next, fresh, taught.filter(this::isBetter).isPresent() ? taught : learnt);
  }

  private List<Mean> extended(Mean mean) {
    if (!rising.isEmpty() && mean.kelvin < rising.get(rising.size() - 1).kelvin - FALL_K) {
      return List.of(mean);
    }
    List<Mean> longer = new ArrayList<>(rising);
    longer.add(mean);
    if (longer.size() > MOST_MEANS) {
      longer.remove(0);
    }
    return List.copyOf(longer);
  }

  /** Of the same rise the later word, of different ones the quicker. */
  private boolean isBetter(Learnt other) {
    return learnt.isEmpty()
        || !other.from.isAfter(learnt.get().until)
        || other.timeS.middle() < learnt.get().timeS.middle();
  }

  private static Optional<Learnt> taught(List<Mean> means, double ambientK) {
    int size = means.size();
    if (size < LEAST_MEANS) {
      return Optional.empty();
    }
    int onset = 0;
    while (onset < size - 1 && means.get(onset + 1).kelvin < means.get(0).kelvin + FLAT_K) {
      onset++;
    }
    Mean first = means.get(onset);
    Mean last = means.get(size - 1);
    boolean enough = last.kelvin - first.kelvin >= LEAST_RISE_K && size - onset >= LEAST_MEANS;
    if (!enough || ambientK - last.kelvin < LEAST_LEFT_K) {
      return Optional.empty();
    }
    Slope slope = Slope.of(means.subList(onset, size), ambientK);
    double time = -1 / slope.perS;
    double gap = ambientK - (first.kelvin + last.kelvin) / 2;
    double ofFit = 2 * slope.standardError / Math.abs(slope.perS);
    double ofAmbient = AMBIENT_U95_K / gap;
    double u95 = Math.sqrt(ofFit * ofFit + ofAmbient * ofAmbient + OTHER_DAY_U95 * OTHER_DAY_U95);
    Spread spread = new Spread(time / (1 + u95), time, time * (1 + u95));
    return time > 0
        ? Optional.of(new Learnt(spread, first.at, last.at, first.kelvin, last.kelvin))
        : Optional.empty();
  }

  /** Least-squares slope of the logarithm of the gap over time, with its standard error, 1/s. */
  private record Slope(double perS, double standardError) {
    static Slope of(List<Mean> means, double ambientK) {
      int n = means.size();
      double[] x = new double[n];
      double[] y = new double[n];
      double meanX = 0;
      double meanY = 0;
      for (int i = 0; i < n; i++) {
        x[i] = seconds(means.get(0).at, means.get(i).at);
        y[i] = Math.log(ambientK - means.get(i).kelvin);
        meanX += x[i] / n;
        meanY += y[i] / n;
      }
      double xx = 0;
      double xy = 0;
      double yy = 0;
      for (int i = 0; i < n; i++) {
        xx += (x[i] - meanX) * (x[i] - meanX);
        xy += (x[i] - meanX) * (y[i] - meanY);
        yy += (y[i] - meanY) * (y[i] - meanY);
      }
      double left = Math.max(0, yy - xy * xy / xx);
      return new Slope(xy / xx, Math.sqrt(left / ((n - 2) * xx)));
    }
  }

  private static double seconds(Instant from, Instant to) {
    return Duration.between(from, to).toMillis() / 1000.0;
  }
}

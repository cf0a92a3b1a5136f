package tunwarden.report.analysis;

import java.util.Optional;
import tunwarden.estimate.Estimate;

/**
 * Looks back with the whole log in hand. Whatever a valve does, the liquid follows the headspace at
 * first order: dC/dt = kLa (C* − C) + gas made, and C* is known at all times from pressure and
 * temperature. Held pressure hides C while it lasts; once the vessel is closed C becomes known. So
 * the histories that start from anywhere the first belief allows, at any rate the last belief
 * allows, are weighed by how well they arrive at what is known at the best moment afterwards; the
 * belief before that moment is their weighted mean and spread.
 */
public final class Smoother {
  private static final int STARTS = 41;
  private static final int RATES = 41;
  private static final double TO_SIGMA = 1 / 1.96;
  private static final double WORTH_IT = 1.3;
  private static final double MODEL_SHARE = 0.03;

  private final Bins bins;
  private final double[] dissolved;
  private final double[] sigma;
  private final int anchor;

  private Smoother(Bins bins, int anchor) {
    this.bins = bins;
    this.anchor = anchor;
    this.dissolved = new double[anchor + 1];
    this.sigma = new double[anchor + 1];
  }

  /**
   * The backward look; empty where it would add nothing.
   *
   * @param bins the forward beliefs
   * @param last belief at the end of the log
   */
  public static Optional<Smoother> over(Bins bins, Estimate last) {
    int first = firstKnown(bins);
    int widest = extreme(bins, first, true);
    if (widest < 0) {
      return Optional.empty();
    }
    int anchor = extreme(bins, widest, false);
    boolean worth = bins.u95(widest) > WORTH_IT * bins.u95(anchor) && anchor > first + 3;
    if (!worth || !(last.transferPerS().middle() > 0)) {
      return Optional.empty();
    }
    Smoother smoother = new Smoother(bins, anchor);
    smoother.weigh(first, last.transferPerS());
    return Optional.of(smoother);
  }

  private static int firstKnown(Bins bins) {
    for (int i = 0; i < bins.size(); i++) {
      if (!Double.isNaN(bins.dissolved(i)) && !Double.isNaN(bins.equilibrium(i))) {
        return i;
      }
    }
    return bins.size();
  }

  /** The stretch with the greatest, or the least, half-width from {@code from} on; -1 for none. */
  private static int extreme(Bins bins, int from, boolean greatest) {
    int best = -1;
    for (int i = from; i < bins.size(); i++) {
      double u95 = bins.u95(i);
      boolean better = best < 0 || (greatest ? u95 > bins.u95(best) : u95 < bins.u95(best));
      if (!Double.isNaN(u95) && better) {
        best = i;
      }
    }
    return best;
  }

  private void weigh(int first, Estimate.Spread rate) {
    double[] mean = new double[anchor + 1];
    double[] square = new double[anchor + 1];
    double[] path = new double[anchor + 1];
    double total = 0;
    double startSigma = Math.max(bins.u95(first) * TO_SIGMA, 1e-6);
    double rateSigma = Math.max(0.05, Math.log(rate.high() / rate.low()) / 2 * TO_SIGMA);
    double endSigma = Math.hypot(bins.u95(anchor) * TO_SIGMA, 0.005 * bins.dissolved(anchor));
    for (int i = 0; i < STARTS; i++) {
      double startDeviate = -3 + 6.0 * i / (STARTS - 1);
      double start = bins.dissolved(first) + startDeviate * startSigma;
      if (start < 0) {
        continue;
      }
      for (int j = 0; j < RATES; j++) {
        double rateDeviate = -3 + 6.0 * j / (RATES - 1);
        double perS = rate.middle() * Math.exp(rateDeviate * rateSigma);
        run(first, start, perS, path);
        double endDeviate = (path[anchor] - bins.dissolved(anchor)) / endSigma;
        double weight =
            Math.exp(
                -0.5
                    * (startDeviate * startDeviate
                        + rateDeviate * rateDeviate
                        + endDeviate * endDeviate));
        total += weight;
        for (int k = first; k <= anchor; k++) {
          mean[k] += weight * path[k];
          square[k] += weight * path[k] * path[k];
        }
      }
    }
    settle(first, total, mean, square);
  }

  /** One history: the exact step of a first-order lag over each stretch. */
  private void run(int first, double start, double perS, double[] path) {
    double seconds = bins.widthMs() / 1000.0;
    double keep = Math.exp(-perS * seconds);
    double c = start;
    double rest = bins.equilibrium(first);
    path[first] = c;
    for (int k = first + 1; k < path.length; k++) {
      double next = bins.equilibrium(k);
      rest = Double.isNaN(next) ? rest : next;
      c = rest + (c - rest) * keep + bins.made(k) * seconds;
      path[k] = c;
    }
  }

  private void settle(int first, double total, double[] mean, double[] square) {
    for (int k = 0; k <= anchor; k++) {
      if (k < first || !(total > 1e-12)) {
        dissolved[k] = Double.NaN;
        continue;
      }
      double m = mean[k] / total;
      double spread = Math.sqrt(Math.max(0, square[k] / total - m * m));
      double model = MODEL_SHARE * Math.abs(m - bins.equilibrium(k));
      double relation = bins.u95(anchor) * TO_SIGMA * m / bins.dissolved(anchor);
      dissolved[k] = m;
      sigma[k] = Math.sqrt(spread * spread + model * model + relation * relation);
    }
  }

  /** The row with the belief the whole log gives, where that is narrower than the running one. */
  public ReportRow smooth(ReportRow row) {
    double at = place(row.time().toEpochMilli());
    int bin = (int) Math.floor(at);
    if (Double.isNaN(row.dissolvedKgPerM3()) || bin < 0 || bin + 1 > anchor) {
      return row;
    }
    double share = at - bin;
    double c = dissolved[bin] + share * (dissolved[bin + 1] - dissolved[bin]);
    double u95 = (sigma[bin] + share * (sigma[bin + 1] - sigma[bin])) / TO_SIGMA;
    boolean narrower = u95 < row.u95KgPerM3();
    return narrower ? row.withDissolved(c, u95) : row;
  }

  /** The belief for a stretch: content and half-width; the running one where that is narrower. */
  public double[] at(int bin) {
    boolean better = bin <= anchor && sigma[bin] / TO_SIGMA < bins.u95(bin);
    return better
        ? new double[] {dissolved[bin], sigma[bin] / TO_SIGMA}
        : new double[] {bins.dissolved(bin), bins.u95(bin)};
  }

  private double place(long ms) {
    return (ms - bins.middleMs(0)) / (double) bins.widthMs();
  }
}

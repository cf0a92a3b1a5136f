package tunwarden.report.analysis;

import java.util.Optional;
import tunwarden.estimate.Estimate;
import tunwarden.forecast.Present;

/**
 * Looks back with the whole log in hand. Whatever a valve does, the liquid follows the headspace at
 * first order: dC/dt = kLa (C* − C), and C* is known at all times from pressure and temperature.
 * Held pressure hides C while it lasts; once the vessel is shut, the headspace shows it. So the
 * histories that start anywhere, at any rate, are weighed by how well they explain the headspace
 * while it was shut ({@link ShutStretches}) and how well they arrive at the running estimate's last
 * belief; what the liquid held is their weighted mean and spread.
 */
public final class Smoother {
  private static final int STARTS = 41;
  private static final int RATES = 41;
  private static final int PASSES = 3;
  private static final double SIGMA_TO_U95 = 1.96;

  /**
   * The grid is coarse and the errors of gauge, fill and relation are shared by all points, which
   * the weights do not know; set so that the interval covers on simulated vessels (SmootherTest).
   */
  private static final double WIDEN = 1.35;

  private static final double MODEL_SHARE = 0.03;
  private static final double RELATION_SHARE = 0.012;
  private static final double MOST_MADE_PER_DAY = 0.3;
  private static final double MOST_AIR = 0.10;
  private static final double WORTH_IT = 1.3;

  /** Spread of kLa before anything is seen: a factor of 25 either way (95 %), in logarithms. */
  private static final double RATE_SIGMA = Math.log(25) / 1.96;

  private final Bins bins;
  private final ShutStretches shut;
  private final int first;
  private final double usualLnRate;
  private final double[] mean;
  private final double[] sigma;

  private Smoother(Analysis analysis, ShutStretches shut, int first) {
    this.bins = analysis.bins();
    this.usualLnRate = Math.log(Present.usualTransfer(analysis.vessel().fillM3()).middle());
    this.shut = shut;
    this.first = first;
    this.mean = new double[bins.size()];
    this.sigma = new double[bins.size()];
  }

  /** The backward look; empty where it would add nothing, or while something ferments. */
  public static Optional<Smoother> over(Analysis analysis) {
    Bins bins = analysis.bins();
    Optional<Estimate> last = analysis.state().estimate();
    int first = firstKnown(bins);
    boolean possible = last.isPresent() && first + 10 <= bins.size() && varies(bins, first);
    if (!possible || isFermenting(last.get()) || hasUnstatedAir(last.get())) {
      return Optional.empty();
    }
    ShutStretches shut = ShutStretches.of(analysis);
    Smoother smoother = new Smoother(analysis, shut, first);
    return shut.isEmpty() || !smoother.weigh(last.get()) ? Optional.empty() : Optional.of(smoother);
  }

  private static int firstKnown(Bins bins) {
    for (int i = 0; i < bins.size(); i++) {
      if (!Double.isNaN(bins.dissolved(i)) && !Double.isNaN(bins.equilibrium(i))) {
        return i;
      }
    }
    return bins.size();
  }

  private static boolean isFermenting(Estimate last) {
    return last.gasMadeKgPerM3PerS() * 86_400 > MOST_MADE_PER_DAY;
  }

  /** The balance here knows only the air that was stated. */
  private static boolean hasUnstatedAir(Estimate last) {
    return last.airFraction() - last.airFractionU95() > MOST_AIR;
  }

  /** Where the belief was equally narrow all along, there is nothing to gain. */
  private static boolean varies(Bins bins, int first) {
    double least = Double.POSITIVE_INFINITY;
    double most = 0;
    for (int i = first; i < bins.size(); i++) {
      if (!Double.isNaN(bins.u95(i))) {
        least = Math.min(least, bins.u95(i));
        most = Math.max(most, bins.u95(i));
      }
    }
    return most > WORTH_IT * least;
  }

  /** The part of the plane of starts and rates that is looked at, ever closer. */
  private record Field(double start, double startHalf, double lnRate, double lnRateHalf) {}

  private boolean weigh(Estimate last) {
    double most = 1.3 * Math.max(shut.rest(first), bins.dissolved(first));
    Field field = new Field(most / 2, most / 2, usualLnRate, 3 * RATE_SIGMA);
    for (int pass = 0; pass < PASSES; pass++) {
      field = look(field, last, pass == PASSES - 1);
      if (field == null) {
        return false;
      }
    }
    return true;
  }

  /** Weighs a grid over the field; returns the field to look at next, or null if nothing fits. */
  private Field look(Field field, Estimate last, boolean keep) {
    double[][] logWeight = new double[STARTS][RATES];
    double best = Double.NEGATIVE_INFINITY;
    double[] path = new double[bins.size()];
    for (int i = 0; i < STARTS; i++) {
      for (int j = 0; j < RATES; j++) {
        run(start(field, i), Math.exp(lnRate(field, j)), path);
        double unusual = (lnRate(field, j) - usualLnRate) / RATE_SIGMA;
        logWeight[i][j] =
            start(field, i) < 0
                ? Double.NEGATIVE_INFINITY
                : fit(path, last) - unusual * unusual / 2;
        best = Math.max(best, logWeight[i][j]);
      }
    }
    if (!Double.isFinite(best)) {
      return null;
    }
    Moments starts = new Moments();
    Moments rates = new Moments();
    double[] square = new double[bins.size()];
    java.util.Arrays.fill(mean, 0);
    for (int i = 0; i < STARTS; i++) {
      for (int j = 0; j < RATES; j++) {
        double weight = Math.exp(logWeight[i][j] - best);
        starts.add(start(field, i), weight);
        rates.add(lnRate(field, j), weight);
        if (keep && weight > 1e-6) {
          run(start(field, i), Math.exp(lnRate(field, j)), path);
          for (int k = first; k < path.length; k++) {
            mean[k] += weight * path[k];
            square[k] += weight * path[k] * path[k];
          }
        }
      }
    }
    if (keep) {
      settle(starts.weight, square);
    }
    double startHalf = Math.min(field.startHalf(), 3.2 * starts.sigma() + field.startHalf() / 15);
    double rateHalf = Math.min(field.lnRateHalf(), 3.2 * rates.sigma() + field.lnRateHalf() / 15);
    return new Field(starts.mean(), startHalf, rates.mean(), rateHalf);
  }

  private static double start(Field field, int i) {
    return field.start() + field.startHalf() * (2.0 * i / (STARTS - 1) - 1);
  }

  private static double lnRate(Field field, int j) {
    return field.lnRate() + field.lnRateHalf() * (2.0 * j / (RATES - 1) - 1);
  }

  private double fit(double[] path, Estimate last) {
    double end = path[path.length - 1];
    double endSigma =
        Math.hypot(last.dissolvedU95KgPerM3() / SIGMA_TO_U95, RELATION_SHARE * Math.abs(end));
    double off = (end - last.dissolvedKgPerM3()) / endSigma;
    return -off * off / 2 + shut.fit(path);
  }

  /** One history: the exact step of a first-order lag over each stretch. */
  private void run(double start, double perS, double[] path) {
    double keep = Math.exp(-perS * bins.widthMs() / 1000.0);
    double c = start;
    double rest = shut.rest(first);
    for (int k = 0; k < path.length; k++) {
      if (k > first) {
        double next = shut.rest(k);
        double middle = Double.isNaN(next) ? rest : (rest + next) / 2;
        rest = Double.isNaN(next) ? rest : next;
        c = middle + (c - middle) * keep;
      }
      path[k] = c;
    }
  }

  private void settle(double total, double[] square) {
    for (int k = first; k < mean.length; k++) {
      double m = mean[k] / total;
      double spread = Math.sqrt(Math.max(0, square[k] / total - m * m));
      double rest = Double.isNaN(shut.rest(k)) ? m : shut.rest(k);
      mean[k] = m;
      double model = Math.hypot(MODEL_SHARE * (m - rest), 2 * RELATION_SHARE * m);
      sigma[k] = WIDEN * Math.hypot(spread, model);
    }
  }

  /** The row with the belief the whole log gives, where that is narrower than the running one. */
  public ReportRow smooth(ReportRow row) {
    double at = (row.time().toEpochMilli() - bins.middleMs(0)) / (double) bins.widthMs();
    int bin = (int) Math.floor(Math.min(at, bins.size() - 1.000001));
    if (Double.isNaN(row.dissolvedKgPerM3()) || bin < first) {
      return row;
    }
    double share = Math.min(1, at - bin);
    double c = mean[bin] + share * (mean[bin + 1] - mean[bin]);
    double u95 = SIGMA_TO_U95 * (sigma[bin] + share * (sigma[bin + 1] - sigma[bin]));
    return u95 < row.u95KgPerM3() ? row.withDissolved(c, u95) : row;
  }

  /** The belief for a stretch: content and half-width; the running one where that is narrower. */
  public double[] at(int bin) {
    boolean better = bin >= first && SIGMA_TO_U95 * sigma[bin] < bins.u95(bin);
    return better
        ? new double[] {mean[bin], SIGMA_TO_U95 * sigma[bin]}
        : new double[] {bins.dissolved(bin), bins.u95(bin)};
  }

  /** Weighted mean and spread. */
  private static final class Moments {
    private double weight;
    private double sum;
    private double squares;

    void add(double value, double w) {
      weight += w;
      sum += w * value;
      squares += w * value * value;
    }

    double mean() {
      return sum / weight;
    }

    double sigma() {
      return Math.sqrt(Math.max(0, squares / weight - mean() * mean()));
    }
  }
}

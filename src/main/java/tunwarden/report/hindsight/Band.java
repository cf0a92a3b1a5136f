package tunwarden.report.hindsight;

import static tunwarden.report.hindsight.Manner.AIR;
import static tunwarden.report.hindsight.Manner.MADE;
import static tunwarden.report.hindsight.Manner.START;

import java.util.List;

/** What the liquid held at every step: the weighted mean of what each assumption leads to. */
final class Band {
  private static final double SIGMA_TO_U95 = 1.96;

  /** Set so that the interval covers on simulated vessels (SmootherTest). */
  private static final double WIDEN = 1.15;

  /** What the relation and the gauge's error leave, share of the content and of the distance. */
  private static final double RELATION_SHARE = 0.024;

  private static final double MODEL_SHARE = 0.02;
  private static final double NO_WEIGHT = 1e-6;

  private final Course course;
  private final double[] mean;
  private final double[] square;
  private double oddWeight;
  private double weight;

  Band(Course course, List<Outcome> outcomes) {
    this.course = course;
    this.mean = new double[course.size];
    this.square = new double[course.size];
    double best = best(outcomes);
    for (Outcome outcome : outcomes) {
      double share = weight(outcome, best);
      if (share > NO_WEIGHT) {
        weight += share;
        oddWeight += outcome.assumption().odd() ? share : 0;
        add(outcome, share);
      }
    }
    settle();
  }

  static double best(List<Outcome> outcomes) {
    return outcomes.stream().mapToDouble(Outcome::log).max().orElseThrow();
  }

  /** How much an outcome counts beside the best. */
  static double weight(Outcome outcome, double best) {
    return Math.exp(outcome.log() - best);
  }

  /** Adds one course with its spread: the exact step of a first-order lag over each stretch. */
  private void add(Outcome outcome, double share) {
    double keep = Math.exp(-outcome.assumption().transferPerS() * course.stepS);
    double surplus = outcome.mean()[MADE] / (1 - keep);
    double[] by = {1, 0, 0}; // sensitivities to the beginning, the air and what is made
    double c = outcome.mean()[START];
    double rest = rest(0, outcome);
    for (int k = 0; k < course.size; k++) {
      if (k > 0) {
        double next = rest(k, outcome);
        double middle = (rest + next) / 2 + surplus;
        rest = next;
        c = middle + (c - middle) * keep;
        by[0] *= keep;
        by[1] = by[1] * keep - course.slope[k] * course.airShare[k] * (1 - keep);
        by[2] = by[2] * keep + 1;
      }
      double held = Math.max(0, c);
      mean[k] += share * held;
      square[k] += share * (held * held + spread(by, outcome.covariance()));
    }
  }

  private double rest(int k, Outcome outcome) {
    return course.rest[k] - course.slope[k] * course.airShare[k] * outcome.mean()[AIR];
  }

  private static double spread(double[] by, double[][] covariance) {
    double sum = 0;
    for (int i = 0; i < by.length; i++) {
      for (int j = 0; j < by.length; j++) {
        sum += by[i] * by[j] * covariance[START + i][START + j];
      }
    }
    return Math.max(0, sum);
  }

  /** From sums to means and half-widths. */
  private void settle() {
    for (int k = 0; k < mean.length; k++) {
      double m = mean[k] / weight;
      double variance = Math.max(0, square[k] / weight - m * m);
      double model = Math.hypot(MODEL_SHARE * (m - course.rest[k]), RELATION_SHARE * m);
      mean[k] = m;
      square[k] = SIGMA_TO_U95 * WIDEN * Math.sqrt(variance + model * model);
    }
  }

  double mean(int k) {
    return mean[k];
  }

  double u95(int k) {
    return square[k];
  }

  double least(int k) {
    return mean[k] - square[k];
  }

  /** Weight of the assumptions the look back does not go by, 0..1. */
  double oddShare() {
    return oddWeight / weight;
  }
}

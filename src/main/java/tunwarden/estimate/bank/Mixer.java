package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Grid.MODES;
import static tunwarden.estimate.bank.Grid.SOURCE;
import static tunwarden.estimate.bank.Grid.STILL;

/**
 * Lets the three modes of one cell exchange weight, as the interacting multiple model does (Blom
 * and Bar-Shalom, IEEE Trans. Autom. Control 33 (1988) 780), with one difference: a mode keeps its
 * own Gaussian as long as that carries most of its weight, and is otherwise replaced by the
 * moment-matched mixture of what may have become it. Blending a wide belief into a narrow one a
 * little at every step would ruin the narrow one long before it is refuted.
 */
final class Mixer {
  private static final double KEEPS = 0.5;

  private final Gaussian[] from = {new Gaussian(), new Gaussian(), new Gaussian()};
  private final Gaussian into = new Gaussian();
  private final double[] share = new double[MODES];
  private final double[] shift = new double[Gaussian.STATES];

  /** Mixes every cell of the bank in place. */
  void mix(double[] filters, double[] weights, double[][] transitions) {
    for (int cell = 0; cell < Grid.FILTERS; cell += MODES) {
      mixCell(filters, weights, cell, transitions);
    }
    Bank.normalized(weights);
  }

  private void mixCell(double[] filters, double[] weights, int cell, double[][] transitions) {
    for (int m = 0; m < MODES; m++) {
      from[m].load(filters, (cell + m) * Gaussian.STRIDE);
    }
    double[] next = new double[MODES];
    for (int target = 0; target < MODES; target++) {
      for (int m = 0; m < MODES; m++) {
        next[target] += weights[cell + m] * transitions[m][target];
      }
    }
    for (int target = 0; target < MODES; target++) {
      double own = weights[cell + target] * transitions[target][target];
      if (own < KEEPS * next[target]) {
        merge(weights, cell, target, transitions, next[target] - own);
        into.store(filters, (cell + target) * Gaussian.STRIDE);
      }
    }
    System.arraycopy(next, 0, weights, cell, MODES);
  }

  /** Moment-matched mixture of what comes from the other modes. */
  private void merge(
      double[] weights, int cell, int target, double[][] transitions, double foreign) {
    into.clear();
    for (int m = 0; m < MODES; m++) {
      share[m] = m == target ? 0 : weights[cell + m] * transitions[m][target] / foreign;
      for (int i = 0; i < Gaussian.STATES; i++) {
        into.mean[i] += share[m] * sourceAware(m, target, i);
      }
    }
    for (int m = 0; m < MODES; m++) {
      if (share[m] > 0) {
        spread(m, target, share[m]);
      }
    }
  }

  private void spread(int m, int target, double share) {
    for (int i = 0; i < Gaussian.STATES; i++) {
      shift[i] = sourceAware(m, target, i) - into.mean[i];
    }
    for (int i = 0; i < Gaussian.STATES; i++) {
      for (int j = 0; j < Gaussian.STATES; j++) {
        double own = from[m].cov[i * Gaussian.STATES + j];
        if (target == STILL && (i == Gaussian.SOURCE || j == Gaussian.SOURCE)) {
          own = 0;
        }
        into.cov[i * Gaussian.STATES + j] += share * (own + shift[i] * shift[j]);
      }
    }
    if (target == SOURCE && m == STILL) {
      into.addVariance(Gaussian.SOURCE, share * Prior.SOURCE_SD * Prior.SOURCE_SD);
    }
  }

  private double sourceAware(int m, int target, int state) {
    return state == Gaussian.SOURCE && target == STILL ? 0 : from[m].mean[state];
  }
}

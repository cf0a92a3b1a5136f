package tunwarden.estimate.bank;

import static tunwarden.estimate.bank.Grid.MODES;

/**
 * Lets the modes of one cell exchange weight, as the interacting multiple model does (Blom and
 * Bar-Shalom, IEEE Trans. Autom. Control 33 (1988) 780), with one difference: a mode keeps its own
 * Gaussian as long as that carries most of its weight, and is otherwise replaced by the
 * moment-matched mixture of what may have become it. Blending a wide belief into a narrow one a
 * little at every step would ruin the narrow one long before it is refuted.
 */
final class Mixer {
  private static final double KEEPS = 0.5;
  private static final double IDLE = 0.5;
  private static final double LEAST_SHARE = 1e-3;

  /** Weight below which a filter is left alone until it is born again from its neighbours. */
  static final double ASLEEP = 1e-6;

  private static final double FLOOR = 1e-30;

  /** Only modes that mostly come from others are replaced. */
  static final Birth GENTLY = new Birth(false, 0);

  /**
   * How far modes start afresh.
   *
   * @param anew whether the readings have left the bank: every mode but the leading one then starts
   *     afresh from the others
   * @param behindPa how far the level of those others lies behind the readings, Pa
   */
  record Birth(boolean anew, double behindPa) {}

  /** Chance that a headspace still holds air when gas begins to be made under it. */
  private static final double PURGED = 0.02;

  /** Time after which a vessel's transfer coefficient may well be another, s. */
  private static final double PACE_CHANGES_S = 10 * 86_400;

  private final Gaussian one = new Gaussian();
  private final Gaussian into = new Gaussian();
  private final double[] share = new double[MODES];
  private final double[] total = new double[MODES];
  private final double solubility;
  private final double[] shift = new double[Gaussian.STATES];

  /** Works at a solubility, kg/m3/Pa. */
  Mixer(double solubility) {
    this.solubility = solubility;
  }

  /**
   * Mixes every cell of the bank in place.
   *
   * @param birth how far modes start afresh
   */
  void mix(double[] filters, double[] weights, double[][] transitions, Birth birth) {
    java.util.Arrays.fill(total, 0);
    for (int f = 0; f < Grid.FILTERS; f++) {
      total[Grid.modeOf(f)] += weights[f];
    }
    for (int cell = 0; cell < Grid.FILTERS; cell += MODES) {
      mixCell(filters, weights, cell, transitions, birth);
    }
    Bank.normalized(weights);
  }

  static Birth anew(double behindPa) {
    return new Birth(true, behindPa);
  }

  private void mixCell(
      double[] filters, double[] weights, int cell, double[][] transitions, Birth birth) {
    double[] next = new double[MODES];
    for (int target = 0; target < MODES; target++) {
      for (int m = 0; m < MODES; m++) {
        next[target] += weights[cell + m] * transitions[m][target] * purged(cell, m, target);
      }
    }
    boolean[] yields = new boolean[MODES];
    double[] born = new double[MODES * Gaussian.STRIDE];
    for (int target = 0; target < MODES; target++) {
      double own = weights[cell + target] * transitions[target][target];
      boolean weak = own < KEEPS * next[target];
      boolean idle = birth.anew() && next[target] - own > 0.01 * own && total[target] < IDLE;
      yields[target] = (weak || idle) && next[target] > ASLEEP;
      if (yields[target]) {
        merge(filters, weights, cell, target, transitions);
        into.addVariance(Gaussian.GAS, birth.behindPa() * birth.behindPa());
        into.store(born, target * Gaussian.STRIDE);
      }
    }
    for (int m = 0; m < MODES; m++) {
      if (yields[m]) {
        int at = m * Gaussian.STRIDE;
        System.arraycopy(born, at, filters, cell * Gaussian.STRIDE + at, Gaussian.STRIDE);
      }
      weights[cell + m] = Math.max(next[m], FLOOR);
    }
  }

  /** Whoever makes gas has mostly swept the air out already. */
  private static double purged(int cell, int mode, int target) {
    boolean begins = target == Grid.MAKING && mode != target;
    return begins && Grid.airOf(cell) > 0 ? PURGED : 1;
  }

  /** Moment-matched mixture of what comes from the other modes. */
  private void merge(
      double[] filters, double[] weights, int cell, int target, double[][] transitions) {
    double foreign = 0;
    for (int m = 0; m < MODES; m++) {
      share[m] = m == target ? 0 : weights[cell + m] * transitions[m][target];
      foreign += share[m];
    }
    into.clear();
    for (int m = 0; m < MODES; m++) {
      share[m] /= foreign;
      if (share[m] > LEAST_SHARE) {
        turn(filters, cell + m, m, target);
        for (int i = 0; i < Gaussian.STATES; i++) {
          into.mean[i] += share[m] * one.mean[i];
        }
      }
    }
    for (int m = 0; m < MODES; m++) {
      if (share[m] > LEAST_SHARE) {
        turn(filters, cell + m, m, target);
        spread(share[m]);
      }
    }
  }

  /** Loads a filter as it would be under another mode. */
  private void turn(double[] filters, int filter, int mode, int target) {
    one.load(filters, filter * Gaussian.STRIDE);
    boolean keeps =
        (mode == Grid.MAKING && target == Grid.HELD)
            || (mode == Grid.HELD && target == Grid.MAKING);
    if (!keeps) {
      Prior.beginSource(one, target);
    }
    if (mode == Grid.HELD && target == Grid.MAKING) {
      Prior.aboveRest(one, solubility, Grid.transferPerS(filter));
    }
  }

  private void spread(double weight) {
    for (int i = 0; i < Gaussian.STATES; i++) {
      shift[i] = one.mean[i] - into.mean[i];
    }
    for (int i = 0; i < Gaussian.STATES; i++) {
      for (int j = 0; j < Gaussian.STATES; j++) {
        int k = i * Gaussian.STATES + j;
        into.cov[k] += weight * (one.cov[k] + shift[i] * shift[j]);
      }
    }
  }

  /** Lets neighbouring classes of transfer exchange weight, since a vessel may be roused. */
  void mixPaces(double[] filters, double[] weights, double seconds) {
    double hop = Math.min(0.1, seconds / PACE_CHANGES_S);
    int stride = Grid.AIRS * MODES;
    double[] old = weights.clone();
    for (int f = 0; f < Grid.FILTERS; f++) {
      double below = f >= stride ? hop * old[f - stride] : 0;
      double above = f + stride < Grid.FILTERS ? hop * old[f + stride] : 0;
      double own = (1 - 2 * hop) * old[f];
      if (own < below + above && below + above > ASLEEP) {
        one.load(filters, (below > above ? f - stride : f + stride) * Gaussian.STRIDE);
        one.pin(Gaussian.PACE, 0);
        one.addVariance(Gaussian.PACE, Grid.TRANSFER_LN_SD * Grid.TRANSFER_LN_SD);
        one.store(filters, f * Gaussian.STRIDE);
      }
      weights[f] = own + below + above;
    }
    Bank.normalized(weights);
  }
}

package tunwarden.report.hindsight;

/**
 * How well an assumption explains the pressure, whatever the valves did, and what follows for the
 * liquid: a filter over three manners of the headspace. Shut: what the liquid gives up, the
 * headspace gains. Held: the pressure stays. Moving: it goes anywhere. Which manner ruled when is
 * inferred on the way (interacting multiple models: Blom and Bar-Shalom, IEEE Trans. Autom. Control
 * 33, 1988). What the liquid held at first is carried along as a state of its own, so that all that
 * comes later bears on it (fixed-point smoothing).
 */
final class HeadspaceFilter {
  private static final int SHUT = 0;
  private static final int HELD = 1;
  private static final int MOVING = 2;
  private static final int MANNERS = 3;
  private static final double DAY_S = 86_400;

  /** Wander of the pressure over a day: weather and gauge; regulators. Judgement. */
  private static final double SHUT_WANDER_PA = 400;

  private static final double HELD_WANDER_PA = 250;
  private static final double MOVING_WANDER_PA_PER_SQRT_S = 150;

  /** What thermometer and relation leave unexplained while shut, share of the pressure. */
  private static final double LOOSE_SHARE = 2e-4;

  /**
   * Log-likelihoods count this much: neighbouring steps share the errors of gauge, weather and
   * model, which the filter takes as independent. Set so that the interval covers on simulated
   * vessels (SmootherTest).
   */
  private static final double HEAT = 0.3;

  private static final double CHANGES_PER_S = 1 / DAY_S;
  private static final double SETTLES_PER_S = 1 / 1200.0;

  private final Course course;
  private final double shutAtFirst;
  private final double[][] change;
  private final double[] share = new double[MANNERS];
  private final double[] weight = new double[MANNERS];
  private final Manner all = new Manner();
  private Manner[] now = {new Manner(), new Manner(), new Manner()};
  private Manner[] before = {new Manner(), new Manner(), new Manner()};

  /**
   * A filter for one log.
   *
   * @param shutAtFirst chance that the vessel is shut where nothing is known
   */
  HeadspaceFilter(Course course, double shutAtFirst) {
    this.course = course;
    this.shutAtFirst = shutAtFirst;
    double turn = Math.min(0.2, CHANGES_PER_S * course.stepS);
    double settle = Math.min(0.9, SETTLES_PER_S * course.stepS);
    this.change =
        new double[][] {
          {1 - 1.1 * turn, turn, 0.1 * turn},
          {turn, 1 - 1.1 * turn, 0.1 * turn},
          {settle / 2, settle / 2, 1 - settle}
        };
  }

  /** Follows one assumption through the whole log. */
  Outcome run(Assumption assumption) {
    double log = 0;
    for (Manner manner : now) {
      manner.set(assumption.mean(), assumption.variance());
      manner.loseGas(course.dryPa(0));
    }
    forget();
    for (int k = 0; k < course.size; k++) {
      if (k > 0) {
        mix();
        predict(k, assumption);
      }
      if (course.disturbed[k]) {
        jump(k);
      } else if (course.read[k]) {
        log += update(course.dryPa(k), course.airShare[k], course.variance[k]);
      }
      if (!Double.isNaN(course.laboratory[k])) {
        log += laboratory(k);
      }
    }
    all.blend(now, weight);
    double possible = all.keepStartAboveZero();
    return new Outcome(
        assumption,
        HEAT * (log + Math.log(possible)) + assumption.logPrior(),
        all.mean.clone(),
        copy(all.cov));
  }

  private static double[][] copy(double[][] of) {
    double[][] copy = new double[of.length][];
    for (int i = 0; i < of.length; i++) {
      copy[i] = of[i].clone();
    }
    return copy;
  }

  private void forget() {
    weight[SHUT] = shutAtFirst;
    weight[HELD] = 0.98 - shutAtFirst;
    weight[MOVING] = 0.02;
  }

  /** Gas was moved or the signal is not to be believed: the pressure may be anything. */
  private void jump(int k) {
    all.blend(now, weight);
    forget();
    for (Manner manner : now) {
      manner.copy(all);
      manner.loseGas(course.dryPa(k));
    }
  }

  private void mix() {
    Manner[] spare = before;
    before = now;
    now = spare;
    double w0 = weight[0];
    double w1 = weight[1];
    double w2 = weight[2];
    for (int m = 0; m < MANNERS; m++) {
      double a = w0 * change[0][m];
      double b = w1 * change[1][m];
      double c = w2 * change[2][m];
      weight[m] = a + b + c;
      share[0] = a / weight[m];
      share[1] = b / weight[m];
      share[2] = c / weight[m];
      now[m].blend(before, share);
    }
  }

  private void predict(int k, Assumption assumption) {
    double s = course.stepS;
    double days = s / DAY_S;
    double slope = course.slope[k];
    double room = assumption.roomShare() * course.perPa[k];
    double times = assumption.transferPerS() * s;
    now[SHUT].shut(slope, room, course.perPa[k - 1] / course.perPa[k], times);
    double wander = SHUT_WANDER_PA * SHUT_WANDER_PA * days;
    now[SHUT].wander(wander, slope * slope * wander);
    double airGone = course.airShare[k - 1] - course.airShare[k];
    now[HELD].follow(slope, course.otherPa[k - 1] - course.otherPa[k], airGone, times);
    now[HELD].wander(HELD_WANDER_PA * HELD_WANDER_PA * days, 0);
    now[MOVING].follow(slope, 0, 0, times);
    now[MOVING].wander(MOVING_WANDER_PA_PER_SQRT_S * MOVING_WANDER_PA_PER_SQRT_S * s, 0);
  }

  private double update(double seen, double airShare, double noise) {
    for (int m = 0; m < MANNERS; m++) {
      double loose = m == SHUT ? LOOSE_SHARE * seen : 0;
      share[m] = Math.log(weight[m]) + now[m].see(seen, airShare, noise + loose * loose);
    }
    return weigh();
  }

  private double laboratory(int k) {
    for (int m = 0; m < MANNERS; m++) {
      double log = now[m].seeLiquid(course.laboratory[k], course.laboratoryVariance[k]);
      share[m] = Math.log(weight[m]) + log;
    }
    return weigh();
  }

  /** New weights from the log-shares; returns the log of their sum. */
  private double weigh() {
    double best = Math.max(share[SHUT], Math.max(share[HELD], share[MOVING]));
    double sum = 0;
    for (int m = 0; m < MANNERS; m++) {
      weight[m] = Math.exp(share[m] - best);
      sum += weight[m];
    }
    for (int m = 0; m < MANNERS; m++) {
      weight[m] = Math.max(1e-12, weight[m] / sum);
    }
    return best + Math.log(sum);
  }
}

package tunwarden.estimate.bank;

/**
 * What the readings themselves say about the gauge: random scatter from second differences, and the
 * step it is read in. Immutable.
 *
 * @param count readings seen
 * @param run readings seen since gas last passed a valve
 * @param last newest value, Pa
 * @param before the value before it, Pa
 * @param scatter variance of the random part, Pa squared
 * @param step smallest change seen, Pa; negative while it is only a guess
 */
public record Noise(int count, int run, double last, double before, double scatter, double step) {
  private static final double LEAST_CHANGE_PA = 0.5;
  private static final double MOST_STEP_PA = 2000;
  private static final double CORRELATED_S = 600;
  private static final double FLOOR_PA = 50;
  private static final double FLOOR_SHARE = 3e-4;
  private static final double CLIP = 9;
  private static final int LEARNING = 100;

  /** Before any reading, from the stated accuracy (95 %), Pa. */
  public static Noise expected(double accuracyU95Pa) {
    double sd = accuracyU95Pa / 4;
    return new Noise(0, 0, 0, 0, sd * sd, -accuracyU95Pa / 4);
  }

  /** After another reading; a jump counts for little. */
  public Noise with(double pa) {
    double newScatter = scatter;
    if (run >= 2) {
      double second = pa - 2 * last + before;
      double seen = Math.min(second * second / 6, CLIP * scatter + 100);
      newScatter += (seen - scatter) / Math.min(count + 5, LEARNING);
    }
    int newCount = Math.min(count + 1, 1_000_000);
    int newRun = Math.min(run + 1, 2);
    double most = Double.POSITIVE_INFINITY;
    return new Noise(newCount, newRun, pa, last, newScatter, stepAfter(pa, most));
  }

  /**
   * After a reading that was set aside as a spike: it still tells the step the gauge is read in.
   */
  public Noise aside(double pa) {
    return new Noise(count, run, last, before, scatter, stepAfter(pa, MOST_STEP_PA));
  }

  /** The smallest change seen, another reading included if it moved by no more than that. */
  private double stepAfter(double pa, double most) {
    double change = Math.abs(pa - last);
    boolean moved = run >= 1 && change > LEAST_CHANGE_PA && change <= most;
    return moved && (step < 0 || change < step) ? change : step;
  }

  /** Gas has passed a valve: the next reading is not compared with those before. */
  public Noise afterJump() {
    return new Noise(count, 0, last, before, scatter, step);
  }

  /** The step the gauge is read in, Pa, as far as it is known. */
  public double coarsePa() {
    return Math.min(Math.abs(step), MOST_STEP_PA);
  }

  /** Whether a reading may be the first to show the step the gauge is read in. */
  public boolean mayBeOneStep(double pa) {
    return step < 0 && Math.abs(pa - last) <= MOST_STEP_PA;
  }

  /** Standard deviation of one reading, Pa. */
  public double sd() {
    double coarse = coarsePa();
    return Math.sqrt(scatter + coarse * coarse / 12);
  }

  /**
   * Variance of the mean of some readings spread over a time, Pa squared. The part that does not
   * average out (reading steps, the model's own small errors) is taken as one draw in ten minutes.
   */
  public double variance(double seconds, int readings, double paAbsolute) {
    double coarse = coarsePa();
    double share = FLOOR_SHARE * paAbsolute;
    double dithered = scatter > 0.25 * coarse * coarse ? 0.1 : 1;
    double lasting = dithered * coarse * coarse / 12 + FLOOR_PA * FLOOR_PA + share * share;
    return scatter / readings + lasting * Math.max(1, CORRELATED_S / Math.max(seconds, 1));
  }
}

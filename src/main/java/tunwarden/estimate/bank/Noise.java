package tunwarden.estimate.bank;

/**
 * What the readings themselves say about the gauge: random scatter from second differences, and the
 * step it is read in. Immutable.
 *
 * @param count readings seen
 * @param last newest value, Pa
 * @param before the value before it, Pa
 * @param scatter variance of the random part, Pa squared
 * @param step smallest change seen, Pa
 */
public record Noise(int count, double last, double before, double scatter, double step) {
  private static final double LEAST_CHANGE_PA = 0.5;
  private static final double MOST_STEP_PA = 2000;
  private static final double CORRELATED_S = 600;
  private static final double FLOOR_PA = 50;
  private static final double FLOOR_SHARE = 3e-4;
  private static final int LEARNING = 100;

  /** Before any reading, from the stated accuracy (95 %), Pa. */
  public static Noise expected(double accuracyU95Pa) {
    double sd = accuracyU95Pa / 4;
    return new Noise(0, 0, 0, sd * sd, accuracyU95Pa / 4);
  }

  /** After another reading; a jump counts for little. */
  public Noise with(double pa) {
    double newScatter = scatter;
    if (count >= 2) {
      double second = pa - 2 * last + before;
      double seen = Math.min(second * second / 6, 25 * scatter + 100);
      newScatter += (seen - scatter) / Math.min(count + 5, LEARNING);
    }
    double change = Math.abs(pa - last);
    boolean moved = count >= 1 && change > LEAST_CHANGE_PA;
    boolean first = moved && count < LEARNING && step > change;
    double newStep = moved && (change < step || first) ? change : step;
    return new Noise(Math.min(count + 1, 1_000_000), pa, last, newScatter, newStep);
  }

  /** Standard deviation of one reading, Pa. */
  public double sd() {
    double coarse = Math.min(step, MOST_STEP_PA);
    return Math.sqrt(scatter + coarse * coarse / 12);
  }

  /**
   * Variance of the mean of some readings spread over a time, Pa squared. The part that does not
   * average out (reading steps, the model's own small errors) is taken as one draw in ten minutes.
   */
  public double variance(double seconds, int readings, double paAbsolute) {
    double coarse = Math.min(step, MOST_STEP_PA);
    double share = FLOOR_SHARE * paAbsolute;
    double dithered = scatter > 0.25 * coarse * coarse ? 0.1 : 1;
    double lasting = dithered * coarse * coarse / 12 + FLOOR_PA * FLOOR_PA + share * share;
    return scatter / readings + lasting * Math.max(1, CORRELATED_S / Math.max(seconds, 1));
  }
}

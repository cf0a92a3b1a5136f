package tunwarden.estimate.bank;

/**
 * What would be known after the vessel had been left closed for a while: every filter of weight is
 * run forward sealed and shown the readings it expects, which shrinks its covariance as real ones
 * would. The result pools the filters' variances, so it does not count on the experiment to tell
 * them apart.
 */
public final class Experiment {
  private static final double LEAST_WEIGHT = 2e-3;
  private static final int PARTS = 10;

  private Experiment() {}

  /**
   * Expected half-width of the 95 % interval of the dissolved gas, kg/m3.
   *
   * @param filter of the vessel
   * @param bank as it is now
   * @param seconds how long it would be left closed
   * @param noise of the gauge
   */
  public static double closedFor(BankFilter filter, Bank bank, double seconds, Noise noise) {
    double part = seconds / PARTS;
    Bank.Setting setting = bank.setting();
    Passage way = filter.passage(setting, setting, part);
    double variance = noise.variance(part, Math.max(1, (int) (part / 10)), setting.paAbsolute());
    Gaussian x = new Gaussian();
    Motion motion = new Motion();
    double[] row = new double[Gaussian.STATES];
    double pooled = 0;
    double total = 0;
    for (int f = 0; f < Grid.FILTERS; f++) {
      double weight = bank.weights[f];
      if (weight < LEAST_WEIGHT) {
        continue;
      }
      x.load(bank.filters, f * Gaussian.STRIDE);
      for (int i = 0; i < PARTS; i++) {
        motion.sealed(x, Grid.transferPerS(f), way);
        Disturbance.add(x, Grid.CLOSED, way, 0);
        BankFilter.predict(x, Grid.CLOSED, row);
        x.condition(0, x.varianceOf(row) + variance, Gaussian.Considered.CONSTANTS);
      }
      pooled += weight * x.variance(Gaussian.LIQUID);
      total += weight;
    }
    return 2 * Math.sqrt(pooled / total);
  }
}

package tunwarden.estimate;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import tunwarden.estimate.bank.Ahead;
import tunwarden.estimate.bank.BankFilter;

/**
 * Where the pressure goes if everything goes on as it does: the bank run forward without readings,
 * with the spread that comes from all it does not know. A temperature that moves goes on moving
 * (see {@link TemperaturePath}); no valve moves, and a relief valve is not taken into account.
 */
public final class ForwardRun {
  private static final int LOW = 0;
  private static final int MIDDLE = 1;
  private static final int HIGH = 2;
  private static final double TAIL = 0.025;
  private static final double[] ALL = {0.5, TAIL, 1 - TAIL};

  private ForwardRun() {}

  /**
   * Runs a state forward.
   *
   * @param state as an {@link Estimator} returned it
   * @param horizon how far
   * @param step distance between points; positive
   * @return the points, the first at zero; empty where the state holds no belief or is not that of
   *     the standard estimator
   */
  public static List<ForwardPoint> run(State state, Duration horizon, Duration step) {
    if (step.isZero() || step.isNegative()) {
      throw new IllegalArgumentException("a forward run needs a positive step, not " + step);
    }
    if (!(state instanceof BankState bank) || bank.bank() == null) {
      return List.of();
    }
    TemperaturePath[] paths =
        TemperaturePath.all(
            bank.senses().smoothK(),
            bank.senses().warmingKPerS(),
            bank.medium().vessel().warmToK());
    int points = (int) (horizon.toMillis() / step.toMillis()) + 1;
    boolean still = paths[MIDDLE].isStill();
    double[][] middle = along(bank, paths[MIDDLE], points, step, still ? ALL : new double[] {0.5});
    double[][] low = still ? middle : along(bank, paths[LOW], points, step, 0.5, TAIL);
    double[][] high = still ? middle : along(bank, paths[HIGH], points, step, 0.5, 1 - TAIL);
    List<ForwardPoint> run = new ArrayList<>();
    for (int i = 0; i < points; i++) {
      double likely = middle[i][0];
      run.add(
          new ForwardPoint(
              step.multipliedBy(i),
              likely,
              Math.min(likely, low[i][1]),
              Math.max(likely, high[i][high[i].length - 1])));
    }
    return run;
  }

  /** Quantiles of the pressure along one temperature path, the median first, Pa gauge, by point. */
  private static double[][] along(
      BankState bank, TemperaturePath path, int points, Duration step, double... shares) {
    double seconds = step.toMillis() / 1000.0;
    Ahead ahead = new Ahead(new BankFilter(bank.medium()), bank.bank());
    double[][] run = new double[points][];
    for (int i = 0; i < points; i++) {
      double kelvin = path.at(i * seconds);
      double vapourPa = bank.medium().vapourPa(kelvin);
      if (i > 0) {
        double before = run[i - 1][0] + bank.ambientPa();
        ahead.advance(seconds, kelvin, before);
      }
      double[] pa = ahead.dryPressure(shares);
      for (int q = 0; q < pa.length; q++) {
        pa[q] += vapourPa - bank.ambientPa();
      }
      run[i] = pa;
    }
    return run;
  }
}

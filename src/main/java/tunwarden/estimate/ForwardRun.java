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
    double[][] middle = along(bank, paths[MIDDLE], points, step);
    double[][] low = paths[MIDDLE].isStill() ? middle : along(bank, paths[LOW], points, step);
    double[][] high = paths[MIDDLE].isStill() ? middle : along(bank, paths[HIGH], points, step);
    List<ForwardPoint> run = new ArrayList<>();
    for (int i = 0; i < points; i++) {
      double likely = middle[i][MIDDLE];
      run.add(
          new ForwardPoint(
              step.multipliedBy(i),
              likely,
              Math.min(likely, low[i][LOW]),
              Math.max(likely, high[i][HIGH])));
    }
    return run;
  }

  /** Quantiles of the pressure along one temperature path, Pa gauge, by point. */
  private static double[][] along(BankState bank, TemperaturePath path, int points, Duration step) {
    double seconds = step.toMillis() / 1000.0;
    Ahead ahead = new Ahead(new BankFilter(bank.medium()), bank.bank());
    double[][] run = new double[points][];
    for (int i = 0; i < points; i++) {
      double kelvin = path.at(i * seconds);
      double vapourPa = bank.medium().vapourPa(kelvin);
      if (i > 0) {
        double before = run[i - 1][MIDDLE] + bank.ambientPa();
        ahead.advance(seconds, kelvin, before);
      }
      double[] pa = ahead.dryPressure();
      for (int q = 0; q < pa.length; q++) {
        pa[q] += vapourPa - bank.ambientPa();
      }
      run[i] = pa;
    }
    return run;
  }
}

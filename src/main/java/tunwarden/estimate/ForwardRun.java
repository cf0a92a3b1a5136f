package tunwarden.estimate;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import tunwarden.estimate.bank.Ahead;
import tunwarden.estimate.bank.BankFilter;

/**
 * Where the pressure goes if everything stays as it is: the bank run forward without readings, with
 * the spread that comes from all it does not know. The temperature stays, no valve moves, and a
 * relief valve is not taken into account.
 */
public final class ForwardRun {
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
    double toGauge = bank.medium().vapourPa(bank.senses().smoothK()) - bank.ambientPa();
    Ahead ahead = new Ahead(new BankFilter(bank.medium()), bank.bank());
    List<ForwardPoint> points = new ArrayList<>();
    for (Duration at = Duration.ZERO; at.compareTo(horizon) <= 0; at = at.plus(step)) {
      if (!at.isZero()) {
        ahead.advance(step.toMillis() / 1000.0);
      }
      double[] dry = ahead.dryPressure();
      points.add(new ForwardPoint(at, dry[1] + toGauge, dry[0] + toGauge, dry[2] + toGauge));
    }
    return points;
  }
}

package tunwarden.forecast.vent;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.TimeRange;

/**
 * Steps and waits that let a vessel down without its supersaturation passing a bound. Each step
 * goes down until the bound is reached and waits there until three quarters of that excess have
 * left the liquid, which takes ln 4 over the transfer rate.
 *
 * @param stages the steps in order; empty when no gas has to leave
 * @param isComplete whether the target is reached within {@link #MOST_STAGES}
 */
public record StagedPlan(List<Stage> stages, boolean isComplete) {
  /** More steps than that nobody follows. */
  public static final int MOST_STAGES = 24;

  private static final double EXCESS_LEFT = 0.25;
  private static final double CLOSE_PA = 1;
  private static final int BISECTIONS = 50;

  /** Keeps its own copy. */
  public StagedPlan {
    stages = List.copyOf(stages);
  }

  /**
   * What a plan starts from.
   *
   * @param fromPaAbsolute pressure now, Pa absolute
   * @param toPaAbsolute pressure to end at, Pa absolute
   * @param ambientPaAbsolute atmosphere, Pa absolute
   * @param dissolvedKgPerM3 in the liquid now
   * @param liquidM3 liquid volume, m³
   * @param transferPerS kLa with its range, 1/s
   * @param equilibriumKgPerM3 what the liquid holds at rest, by pressure in Pa absolute
   * @param headspaceKg gas in the headspace, by pressure in Pa absolute
   */
  public record Start(
      double fromPaAbsolute,
      double toPaAbsolute,
      double ambientPaAbsolute,
      double dissolvedKgPerM3,
      double liquidM3,
      Spread transferPerS,
      DoubleUnaryOperator equilibriumKgPerM3,
      DoubleUnaryOperator headspaceKg) {}

  /**
   * The plan.
   *
   * @param bound highest supersaturation allowed, above 0
   */
  public static StagedPlan of(Start start, double bound) {
    List<Stage> stages = new ArrayList<>();
    double pa = start.fromPaAbsolute();
    double dissolved = start.dissolvedKgPerM3();
    while (pa > start.toPaAbsolute() + CLOSE_PA && stages.size() < MOST_STAGES) {
      double next = lowestAllowed(start, pa, dissolved / (1 + bound));
      double equilibrium = start.equilibriumKgPerM3().applyAsDouble(next);
      boolean last = next <= start.toPaAbsolute() + CLOSE_PA;
      double left = equilibrium * (1 + EXCESS_LEFT * bound);
      double follows = last ? 0 : Math.max(0, dissolved - left);
      stages.add(
          new Stage(
              next - start.ambientPaAbsolute(),
              dissolved / equilibrium - 1,
              start.headspaceKg().applyAsDouble(pa) - start.headspaceKg().applyAsDouble(next),
              follows * start.liquidM3(),
              last ? Optional.empty() : Optional.of(hold(start, dissolved, left, equilibrium))));
      dissolved -= follows;
      pa = next;
    }
    return new StagedPlan(stages, pa <= start.toPaAbsolute() + CLOSE_PA);
  }

  /** The lowest pressure at which the liquid may hold that much at rest; not above the present. */
  private static double lowestAllowed(Start start, double nowPa, double equilibriumKgPerM3) {
    double low = start.toPaAbsolute();
    if (start.equilibriumKgPerM3().applyAsDouble(low) >= equilibriumKgPerM3) {
      return low;
    }
    double high = nowPa;
    for (int i = 0; i < BISECTIONS && high - low > CLOSE_PA / 2; i++) {
      double middle = (low + high) / 2;
      if (start.equilibriumKgPerM3().applyAsDouble(middle) >= equilibriumKgPerM3) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return high;
  }

  private static TimeRange hold(Start start, double from, double to, double equilibrium) {
    double times = Math.max(0, Math.log((from - equilibrium) / (to - equilibrium)));
    Spread rate = start.transferPerS();
    return new TimeRange(
        seconds(times / rate.middle()),
        seconds(times / rate.high()),
        rate.low() > 0 ? Optional.of(seconds(times / rate.low())) : Optional.empty());
  }

  static Duration seconds(double seconds) {
    return Duration.ofMillis(Math.round(1000 * Math.min(seconds, 1e11)));
  }
}

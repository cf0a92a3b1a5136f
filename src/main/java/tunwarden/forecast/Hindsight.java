package tunwarden.forecast;

import java.time.Instant;
import java.util.OptionalDouble;

/**
 * What the readings so far have taught about how a vessel behaves, beside the estimator. Immutable;
 * each reading gives the next.
 *
 * @param rise how the gauge itself has been rising
 * @param warming how fast it warms when it does
 * @param gravity its apparent extract and how that falls
 */
public record Hindsight(RecentRise rise, WarmingHabit warming, GravityTrack gravity) {
  /** Nothing seen yet. */
  public static final Hindsight NONE =
      new Hindsight(RecentRise.NONE, WarmingHabit.NONE, GravityTrack.NONE);

  /** With one more pressure, Pa gauge. */
  public Hindsight pressure(Instant at, double paGauge) {
    return new Hindsight(rise.seen(at, paGauge), warming, gravity);
  }

  /**
   * With one more liquid temperature.
   *
   * @param at when
   * @param kelvin K
   * @param ambientK what the vessel would warm to, K, if known
   */
  public Hindsight temperature(Instant at, double kelvin, OptionalDouble ambientK) {
    WarmingHabit next = warming.seen(at, kelvin, ambientK);
    return next == warming ? this : new Hindsight(rise, next, gravity);
  }

  /** With one more gravity, degrees Plato. */
  public Hindsight gravity(Instant at, double plato) {
    return new Hindsight(rise, warming, gravity.seen(at, plato));
  }
}

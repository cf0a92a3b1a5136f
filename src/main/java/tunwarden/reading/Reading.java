package tunwarden.reading;

import java.time.Instant;
import java.util.Objects;

/**
 * One value.
 *
 * @param time when it was measured
 * @param vessel identity of the vessel
 * @param quantity what was measured
 * @param value finite, in SI as {@link Quantity} says for each
 * @param u95 expanded uncertainty (95 %) stated with this very value, in the unit of the value; 0
 *     where none was stated and the instrument's accuracy holds
 * @param quality how far it is to be believed
 */
public record Reading(
    Instant time, String vessel, Quantity quantity, double value, double u95, Quality quality)
    implements Sample {

  /** Refuses what is not a number, so that it cannot travel further. */
  public Reading {
    Objects.requireNonNull(time, "time");
    Objects.requireNonNull(vessel, "vessel");
    Objects.requireNonNull(quantity, "quantity");
    Objects.requireNonNull(quality, "quality");
    if (!Double.isFinite(value) || !Double.isFinite(u95) || u95 < 0) {
      throw new IllegalArgumentException(quantity.word() + " of " + value + " is not a reading");
    }
  }

  /** A good reading with the instrument's own accuracy. */
  public static Reading good(Instant time, String vessel, Quantity quantity, double value) {
    return new Reading(time, vessel, quantity, value, 0, Quality.GOOD);
  }

  /** The same value with another quality. */
  public Reading withQuality(Quality other) {
    return new Reading(time, vessel, quantity, value, u95, other);
  }
}

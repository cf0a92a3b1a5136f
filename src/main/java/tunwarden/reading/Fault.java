package tunwarden.reading;

import java.time.Instant;

/**
 * The absence of a value, with its reason.
 *
 * @param time when it was noticed
 * @param vessel identity of the vessel
 * @param quantity what could not be measured
 * @param quality a bad quality
 * @param detail what was seen, for a person; may be empty
 */
public record Fault(Instant time, String vessel, Quantity quantity, Quality quality, String detail)
    implements Sample {
  /** Refuses a fault that says all is well. */
  public Fault {
    if (!quality.isBad()) {
      throw new IllegalArgumentException("a fault needs a bad quality, not " + quality);
    }
  }
}

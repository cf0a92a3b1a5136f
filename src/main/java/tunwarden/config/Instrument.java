package tunwarden.config;

import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.units.Kind;
import tunwarden.wire.signal.Calibration;

/**
 * Where one quantity of a vessel is read, as the cellar file says it.
 *
 * @param vessel identity of the vessel
 * @param quantity what is read
 * @param device name of the device profile
 * @param port serial port
 * @param field which value of the device
 * @param address on the line, 1 to 247; empty for a device without one
 * @param every how often to ask; empty for the profile's own period
 * @param baud line speed; empty for the profile's own
 * @param worth how good it is
 */
public record Instrument(
    String vessel,
    Quantity quantity,
    String device,
    String port,
    String field,
    Optional<Integer> address,
    Optional<Duration> every,
    Optional<Integer> baud,
    Worth worth) {
  /**
   * How good an instrument is.
   *
   * @param accuracyU95 as a 95 % expanded uncertainty, SI; empty where not stated
   * @param calibration what it showed against what was true; empty where not stated
   * @param check whether it is the second of a pair, which only vouches for the first
   * @param outOfService why it is not read at present; empty when it is
   */
  public record Worth(
      OptionalDouble accuracyU95,
      Optional<Calibration> calibration,
      boolean check,
      Optional<String> outOfService) {}

  /** The same instrument read for another vessel. */
  Instrument forVessel(String id) {
    return new Instrument(id, quantity, device, port, field, address, every, baud, worth);
  }

  /** What stands for an instrument that is out of service: that there is no value, and why. */
  public Optional<Fault> outOfService(Instant now) {
    return worth
        .outOfService
        .filter(why -> !worth.check)
        .map(why -> new Fault(now, vessel, quantity, Quality.OUT_OF_SERVICE, why));
  }

  /** Accuracy as a 95 % expanded uncertainty, SI; empty where not stated. */
  public OptionalDouble accuracyU95() {
    return worth.accuracyU95;
  }

  /** The stated accuracy of the instrument for pressure or for liquid temperature. */
  static OptionalDouble accuracy(List<Instrument> all, Kind kind) {
    Quantity wanted = kind == Kind.PRESSURE ? Quantity.PRESSURE : Quantity.TEMPERATURE;
    return all.stream()
        .filter(instrument -> instrument.quantity == wanted && !instrument.worth.check)
        .map(Instrument::accuracyU95)
        .findFirst()
        .orElse(OptionalDouble.empty());
  }
}

package tunwarden.config;

import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.reading.Quantity;
import tunwarden.units.Kind;

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
 * @param accuracyU95 as a 95 % expanded uncertainty, SI; empty where not stated
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
    OptionalDouble accuracyU95) {

  /** The same instrument read for another vessel. */
  Instrument forVessel(String id) {
    return new Instrument(id, quantity, device, port, field, address, every, baud, accuracyU95);
  }

  /** The stated accuracy of the instrument for pressure or for liquid temperature. */
  static OptionalDouble accuracy(List<Instrument> all, Kind kind) {
    Quantity wanted = kind == Kind.PRESSURE ? Quantity.PRESSURE : Quantity.TEMPERATURE;
    return all.stream()
        .filter(instrument -> instrument.quantity == wanted)
        .map(Instrument::accuracyU95)
        .findFirst()
        .orElse(OptionalDouble.empty());
  }
}

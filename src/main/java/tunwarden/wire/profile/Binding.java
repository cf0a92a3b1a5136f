package tunwarden.wire.profile;

import java.time.Duration;
import tunwarden.reading.Quantity;
import tunwarden.wire.signal.Calibration;

/**
 * One field of one instrument put to one quantity of one vessel: an entry of the cellar file.
 *
 * @param vessel identity of the vessel
 * @param quantity what it measures there; of the field's kind
 * @param profile how the instrument speaks
 * @param field which of its values
 * @param slave address on the line, 1 to 247; 0 for an instrument without one
 * @param trim calibration and period of this place
 */
public record Binding(
    String vessel, Quantity quantity, Profile profile, Field field, int slave, Trim trim) {
  /**
   * What belongs to this one instrument rather than to its kind.
   *
   * @param calibration two-point calibration
   * @param ambientPa absolute pressure of the atmosphere, Pa, to turn absolute into gauge
   * @param period between readings
   * @param u95Si accuracy as a 95 % expanded uncertainty, SI difference
   */
  public record Trim(Calibration calibration, double ambientPa, Duration period, double u95Si) {}

  /**
   * A binding by field name with the profile's period and no calibration.
   *
   * @throws IllegalArgumentException when the profile has no such field or it measures another kind
   */
  public static Binding plain(
      String vessel, Quantity quantity, Profile profile, String field, double ambientPa) {
    Field found = profile.field(field).orElseThrow(() -> new IllegalArgumentException(field));
    Duration period = profile.polling().period();
    Trim trim = new Trim(Calibration.NONE, ambientPa, period, found.trust().u95Si());
    return new Binding(vessel, quantity, profile, found, 0, trim);
  }

  /**
   * Refuses a field that measures something else, and a Modbus instrument without an address.
   *
   * @throws IllegalArgumentException with a sentence for the user
   */
  public Binding {
    if (profile.speaks() == Speaks.MODBUS_RTU && (slave < 1 || slave > 247)) {
      throw new IllegalArgumentException(
          profile.name() + " speaks Modbus and needs its address on the line, 1 to 247");
    }
    if (field.kind() != quantity.kind()) {
      throw new IllegalArgumentException(
          "field '"
              + field.name()
              + "' of "
              + profile.name()
              + " gives "
              + field.kind().words()
              + ", not "
              + quantity.kind().words());
    }
  }
}

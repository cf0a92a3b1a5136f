package tunwarden.wire.signal;

import tunwarden.units.Extract;
import tunwarden.units.Unit;

/**
 * The instrument sends the quantity itself, in a unit.
 *
 * @param unit the unit of the number after scale and offset
 */
public record Linear(Unit unit) implements Conversion {
  @Override
  public Decoded toSi(double scaled) {
    if (unit == Unit.SPECIFIC_GRAVITY) {
      return Decoded.good(Extract.platoFromGravity(scaled));
    }
    return Decoded.good(unit.toSi(scaled));
  }

  @Override
  public double fromSi(double si) {
    return unit == Unit.SPECIFIC_GRAVITY ? Extract.gravityFromPlato(si) : unit.fromSi(si);
  }
}

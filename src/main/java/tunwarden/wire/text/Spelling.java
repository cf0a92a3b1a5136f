package tunwarden.wire.text;

import tunwarden.units.BadQuantityException;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.wire.profile.Field;
import tunwarden.wire.signal.Linear;

/**
 * What may stand behind a number. An instrument whose unit was changed at its keys must not be read
 * in the old one, so a unit that is not the profile's makes the number unreadable.
 */
final class Spelling {
  private static final int LONGEST = 8;

  private Spelling() {}

  /** Whether a word is a unit of any kind. */
  static boolean isUnit(String word) {
    if (word.isEmpty() || word.length() > LONGEST || Character.isDigit(word.charAt(0))) {
      return false;
    }
    for (Kind kind : Kind.values()) {
      boolean plain = kind != Kind.NUMBER && Quantities.unitOf(word, kind).isPresent();
      if (plain || (kind == Kind.PRESSURE && pressure(word) != null)) {
        return true;
      }
    }
    return false;
  }

  /** Whether what follows the number is what the profile says, or its own unit. */
  static boolean isAllowed(String rest, Field field) {
    if (!field.number().suffix().isEmpty() || rest.isEmpty()) {
      return rest.equals(field.number().suffix());
    }
    if (!(field.conversion() instanceof Linear linear) || rest.length() > LONGEST) {
      return false;
    }
    if (field.kind() == Kind.PRESSURE) {
      return new Pressure(linear.unit().toSi(1), field.reference()).equals(pressure(rest));
    }
    return Quantities.unitOf(rest, field.kind()).orElse(null) == linear.unit();
  }

  private static Pressure pressure(String unit) {
    try {
      return Pressure.parse("1 " + unit);
    } catch (BadQuantityException e) {
      return null;
    }
  }
}

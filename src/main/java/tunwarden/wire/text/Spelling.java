package tunwarden.wire.text;

import java.util.Optional;
import tunwarden.units.Kind;
import tunwarden.units.Pressure;
import tunwarden.units.Quantities;
import tunwarden.units.Unit;
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
      if (kind != Kind.NUMBER && Quantities.unitOf(word, kind).isPresent()) {
        return true;
      }
    }
    return pressureUnit(word).isPresent();
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
      return pressureUnit(rest)
          .equals(Optional.of(new PressureUnit(linear.unit(), field.reference())));
    }
    return Quantities.unitOf(rest, field.kind()).orElse(null) == linear.unit();
  }

  /** A pressure unit and what it counts from: {@code bar} and {@code barg} are gauge. */
  private record PressureUnit(Unit unit, Pressure.Reference reference) {}

  private static Optional<PressureUnit> pressureUnit(String word) {
    Optional<Unit> plain = Quantities.unitOf(word, Kind.PRESSURE);
    if (plain.isPresent()) {
      return plain.map(unit -> new PressureUnit(unit, Pressure.Reference.GAUGE));
    }
    Pressure.Reference reference =
        word.endsWith("a") ? Pressure.Reference.ABSOLUTE : Pressure.Reference.GAUGE;
    if (!word.endsWith("a") && !word.endsWith("g")) {
      return Optional.empty();
    }
    return Quantities.unitOf(word.substring(0, word.length() - 1), Kind.PRESSURE)
        .map(unit -> new PressureUnit(unit, reference));
  }
}

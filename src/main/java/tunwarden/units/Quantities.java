package tunwarden.units;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads quantities written with their unit: {@code "4 C"}, {@code "900 L"}, {@code "5.2 %"}. */
public final class Quantities {
  private static final Pattern NUMBER_AND_UNIT =
      Pattern.compile("\\s*([+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d+)?)\\s*(\\S*)\\s*");

  private Quantities() {}

  /** A number and the unit spelled after it. */
  record Written(double value, String unit) {}

  /**
   * The SI value of a quantity of the given kind. Gas content comes back in kg/m³, extract in
   * degrees Plato, a share as 0..1.
   *
   * @throws BadQuantityException when the text is no number, has no unit or one of another kind
   */
  public static double parse(String text, Kind kind) {
    if (kind == Kind.PRESSURE) {
      throw new IllegalArgumentException(
          "use Pressure.parse: gauge and absolute must be told apart");
    }
    Written written = split(text, kind);
    Unit unit = unitOf(written.unit(), kind).orElseThrow(() -> noSuchUnit(text, written, kind));
    if (kind == Kind.EXTRACT) {
      return unit == Unit.PLATO ? written.value() : Extract.platoFromGravity(written.value());
    }
    return unit.toSi(written.value());
  }

  /** The unit of that kind with that symbol, if there is one. */
  public static Optional<Unit> unitOf(String symbol, Kind kind) {
    for (Unit unit : Unit.values()) {
      if (unit.kind() == kind && unit.isWritten(symbol)) {
        return Optional.of(unit);
      }
    }
    return Optional.empty();
  }

  static Written split(String text, Kind kind) {
    Matcher matcher = NUMBER_AND_UNIT.matcher(text);
    if (!matcher.matches()) {
      throw new BadQuantityException(
          "'"
              + text
              + "' is not "
              + kind.words()
              + "; write a number with one of "
              + kind.symbols());
    }
    double value = Double.parseDouble(matcher.group(1));
    if (!Double.isFinite(value)) {
      throw new BadQuantityException("'" + text + "' is too large to be " + kind.words());
    }
    return new Written(value, matcher.group(2));
  }

  static BadQuantityException noSuchUnit(String text, Written written, Kind kind) {
    if (written.unit().startsWith(",")) {
      return new BadQuantityException(
          "'" + text + "' has a comma in it; write the decimal point as '.'");
    }
    String problem =
        written.unit().isEmpty() ? "has no unit" : "has the unit '" + written.unit() + "'";
    return new BadQuantityException(
        "'" + text + "' " + problem + "; for " + kind.words() + " use one of " + kind.symbols());
  }
}

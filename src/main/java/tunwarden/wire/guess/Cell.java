package tunwarden.wire.guess;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tunwarden.units.Kind;
import tunwarden.units.Quantities;

/**
 * A number found in a line, and what it seems to be.
 *
 * @param name key, or column number
 * @param kind what it seems to measure; empty when nothing tells
 * @param unit unit symbol it seems to be in
 * @param suffix what stands behind the number and is not its unit
 * @param example the number as it stood
 */
public record Cell(String name, Optional<Kind> kind, String unit, String suffix, String example) {
  private static final Pattern NUMBER =
      Pattern.compile("([+-]?\\d{0,12}[.,]?\\d{1,12}(?:[eE][+-]?\\d{1,2})?)\\s*(\\D{0,8})");

  /** What a cell of text seems to be; empty when it is no number. */
  static Optional<Cell> of(String name, String text) {
    Matcher matcher = NUMBER.matcher(text.strip());
    if (!matcher.matches()) {
      return Optional.empty();
    }
    String rest = matcher.group(2).strip();
    Optional<Kind> byUnit = kindOfUnit(rest);
    Optional<Kind> kind = byUnit.isPresent() ? byUnit : kindOfName(name);
    String unit = byUnit.isPresent() ? rest : kind.map(Cell::usualUnit).orElse("");
    return Optional.of(
        new Cell(name, kind, unit, byUnit.isPresent() ? "" : rest, matcher.group(1)));
  }

  private static Optional<Kind> kindOfUnit(String unit) {
    String bare = unit.replaceAll("(?<=.)[ga]$", "");
    if (Quantities.unitOf(unit, Kind.PRESSURE).isPresent()
        || Quantities.unitOf(bare, Kind.PRESSURE).isPresent()) {
      return Optional.of(Kind.PRESSURE);
    }
    return Quantities.unitOf(unit, Kind.TEMPERATURE).map(found -> Kind.TEMPERATURE);
  }

  /** By the first letters that most languages of the trade share. */
  private static Optional<Kind> kindOfName(String name) {
    String low = name.toLowerCase(Locale.ROOT);
    if (low.startsWith("p") || low.contains("druck")) {
      return Optional.of(Kind.PRESSURE);
    }
    return low.startsWith("t") ? Optional.of(Kind.TEMPERATURE) : Optional.empty();
  }

  private static String usualUnit(Kind kind) {
    return kind == Kind.PRESSURE ? "bar" : "C";
  }

  /** The same cell taken for that kind. */
  Cell as(Kind other) {
    return new Cell(name, Optional.of(other), usualUnit(other), suffix, example);
  }
}

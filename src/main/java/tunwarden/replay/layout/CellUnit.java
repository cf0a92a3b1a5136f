package tunwarden.replay.layout;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import tunwarden.reading.Quantity;
import tunwarden.units.Extract;
import tunwarden.units.Kind;
import tunwarden.units.Unit;

/**
 * The unit a log column is written in, also the loose spellings that loggers use.
 *
 * @param kind what it measures
 * @param symbol how we print it
 * @param scale SI per unit
 * @param offset added after scaling
 * @param absolute for pressures: whether the spelling says absolute
 * @param gauge for pressures: whether the spelling says gauge
 */
public record CellUnit(
    Kind kind, String symbol, double scale, double offset, boolean absolute, boolean gauge) {

  /** Spellings beyond those of {@link Unit}; conversion factors from NIST SP 811, appendix B.8. */
  private static final List<CellUnit> FOREIGN =
      List.of(
          pressure("hpa", 100),
          pressure("mbar", 100),
          pressure("kg/cm2", 98_066.5),
          pressure("kgf/cm2", 98_066.5),
          pressure("at", 98_066.5),
          pressure("torr", 133.322),
          pressure("mmhg", 133.322),
          pressure("inhg", 3386.389),
          pressure("psi", Unit.PSI.toSi(1)),
          pressure("lb/in2", Unit.PSI.toSi(1)));

  private static CellUnit pressure(String symbol, double scale) {
    return new CellUnit(Kind.PRESSURE, symbol, scale, 0, false, false);
  }

  /** The unit our own format fixes for a quantity. */
  public static CellUnit nativeOf(Quantity quantity) {
    return switch (quantity) {
      case PRESSURE -> of(Unit.BAR).asGauge();
      case BAROMETER -> of(Unit.BAR).asAbsolute();
      case TEMPERATURE, HEADSPACE_TEMPERATURE -> of(Unit.CELSIUS);
      case LEVEL -> of(Unit.LITRE);
      case GRAVITY -> of(Unit.SPECIFIC_GRAVITY);
      case DISSOLVED -> of(Unit.GRAM_PER_LITRE);
    };
  }

  /** A unit of the program, as a column unit. */
  public static CellUnit of(Unit unit) {
    double offset = unit.toSi(0);
    return new CellUnit(unit.kind(), unit.symbol(), unit.toSi(1) - offset, offset, false, false);
  }

  /**
   * Reads a loose spelling such as {@code "barg"}, {@code "Bar (a)"}, {@code "°F"}, {@code "psi
   * abs"}; nothing when it is no unit we know.
   */
  public static Optional<CellUnit> parse(String written, Kind kind) {
    String plain = written.trim().replace("deg ", "deg").replace("Deg", "deg");
    Optional<CellUnit> exact = known(plain, kind);
    if (exact.isPresent() || kind != Kind.PRESSURE) {
      return exact;
    }
    String small = plain.toLowerCase(Locale.ROOT).replaceAll("[\\s_().]", "");
    for (String tail : List.of("gauge", "rel", "g")) {
      if (small.endsWith(tail)) {
        Optional<CellUnit> unit = known(small.substring(0, small.length() - tail.length()), kind);
        if (unit.isPresent()) {
          return unit.map(CellUnit::asGauge);
        }
      }
    }
    for (String tail : List.of("absolute", "abs", "a")) {
      if (small.endsWith(tail)) {
        Optional<CellUnit> unit = known(small.substring(0, small.length() - tail.length()), kind);
        if (unit.isPresent()) {
          return unit.map(CellUnit::asAbsolute);
        }
      }
    }
    return Optional.empty();
  }

  private static Optional<CellUnit> known(String text, Kind kind) {
    String small = text.toLowerCase(Locale.ROOT);
    for (Unit unit : Unit.values()) {
      boolean same = unit.kind() == kind && unit.symbol().toLowerCase(Locale.ROOT).equals(small);
      if (same || spelled(small, unit, kind)) {
        return Optional.of(of(unit));
      }
    }
    return FOREIGN.stream().filter(u -> u.kind == kind && u.symbol.equals(small)).findFirst();
  }

  private static boolean spelled(String small, Unit unit, Kind kind) {
    if (unit.kind() != kind) {
      return false;
    }
    List<String> spellings =
        switch (unit) {
          case CELSIUS -> List.of("°c", "degc", "º c", "ºc", "celsius", "grad c", "grad");
          case FAHRENHEIT -> List.of("°f", "degf", "ºf", "fahrenheit");
          case KELVIN -> List.of("kelvin");
          case PSI -> List.of("lbf/in2", "psi");
          case LITRE -> List.of("liter", "litre", "litres", "liters");
          case CUBIC_METRE -> List.of("m³", "m^3", "cbm");
          case PLATO -> List.of("°p", "plato", "ºp");
          case GRAM_PER_LITRE -> List.of("g/l");
          case VOLUMES -> List.of("vols", "v/v");
          default -> List.of();
        };
    return spellings.contains(small);
  }

  /** The same, stated to count from the atmosphere. */
  public CellUnit asGauge() {
    return new CellUnit(kind, symbol, scale, offset, false, true);
  }

  /** The same, stated to count from vacuum. */
  public CellUnit asAbsolute() {
    return new CellUnit(kind, symbol, scale, offset, true, false);
  }

  /** The SI value; degrees Plato for an extract, as everywhere. */
  public double toSi(double value) {
    if (symbol.equals(Unit.SPECIFIC_GRAVITY.symbol())) {
      return Extract.platoFromGravity(value);
    }
    return value * scale + offset;
  }

  /** A difference or uncertainty in SI. */
  public double differenceToSi(double value) {
    return value * scale;
  }

  /** For sentences: {@code "psi absolute"}, {@code "°F"}. */
  public String words() {
    if (kind == Kind.PRESSURE) {
      return symbol + (absolute ? " absolute" : " gauge");
    }
    return kind == Kind.TEMPERATURE && offset != 0 || symbol.equals("F") ? "°" + symbol : symbol;
  }
}

package tunwarden.units;

import java.util.List;

/**
 * The units the program reads and writes. Value in SI = written value × scale + offset; the extract
 * units, which are not linear in each other, are converted by {@link Extract}.
 */
public enum Unit {
  PA(Kind.PRESSURE, "Pa", 1),
  BAR(Kind.PRESSURE, "bar", 1e5),
  MBAR(Kind.PRESSURE, "mbar", 1e2),
  KPA(Kind.PRESSURE, "kPa", 1e3),
  MPA(Kind.PRESSURE, "MPa", 1e6),
  PSI(Kind.PRESSURE, "psi", 6894.757293168361),
  ATM(Kind.PRESSURE, "atm", Constants.STANDARD_ATMOSPHERE_PA),

  CELSIUS(Kind.TEMPERATURE, "C", 1, Constants.ZERO_CELSIUS_K, List.of("°C", "degC")),
  FAHRENHEIT(
      Kind.TEMPERATURE,
      "F",
      5.0 / 9,
      Constants.ZERO_CELSIUS_K - 32 * 5.0 / 9,
      List.of("°F", "degF")),
  KELVIN(Kind.TEMPERATURE, "K", 1),

  CELSIUS_DIFFERENCE(Kind.TEMPERATURE_DIFFERENCE, "C", 1, 0, List.of("°C", "K", "degC")),
  FAHRENHEIT_DIFFERENCE(Kind.TEMPERATURE_DIFFERENCE, "F", 5.0 / 9, 0, List.of("°F", "degF")),

  CUBIC_METRE(Kind.VOLUME, "m3", 1, 0, List.of("m³")),
  LITRE(Kind.VOLUME, "L", 1e-3, 0, List.of("l")),
  HECTOLITRE(Kind.VOLUME, "hL", 0.1, 0, List.of("hl")),
  MILLILITRE(Kind.VOLUME, "mL", 1e-6, 0, List.of("ml")),

  GRAM_PER_LITRE(Kind.GAS_CONTENT, "g/L", 1, 0, List.of("g/l")),
  VOLUMES(Kind.GAS_CONTENT, "vol", Constants.CO2_VOLUME_KG_PER_M3),
  MASS_PERCENT(Kind.GAS_CONTENT, "%mass", 10),

  PLATO(Kind.EXTRACT, "P", 1, 0, List.of("°P")),
  SPECIFIC_GRAVITY(Kind.EXTRACT, "SG", 1),

  PERCENT(Kind.FRACTION, "%", 0.01),

  METRE(Kind.LENGTH, "m", 1),
  CENTIMETRE(Kind.LENGTH, "cm", 1e-2),
  MILLIMETRE(Kind.LENGTH, "mm", 1e-3),
  FOOT(Kind.LENGTH, "ft", 0.3048),
  INCH(Kind.LENGTH, "in", 0.0254),

  SQUARE_METRE(Kind.AREA, "m2", 1, 0, List.of("m²")),
  SQUARE_FOOT(Kind.AREA, "ft2", 0.09290304, 0, List.of("ft²")),

  SECOND(Kind.DURATION, "s", 1),
  MILLISECOND(Kind.DURATION, "ms", 1e-3),
  MINUTE(Kind.DURATION, "min", 60),
  HOUR(Kind.DURATION, "h", 3600),
  DAY(Kind.DURATION, "d", 86_400),

  PER_HOUR(Kind.RATE, "/h", 1.0 / 3600),
  PER_SECOND(Kind.RATE, "/s", 1),

  KILOGRAM_PER_HOUR(Kind.MASS_FLOW, "kg/h", 1.0 / 3600),

  MOL_PER_LITRE(Kind.MOLARITY, "mol/L", 1e3, 0, List.of("mol/l")),

  MILLIAMPERE(Kind.CURRENT, "mA", 1e-3),
  AMPERE(Kind.CURRENT, "A", 1),

  OHM(Kind.RESISTANCE, "ohm", 1, 0, List.of("Ω")),

  ONE(Kind.NUMBER, "1", 1);

  private final Kind kind;
  private final String symbol;
  private final double scale;
  private final double offset;
  private final List<String> otherSpellings;

  Unit(Kind kind, String symbol, double scale) {
    this(kind, symbol, scale, 0, List.of());
  }

  Unit(Kind kind, String symbol, double scale, double offset, List<String> otherSpellings) {
    this.kind = kind;
    this.symbol = symbol;
    this.scale = scale;
    this.offset = offset;
    this.otherSpellings = otherSpellings;
  }

  public Kind kind() {
    return kind;
  }

  public String symbol() {
    return symbol;
  }

  /** The SI value of {@code value} written in this unit. */
  public double toSi(double value) {
    return value * scale + offset;
  }

  /** {@code si} expressed in this unit. */
  public double fromSi(double si) {
    return (si - offset) / scale;
  }

  /** A difference (an uncertainty, a margin) of {@code si} expressed in this unit. */
  public double differenceFromSi(double si) {
    return si / scale;
  }

  /** A difference written in this unit, in SI: no zero offset is applied. */
  public double differenceToSi(double value) {
    return value * scale;
  }

  boolean isWritten(String text) {
    return symbol.equals(text) || otherSpellings.contains(text);
  }
}

package tunwarden.units;

/**
 * A pressure that knows whether it is gauge or absolute, as a person writes it. Inside the program
 * bare doubles carry the word in their name instead.
 *
 * @param pa value in pascal
 * @param reference what it is counted from
 */
public record Pressure(double pa, Reference reference) {
  /** What a pressure is counted from. */
  public enum Reference {
    GAUGE,
    ABSOLUTE
  }

  public static Pressure gauge(double pa) {
    return new Pressure(pa, Reference.GAUGE);
  }

  public static Pressure absolute(double pa) {
    return new Pressure(pa, Reference.ABSOLUTE);
  }

  /** In pascal absolute, given the ambient pressure in pascal absolute. */
  public double absolutePa(double ambientPa) {
    return reference == Reference.ABSOLUTE ? pa : pa + ambientPa;
  }

  /** In pascal gauge, given the ambient pressure in pascal absolute. */
  public double gaugePa(double ambientPa) {
    return reference == Reference.GAUGE ? pa : pa - ambientPa;
  }

  /**
   * Reads {@code "1.0 bar"} (gauge), {@code "1.0barg"}, {@code "2.01 bara"}, {@code "14.5 psig"}.
   *
   * @throws BadQuantityException when the text is not a pressure with its unit
   */
  public static Pressure parse(String text) {
    Quantities.Written written = Quantities.split(text, Kind.PRESSURE);
    String symbol = written.unit();
    for (Unit unit : Unit.values()) {
      if (unit.kind() != Kind.PRESSURE) {
        continue;
      }
      double pa = unit.toSi(written.value());
      if (symbol.equals(unit.symbol()) || symbol.equals(unit.symbol() + "g")) {
        return gauge(pa);
      }
      if (symbol.equals(unit.symbol() + "a")) {
        return absolute(pa);
      }
    }
    throw Quantities.noSuchUnit(text, written, Kind.PRESSURE);
  }
}

package tunwarden.units;

import java.util.Locale;

/**
 * The units a person has chosen to look at, and how numbers are printed in them. No locale ever
 * changes the output.
 *
 * @param pressure unit for every pressure
 * @param temperature unit for every temperature
 * @param gasContent unit for dissolved gas
 */
public record Display(Unit pressure, Unit temperature, Unit gasContent) {
  /** bar, °C, g/L. */
  public static final Display METRIC = new Display(Unit.BAR, Unit.CELSIUS, Unit.GRAM_PER_LITRE);

  /** psi, °F, volumes. */
  public static final Display US = new Display(Unit.PSI, Unit.FAHRENHEIT, Unit.VOLUMES);

  /** kPa, °C, volumes. */
  public static final Display SI = new Display(Unit.KPA, Unit.CELSIUS, Unit.VOLUMES);

  /** The next choice in the cycle metric, US, SI. */
  public Display next() {
    if (equals(METRIC)) {
      return US;
    }
    return equals(US) ? SI : METRIC;
  }

  /** Pressure or pressure difference as a bare number, with as many decimals as a gauge shows. */
  public String pressureNumber(double pa) {
    return number(pressure.differenceFromSi(pa), pressureDecimals());
  }

  /** Pressure difference with a leading sign, for distances on the ladder. */
  public String signedPressureNumber(double pa) {
    String text = pressureNumber(Math.abs(pa));
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    return (pa < 0 && !zero ? "-" : "+") + text;
  }

  /** Gauge pressure with its unit: {@code 0.88 bar g}. */
  public String gauge(double paGauge) {
    return pressureNumber(paGauge) + " " + pressure.symbol() + " g";
  }

  /** A pressure difference with its unit: {@code 0.50 bar}. */
  public String pressureDifference(double pa) {
    return pressureNumber(pa) + " " + pressure.symbol();
  }

  /** Temperature with its unit: {@code 4.2 °C}. */
  public String temperature(double kelvin) {
    return number(temperature.fromSi(kelvin), 1) + " °" + temperature.symbol();
  }

  /** Temperature difference with its unit. */
  public String temperatureDifference(double kelvin) {
    return number(temperature.differenceFromSi(kelvin), 1) + " °" + temperature.symbol();
  }

  /** Gas content as a bare number. */
  public String gasContentNumber(double kgPerM3) {
    return number(gasContent.fromSi(kgPerM3), 2);
  }

  /** Gas content with its unit: {@code 5.31 g/L}. */
  public String gasContent(double kgPerM3) {
    return gasContentNumber(kgPerM3) + " " + gasContent.symbol();
  }

  /** Fixed decimals, decimal point, never "-0.00". */
  public static String number(double value, int decimals) {
    if (!Double.isFinite(value)) {
      return "?";
    }
    String text = String.format(Locale.ROOT, "%." + decimals + "f", value);
    boolean zero = text.chars().noneMatch(c -> c >= '1' && c <= '9');
    return zero && text.startsWith("-") ? text.substring(1) : text;
  }

  private int pressureDecimals() {
    return switch (pressure) {
      case BAR, MPA, ATM -> 2;
      case PSI, KPA -> 1;
      default -> 0;
    };
  }
}

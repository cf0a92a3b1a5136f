package tunwarden.units;

/** Constants that every package shares, each defined once. */
public final class Constants {
  /** 0 °C in kelvin (definition of the Celsius scale, SI Brochure). */
  public static final double ZERO_CELSIUS_K = 273.15;

  /** Standard atmosphere in pascal absolute (10th CGPM, 1954). */
  public static final double STANDARD_ATMOSPHERE_PA = 101_325.0;

  /** Molar gas constant in J/(mol·K), exact since the 2019 SI. */
  public static final double GAS_CONSTANT = 8.314462618;

  /** Standard acceleration of free fall in m/s² (3rd CGPM, 1901). */
  public static final double STANDARD_GRAVITY = 9.80665;

  /**
   * Mass of CO2 in one "volume" of carbonation, kg/m³ of liquid: the real gas at 0 °C and 1 atm
   * (Span and Wagner 1996).
   */
  public static final double CO2_VOLUME_KG_PER_M3 = 1.97681;

  /** The same by the ideal gas law, 44.0095 g/mol over 22.414 L/mol. */
  public static final double CO2_IDEAL_VOLUME_KG_PER_M3 = 1.9635;

  private Constants() {}
}

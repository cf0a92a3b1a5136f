package tunwarden.forecast.ferment;

/**
 * How fast a fermentation makes gas, as CO2 per liquid and time. A drop of one degree Plato
 * apparent extract a day is 0.163 g/L/h: Balling's 0.9565/2.0665, 0.8192 real for apparent, density
 * 1.03.
 *
 * @param lowKgPerM3PerS lower end of the 95 % range
 * @param middleKgPerM3PerS median
 * @param highKgPerM3PerS upper end
 */
public record FermentationRate(
    double lowKgPerM3PerS, double middleKgPerM3PerS, double highKgPerM3PerS) {
  private static final double BEER_KG_PER_M3 = 1030;
  private static final double CO2_PER_REAL_EXTRACT = 0.9565 / 2.0665;
  private static final double REAL_PER_APPARENT = 0.8192;
  private static final double DAY_S = 86_400;
  private static final double GRAVITY_READING_U95 = 0.2;

  /**
   * 10 degrees Plato a day: no ordinary brew is faster. Labels from memory, conversion computed.
   */
  public static final double SCREENING_KG_PER_M3_PER_S = ofDrop(10);

  /**
   * Nothing known: from a slow tail (half a degree Plato a day) to the screening bound, most likely
   * a typical lager peak.
   */
  public static final FermentationRate UNKNOWN =
      new FermentationRate(ofDrop(0.5), ofDrop(2), SCREENING_KG_PER_M3_PER_S);

  /** CO2 made, kg/m³/s, when the apparent extract falls by that many degrees Plato a day. */
  public static double ofDrop(double platoPerDay) {
    return platoPerDay / 100 * REAL_PER_APPARENT * BEER_KG_PER_M3 * CO2_PER_REAL_EXTRACT / DAY_S;
  }

  /** A measured fall of the apparent extract, trusted to a fifth. */
  public static FermentationRate stated(double platoPerDay) {
    double rate = ofDrop(platoPerDay);
    return new FermentationRate(
        rate * (1 - GRAVITY_READING_U95), rate, rate * (1 + GRAVITY_READING_U95));
  }
}

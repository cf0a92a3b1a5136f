package tunwarden.forecast.ferment;

import tunwarden.units.Extract;

/**
 * Balling's balance of alcoholic fermentation: 2.0665 g extract give 1 g ethanol, 0.9565 g CO2 and
 * 0.11 g yeast solids. The constants 2.0665, 0.010665, 0.1808 and 0.8192 are those of ASBC Beer-33;
 * 0.9565 and 0.11 from memory. Historical review and data: Cutaia, Reid and Speers, J. Inst. Brew.
 * 115 (2009) 318-327.
 */
public final class Balling {
  /** How far real fermentations stray from the balance, 95 %, by judgement. */
  public static final double RELATIVE_U95 = 0.05;

  private static final double EXTRACT_PER_ALCOHOL = 2.0665;
  private static final double EXTRACT_SLOPE = 0.010665;
  private static final double CO2_PER_ALCOHOL = 0.9565;
  private static final double REAL_OF_ORIGINAL = 0.1808;
  private static final double REAL_OF_APPARENT = 0.8192;
  private static final double WATER_20C_KG_PER_M3 = 998.207;
  private static final double PERCENT = 100;

  private Balling() {}

  /** Real extract, g per 100 g beer, from original and apparent extract in degrees Plato. */
  public static double realExtract(double originalPlato, double apparentPlato) {
    return REAL_OF_ORIGINAL * originalPlato + REAL_OF_APPARENT * apparentPlato;
  }

  /** Alcohol, g per 100 g beer. */
  public static double alcoholByMass(double originalPlato, double apparentPlato) {
    return (originalPlato - realExtract(originalPlato, apparentPlato))
        / (EXTRACT_PER_ALCOHOL - EXTRACT_SLOPE * originalPlato);
  }

  /** CO2 made since the start, g per 100 g beer. */
  public static double co2ByMass(double originalPlato, double apparentPlato) {
    return CO2_PER_ALCOHOL * alcoholByMass(originalPlato, apparentPlato);
  }

  /**
   * CO2 still to come, kg per m³ of the liquid as it is now (g/L).
   *
   * @param originalPlato extract before fermentation, degrees Plato
   * @param nowPlato apparent extract now, degrees Plato
   * @param finalPlato apparent extract when it will have ended, degrees Plato
   */
  public static double co2ToCome(double originalPlato, double nowPlato, double finalPlato) {
    double shrink = beerPerWort(originalPlato, finalPlato) / beerPerWort(originalPlato, nowPlato);
    double perMassNow =
        co2ByMass(originalPlato, finalPlato) * shrink - co2ByMass(originalPlato, nowPlato);
    double densityNow = Extract.gravityFromPlato(nowPlato) * WATER_20C_KG_PER_M3;
    return perMassNow / PERCENT * densityNow;
  }

  /** Mass of beer left from one mass of wort: what became CO2 and yeast has left it. */
  private static double beerPerWort(double originalPlato, double apparentPlato) {
    double gone = EXTRACT_PER_ALCOHOL - 1;
    return 1 / (1 + gone * alcoholByMass(originalPlato, apparentPlato) / PERCENT);
  }
}

package tunwarden.physics.liquid;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;
import tunwarden.units.Extract;

/**
 * Density of sugar in water: degrees Plato at 20 °C, carried to other temperatures by giving water
 * its own expansion and sugar one of its own.
 */
public final class SugarWater {
  /** What is known about it. */
  public static final Correlation ABOUT =
      new Correlation(
          "sugar-water density",
          "degrees Plato against specific gravity 20/20 C; expansion of dissolved sucrose 0.34"
              + " mm3/(g K)",
          Validity.ofCelsiusAndBar(0, 60, 0, 20),
          "0.1 kg/m3 at 20 C to 20 P; about 0.5 kg/m3 at 0 and 60 C",
          Correlation.Standing.FROM_MEMORY);

  private static final double REFERENCE_K = 20 + Constants.ZERO_CELSIUS_K;
  private static final double WATER_AT_20C = Kell1975.kgPerM3(REFERENCE_K);
  private static final double SUGAR_EXPANSION_M3_PER_KG_K = 3.4e-7;
  private static final double LEAST_PLATO = 1e-9;

  private final double share;
  private final double m3PerKgAt20C;

  private SugarWater(double plato) {
    share = Math.max(0, plato) / 100;
    double at20 = WATER_AT_20C * gravityAt20C(plato);
    m3PerKgAt20C = plato < LEAST_PLATO ? 0 : (1 / at20 - (1 - share) / WATER_AT_20C) / share;
  }

  /** Sugar water of the given strength. */
  public static SugarWater ofPlato(double plato) {
    return new SugarWater(plato);
  }

  /** kg/m³ at one atmosphere. */
  public double kgPerM3(double temperatureK) {
    double water = Kell1975.kgPerM3(temperatureK);
    return water * overWater(water, temperatureK);
  }

  /** Density over that of water, given water's at the same temperature, kg/m³. */
  double overWater(double waterKgPerM3, double temperatureK) {
    double sugar = m3PerKgAt20C + SUGAR_EXPANSION_M3_PER_KG_K * (temperatureK - REFERENCE_K);
    return 1 / (1 - share + share * sugar * waterKgPerM3);
  }

  /** Specific gravity 20/20 °C. */
  public static double gravityAt20C(double plato) {
    return plato < LEAST_PLATO ? 1 : Extract.gravityFromPlato(plato);
  }

  /** Sugar per m³ of liquid at 20 °C, kg/m³, from degrees Plato. */
  public static double sugarKgPerM3(double plato) {
    return plato / 100 * WATER_AT_20C * gravityAt20C(plato);
  }

  /** Degrees Plato from sugar per m³ of liquid at 20 °C, kg/m³. */
  public static double plato(double sugarKgPerM3) {
    double plato = sugarKgPerM3 / 10;
    for (int i = 0; i < 30; i++) {
      plato = 100 * sugarKgPerM3 / (WATER_AT_20C * gravityAt20C(plato));
    }
    return plato;
  }
}

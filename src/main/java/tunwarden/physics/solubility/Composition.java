package tunwarden.physics.solubility;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.Makeup;
import tunwarden.units.Constants;

/** Working estimates of what sugar, extract and alcohol do to the solubility of a gas. */
final class Composition {
  static final Correlation ABOUT_BEER =
      new Correlation(
          "extract and alcohol correction",
          "relative to the standard beer of Speers and MacIntosh, J. Am. Soc. Brew. Chem. 71 (2013)"
              + " 242; their equations were not seen",
          Validity.ofCelsiusAndBar(-1, 25, 0, 10),
          "half of the correction itself",
          Correlation.Standing.ESTIMATE);

  static final Correlation ABOUT_SUGAR =
      new Correlation(
          "Sechenov relation for sugar",
          "log10(c0/c) = K c, 0.12 L/mol for CO2 and 0.149 for the others, sucrose",
          Validity.ofCelsiusAndBar(0, 50, 0, 10),
          "2 to 3 % at 100 g/L",
          Correlation.Standing.FROM_MEMORY);

  private static final double EXTRACT_PER_PLATO = 0.006;
  private static final double ALCOHOL_COLD = 0.004;
  private static final double ALCOHOL_WARM = 0.001;
  private static final double COLD_C = 4;
  private static final double WARM_C = 20;
  private static final double SUCROSE_MOLAR_MASS = 0.3423;
  private static final double SECHENOV_CO2_M3_PER_MOL = 0.12e-3;
  private static final double SECHENOV_OTHER_M3_PER_MOL = 0.149e-3;

  private Composition() {}

  /** CO2 in a beer of this make-up over CO2 in the standard beer. */
  static double beerOverStandard(Makeup makeup, double temperatureK) {
    double extract = makeup.solidsPlato() - Makeup.STANDARD_BEER_EXTRACT_PLATO;
    return Math.max(0, 1 - EXTRACT_PER_PLATO * extract) * alcoholOverStandard(makeup, temperatureK);
  }

  /** The same without extract at all: beer's relation as if nothing but alcohol were dissolved. */
  static double withoutExtract(Makeup makeup, double temperatureK) {
    return (1 + EXTRACT_PER_PLATO * Makeup.STANDARD_BEER_EXTRACT_PLATO)
        * alcoholOverStandard(makeup, temperatureK);
  }

  /** Gas in sugar water over gas in water. */
  static double sugar(Gas gas, double sugarKgPerM3) {
    double constant = gas == Gas.CO2 ? SECHENOV_CO2_M3_PER_MOL : SECHENOV_OTHER_M3_PER_MOL;
    return Math.pow(10, -constant * sugarKgPerM3 / SUCROSE_MOLAR_MASS);
  }

  private static double alcoholOverStandard(Makeup makeup, double temperatureK) {
    double t = temperatureK - Constants.ZERO_CELSIUS_K;
    double warmth = Math.max(0, Math.min(1, (t - COLD_C) / (WARM_C - COLD_C)));
    double perPercent = ALCOHOL_COLD + warmth * (ALCOHOL_WARM - ALCOHOL_COLD);
    double surplus = makeup.alcoholMassPercent() - Makeup.STANDARD_BEER_ALCOHOL_MASS_PERCENT;
    return Math.max(0, 1 - perPercent * surplus);
  }
}

package tunwarden.simulate;

/**
 * Solubility, vapour pressure and density as the simulator takes them. Water: K0 after Weiss
 * (1974), second virial coefficient from the same paper, partial molar volume 37 cm3/mol. Beer: the
 * European trade equation as a temperature-dependent factor on water. A relative error is laid on
 * top, since no real drink follows its relation exactly.
 */
final class TrueLiquid {
  static final double GAS_CONSTANT = 8.314462618;
  static final double CO2_KG_PER_MOL = 0.0440095;
  private static final double ATM = 101_325;
  private static final double MOLAR_VOLUME = 37e-6;

  private final boolean beer;
  private final double relativeError;

  TrueLiquid(boolean beer, double relativeError) {
    this.beer = beer;
    this.relativeError = relativeError;
  }

  boolean isBeer() {
    return beer;
  }

  /** Second virial coefficient of CO2, m3/mol. */
  static double virial(double t) {
    return (-1636.75 + t * (12.0408 + t * (-3.27957e-2 + t * 3.16528e-5))) * 1e-6;
  }

  /** Density of the liquid relative to 4 degrees Celsius (Kell's cubic, rounded). */
  static double relativeDensity(double t) {
    double c = t - 273.15 - 3.98;
    return 1 - 7.6e-6 * c * c + 4.5e-8 * c * c * c;
  }

  /** Water vapour, Pa (Magnus form). */
  static double vapour(double t) {
    double c = t - 273.15;
    return 611.2 * Math.exp(17.62 * c / (243.12 + c));
  }

  /** CO2 in equilibrium with a partial pressure (Pa) under a total pressure (Pa), kg/m3. */
  double equilibrium(double t, double partialPa, double totalPa) {
    double fugacity = partialPa * Math.exp(virial(t) * totalPa / (GAS_CONSTANT * t));
    double poynting = Math.exp(-MOLAR_VOLUME * (totalPa - ATM) / (GAS_CONSTANT * t));
    double molal = henryWater(t) * fugacity / ATM * poynting;
    double water = molal * CO2_KG_PER_MOL * 999;
    return water * (beer ? beerFactor(t) : 1) * (1 + relativeError);
  }

  private static double henryWater(double t) {
    double h = t / 100;
    return Math.exp(-60.2409 + 93.4517 / h + 23.3585 * Math.log(h));
  }

  /** European beer equation over water, both at 1.5 bar absolute. */
  private static double beerFactor(double t) {
    double pBar = 1.5;
    double european = 10 * pBar * Math.exp(-10.73797 + 2617.25 / t);
    double partial = pBar * 1e5 - vapour(t);
    double fugacity = partial * Math.exp(virial(t) * pBar * 1e5 / (GAS_CONSTANT * t));
    return european / (henryWater(t) * fugacity / ATM * CO2_KG_PER_MOL * 999);
  }
}

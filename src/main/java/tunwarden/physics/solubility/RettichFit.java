package tunwarden.physics.solubility;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.physics.gas.Gas;

/**
 * Henry fugacity of O2 and N2 in water: three-constant fits made here to Rettich's measurements.
 */
public final class RettichFit {
  /** What is known about the oxygen fit. */
  public static final Correlation ABOUT_O2 =
      new Correlation(
          "Rettich 2000 (fit)",
          "T. R. Rettich, R. Battino, E. Wilhelm, J. Chem. Thermodyn. 32 (2000) 1145",
          Validity.ofCelsiusAndBar(0.9, 55, 0, 10),
          "0.05 % rms of the measured points",
          Correlation.Standing.COMPUTED);

  /** What is known about the nitrogen fit. */
  public static final Correlation ABOUT_N2 =
      new Correlation(
          "Rettich 1984 (fit)",
          "T. R. Rettich, R. Battino, E. Wilhelm, J. Solution Chem. 13 (1984) 335",
          Validity.ofCelsiusAndBar(4.9, 50, 0, 10),
          "0.05 % rms of the measured points",
          Correlation.Standing.COMPUTED);

  private RettichFit() {}

  /** ln of the Henry fugacity in Pa, mole-fraction basis, at the vapour pressure of water. */
  public static double lnHenryPa(Gas gas, double temperatureK) {
    double x = 1 / temperatureK;
    return switch (gas) {
      case O2 -> 14.98946 + x * (5742.622 - 1.070683e6 * x);
      case N2 -> 14.27662 + x * (6386.665 - 1.139789e6 * x);
      default -> throw new IllegalArgumentException("no Rettich fit for " + gas);
    };
  }
}

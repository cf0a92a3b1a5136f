package tunwarden.physics.solubility;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;

/** Solubility of CO2 in fresh water, Weiss 1974, on fugacity. */
public final class Weiss1974 {
  /** What is known about it; the limits are from memory. */
  public static final Correlation ABOUT =
      new Correlation(
          "Weiss 1974",
          "R. F. Weiss, Marine Chemistry 2 (1974) 203, Eq. 12",
          Validity.ofCelsiusAndBar(-1, 40, 0, 10),
          "0.4 % at 1 atm to 35 C; 1.5 to 2 % at 2 to 10 bar; to 60 C within 0.6 % of IAPWS G7-04",
          Correlation.Standing.SEEN);

  private static final double LN_ATM = Math.log(Constants.STANDARD_ATMOSPHERE_PA);

  private Weiss1974() {}

  /** ln of molality over fugacity, mol/(kg·Pa), with the liquid at one atmosphere. */
  public static double lnMolalityPerPa(double temperatureK) {
    double hundreds = temperatureK / 100;
    return -60.2409 + 93.4517 / hundreds + 23.3585 * Math.log(hundreds) - LN_ATM; // Eq. 12, S = 0
  }
}

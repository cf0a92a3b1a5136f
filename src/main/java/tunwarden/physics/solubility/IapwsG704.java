package tunwarden.physics.solubility;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.WagnerPruss1993;

/** Henry's constant of fourteen gases in water, IAPWS guideline G7-04, Eq. 1 and Table 1. */
public final class IapwsG704 {
  /** A, B, C, least K, most K; in the order of {@link Gas}. */
  private static final double[][] TABLE_1 = {
    {-8.55445, 4.01195, 9.52345, 274.19, 642.66}, // CO2
    {-9.67578, 4.72162, 11.70585, 278.12, 636.46}, // N2
    {-9.44833, 4.43822, 11.42005, 274.15, 616.52}, // O2
    {-8.40954, 4.29587, 10.52779, 273.19, 568.36}, // Ar
    {-3.52839, 7.12983, 4.47770, 273.21, 553.18}, // He
    {-3.18301, 5.31448, 5.43774, 273.20, 543.36}, // Ne
    {-8.97358, 3.61508, 11.29963, 273.19, 525.56}, // Kr
    {-14.21635, 4.00041, 15.60999, 273.22, 574.85}, // Xe
    {-4.73284, 6.08954, 6.06066, 273.15, 636.09}, // H2
    {-10.52862, 5.13259, 12.01421, 278.15, 588.67}, // CO
    {-4.51499, 5.23538, 4.42126, 273.15, 533.09}, // H2S
    {-10.44708, 4.66491, 12.12986, 275.46, 633.11}, // CH4
    {-19.67563, 4.51222, 20.62567, 275.44, 473.46}, // C2H6
    {-16.56118, 2.15289, 20.35440, 283.14, 505.55}, // SF6
  };

  private static final double LN_CRITICAL = Math.log(WagnerPruss1993.CRITICAL_PA);

  private IapwsG704() {}

  /**
   * What is known about it. Constants of CO2, N2, O2 and Ar were read; the other gases' are from
   * memory and stand by reproducing the guideline's check values.
   */
  public static Correlation about(Gas gas) {
    double[] row = TABLE_1[gas.ordinal()];
    return new Correlation(
        "IAPWS G7-04",
        "IAPWS guideline G7-04 (2004); R. Fernandez-Prini et al., J. Phys. Chem. Ref. Data 32"
            + " (2003) 903",
        new Validity(row[3], row[4], 0, 10e5),
        "1 to 2 % near 20 C; 2 to 5 % low for CO2 below 10 C",
        gas.ordinal() <= Gas.AR.ordinal()
            ? Correlation.Standing.SEEN
            : Correlation.Standing.FROM_MEMORY);
  }

  /** ln of Henry's constant in Pa, mole-fraction basis, at the vapour pressure of water. */
  public static double lnHenryPa(Gas gas, double temperatureK) {
    double[] row = TABLE_1[gas.ordinal()];
    double reduced = temperatureK / WagnerPruss1993.CRITICAL_K;
    double tau = 1 - reduced;
    double root = Math.exp(0.355 * Math.log(tau));
    double hot = Math.exp(tau - 0.41 * Math.log(reduced));
    return LN_CRITICAL // Eq. 1
        + WagnerPruss1993.lnReduced(reduced)
        + (row[0] + row[1] * root) / reduced
        + row[2] * hot;
  }
}

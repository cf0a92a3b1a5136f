package tunwarden.physics.liquid;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;

/** Vapour pressure of water, Wagner and Pruss 1993, Eq. 1, the form IAPWS G7-04 is built on. */
public final class WagnerPruss1993 {
  /** Critical temperature of water, K. */
  public static final double CRITICAL_K = 647.096;

  /** Critical pressure of water, Pa. */
  public static final double CRITICAL_PA = 22.064e6;

  /** What is known about it. */
  public static final Correlation ABOUT =
      new Correlation(
          "Wagner and Pruss 1993",
          "W. Wagner, A. Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783",
          new Validity(271.15, 647.096, 0, CRITICAL_PA),
          "0.02 % from 0 C; continued to -2 C over supercooled water, where drinks are still"
              + " liquid",
          Correlation.Standing.FROM_MEMORY);

  private WagnerPruss1993() {}

  /** Saturation pressure, Pa. */
  public static double pa(double temperatureK) {
    return CRITICAL_PA * Math.exp(lnReduced(temperatureK / CRITICAL_K));
  }

  /** ln of saturation pressure over critical pressure. */
  public static double lnReduced(double reducedTemperature) {
    double x = 1 - reducedTemperature;
    double root = Math.sqrt(x);
    double cube = x * x * x;
    double sum = // Eq. 1
        x * (-7.85951783 + 1.84408259 * root)
            + cube * (-11.7866497 + 22.6807411 * root + x * -15.9618719)
            + cube * cube * x * root * 1.80122502;
    return sum / reducedTemperature;
  }
}

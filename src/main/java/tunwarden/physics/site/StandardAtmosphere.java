package tunwarden.physics.site;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;

/** Air pressure with altitude: the standard atmosphere of ISO 2533, troposphere. */
public final class StandardAtmosphere {
  /** What is known about it. */
  public static final Correlation ABOUT =
      new Correlation(
          "ISO 2533",
          "ISO 2533:1975, standard atmosphere; geopotential altitude",
          new Validity(0, Double.MAX_VALUE, 0, Double.MAX_VALUE),
          "exact by definition; weather moves the true pressure by about 30 mbar",
          Correlation.Standing.SEEN);

  /** Highest altitude of the layer used, m. */
  public static final double MOST_M = 11_000;

  /** Lowest altitude the standard tabulates, m. */
  public static final double LEAST_M = -2_000;

  private static final double SEA_LEVEL_K = 288.15;
  private static final double LAPSE_K_PER_M = 0.0065;
  private static final double EXPONENT = 5.25588; // g0 M / (R L)

  private StandardAtmosphere() {}

  /** Pressure, Pa absolute, at an altitude in m; held at the edges of the layer. */
  public static double pa(double altitudeM) {
    double held = Math.max(LEAST_M, Math.min(MOST_M, altitudeM));
    double ratio = 1 - LAPSE_K_PER_M * held / SEA_LEVEL_K;
    return Constants.STANDARD_ATMOSPHERE_PA * Math.pow(ratio, EXPONENT);
  }

  /** Altitude, m, at which the standard atmosphere has this pressure, Pa absolute. */
  public static double altitudeM(double paAbsolute) {
    double ratio = paAbsolute / Constants.STANDARD_ATMOSPHERE_PA;
    double altitude = SEA_LEVEL_K / LAPSE_K_PER_M * (1 - Math.pow(ratio, 1 / EXPONENT));
    return Math.max(LEAST_M, Math.min(MOST_M, altitude));
  }
}

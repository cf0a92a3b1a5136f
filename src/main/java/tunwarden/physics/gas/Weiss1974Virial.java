package tunwarden.physics.gas;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;

/**
 * Virial coefficients of CO2: the second as Weiss 1974 gives it, and a third that was fitted here
 * so that the tabulated compressibility and fugacity of Span and Wagner 1996 are met to 20 bar.
 */
public final class Weiss1974Virial {
  /** What is known about it. */
  public static final Correlation ABOUT =
      new Correlation(
          "Weiss 1974 virial, third coefficient fitted",
          "R. F. Weiss, Marine Chemistry 2 (1974) 203, Eq. 6; third coefficient fitted to Span and"
              + " Wagner 1996 (J. Phys. Chem. Ref. Data 25, 1509)",
          Validity.ofCelsiusAndBar(-2, 60, 0, 20),
          "0.03 % in fugacity and 0.08 % in compressibility to 20 bar",
          Correlation.Standing.SEEN);

  private static final double M3_PER_CM3 = 1e-6;

  private Weiss1974Virial() {}

  /** Second virial coefficient of CO2, m³/mol. */
  public static double second(double temperatureK) {
    double t = temperatureK;
    return M3_PER_CM3 * (-1636.75 + t * (12.0408 + t * (-3.27957e-2 + t * 3.16528e-5))); // Eq. 6
  }

  /**
   * Coefficient of (p/RT)² in the compressibility of CO2, m⁶/mol²: C − B² of the density series.
   * Fitted here.
   */
  public static double third(double temperatureK) {
    double t = temperatureK - Constants.ZERO_CELSIUS_K;
    return -2.29903727e-8 + t * (5.71126504e-10 - t * 4.66268929e-12);
  }

  /**
   * How much a CO2–air pair departs from the mean of the pure second coefficients, m³/mol: B12 −
   * (B11 + B22)/2.
   */
  public static double excessWithAir(double temperatureK) {
    return M3_PER_CM3 * (57.7 - 0.118 * temperatureK); // Eq. 11
  }
}

package tunwarden.physics.gas;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;

/**
 * Second virial coefficients of non-polar gases and their pairs by corresponding states,
 * Tsonopoulos 1974, with effective critical constants for the quantum gases.
 */
public final class Tsonopoulos1974 {
  /** What is known about it. */
  public static final Correlation ABOUT =
      new Correlation(
          "Tsonopoulos 1974",
          "C. Tsonopoulos, AIChE J. 20 (1974) 263, Eqs. 4-6 and 21",
          Validity.ofCelsiusAndBar(-2, 60, 0, 20),
          "about 5 cm3/mol, 0.2 % of the pressure at 10 bar",
          Correlation.Standing.FROM_MEMORY);

  /** Critical temperature K, critical pressure Pa, acentric factor; in the order of {@link Gas}. */
  private static final double[][] CRITICAL = {
    {304.128, 7.3773e6, 0.2239}, // CO2
    {126.192, 3.3958e6, 0.0372}, // N2
    {154.581, 5.043e6, 0.0222}, // O2
    {150.687, 4.863e6, -0.0022}, // Ar
    {10.47, 0.676e6, 0}, // He, effective
    {45.5, 2.73e6, 0}, // Ne, effective
    {209.48, 5.525e6, -0.0009}, // Kr
    {289.733, 5.842e6, 0.0036}, // Xe
    {43.6, 2.05e6, 0}, // H2, effective
    {132.86, 3.494e6, 0.0497}, // CO
    {373.1, 9.0e6, 0.1005}, // H2S
    {190.564, 4.5992e6, 0.0114}, // CH4
    {305.322, 4.8722e6, 0.0995}, // C2H6
    {318.723, 3.755e6, 0.21}, // SF6
  };

  private Tsonopoulos1974() {}

  /** Second virial coefficient of a pure gas, m³/mol. */
  public static double second(Gas gas, double temperatureK) {
    double[] c = CRITICAL[gas.ordinal()];
    return second(temperatureK / c[0], Constants.GAS_CONSTANT * c[0] / c[1], c[2]);
  }

  /** Second virial coefficient of an unlike pair, m³/mol, by Lorentz–Berthelot rules. */
  public static double cross(Gas one, Gas other, double temperatureK) {
    double[] a = CRITICAL[one.ordinal()];
    double[] b = CRITICAL[other.ordinal()];
    double scaleA = a[0] / a[1];
    double scaleB = b[0] / b[1];
    double volume = Math.cbrt(scaleA) + Math.cbrt(scaleB);
    double scale = volume * volume * volume / 8;
    // Eq. 21 with the binary constant from the sizes: (1 - k) = (Va Vb)^(1/2) / Vab
    double critical = Math.sqrt(a[0] * b[0]) * Math.sqrt(scaleA * scaleB) / scale;
    return second(temperatureK / critical, Constants.GAS_CONSTANT * scale, (a[2] + b[2]) / 2);
  }

  private static double second(double reduced, double volume, double acentric) {
    double r = 1 / reduced;
    double r3 = r * r * r;
    double r8 = r3 * r3 * r * r;
    double simple = 0.1445 - r * (0.330 + r * 0.1385) - 0.0121 * r3 - 0.000607 * r8; // Eq. 5
    double departure = 0.0637 + 0.331 * r * r - 0.423 * r3 - 0.008 * r8; // Eq. 6
    return volume * (simple + acentric * departure); // Eq. 4
  }
}

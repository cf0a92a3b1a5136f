package tunwarden.physics.liquid;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;

/** Density and compressibility of water at one atmosphere, Kell 1975. */
public final class Kell1975 {
  /** What is known about it. */
  public static final Correlation ABOUT =
      new Correlation(
          "Kell 1975",
          "G. S. Kell, J. Chem. Eng. Data 20 (1975) 97",
          Validity.ofCelsiusAndBar(-20, 150, 0, 20),
          "0.002 % against IAPWS-95 from 0 to 60 C; compression of water left out (0.005 %/bar)",
          Correlation.Standing.FROM_MEMORY);

  private Kell1975() {}

  /** kg/m³ at one atmosphere. */
  public static double kgPerM3(double temperatureK) {
    double t = temperatureK - Constants.ZERO_CELSIUS_K;
    double top =
        999.83952
            + t
                * (16.945176
                    + t
                        * (-7.9870401e-3
                            + t * (-46.170461e-6 + t * (105.56302e-9 - t * 280.54253e-12))));
    return top / (1 + 16.879850e-3 * t); // Eq. 16
  }

  /** Isothermal compressibility at one atmosphere, 1/Pa. */
  public static double compressibilityPerPa(double temperatureK) {
    double t = temperatureK - Constants.ZERO_CELSIUS_K;
    double top =
        50.88496
            + t
                * (0.6163813
                    + t
                        * (1.459187e-3
                            + t * (20.08438e-6 + t * (-58.47727e-9 + t * 410.4110e-12))));
    return 1e-11 * top / (1 + 19.67348e-3 * t); // Eq. 20, 1e-6/bar
  }
}

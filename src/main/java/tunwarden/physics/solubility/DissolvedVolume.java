package tunwarden.physics.solubility;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.physics.gas.Gas;
import tunwarden.units.Constants;

/** Room a dissolved gas takes in water: García 2001 for CO2, single figures for the others. */
public final class DissolvedVolume {
  /** What is known about the CO2 relation. */
  public static final Correlation ABOUT_CO2 =
      new Correlation(
          "Garcia 2001",
          "J. E. Garcia, LBNL-49023 (2001), Eq. 3",
          Validity.ofCelsiusAndBar(0, 300, 0, 1000),
          "5 to 10 % of the volume, under 0.2 % of the solubility at 10 bar",
          Correlation.Standing.SEEN);

  private static final double M3_PER_CM3 = 1e-6;

  /** cm³/mol near 25 °C, from memory; in the order of {@link Gas}. */
  private static final double[] CM3_PER_MOL = {
    35.7, 33, 31, 32, 30, 20, 33, 43, 26, 36, 35, 37, 51, 60
  };

  private DissolvedVolume() {}

  /** Partial molar volume at infinite dilution, m³/mol. */
  public static double m3PerMol(Gas gas, double temperatureK) {
    if (gas != Gas.CO2) {
      return M3_PER_CM3 * CM3_PER_MOL[gas.ordinal()];
    }
    double t = temperatureK - Constants.ZERO_CELSIUS_K;
    return M3_PER_CM3 * (37.51 + t * (-9.585e-2 + t * (8.740e-4 - t * 5.044e-7))); // Eq. 3
  }
}

package tunwarden.physics.solubility;

import java.util.LinkedHashMap;
import java.util.Map;
import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.physics.gas.Gas;
import tunwarden.units.BadQuantityException;

/** Salting out of dissolved gas, Weisenberger and Schumpe 1996: log10(c0/c) = sum (hi + hG) ci. */
public final class WeisenbergerSchumpe1996 {
  /**
   * What is known about it: gas parameters of CO2, O2, N2, CH4 and the ions Na and Cl were read.
   */
  public static final Correlation ABOUT =
      new Correlation(
          "Weisenberger and Schumpe 1996",
          "S. Weisenberger, A. Schumpe, AIChE J. 42 (1996) 298",
          Validity.ofCelsiusAndBar(0, 40, 0, 100),
          "3 % rms to 1.5 mol/L",
          Correlation.Standing.FROM_MEMORY);

  private static final double REFERENCE_K = 298.15;
  private static final double MOL_PER_KMOL = 1000;

  /** Gas parameter m³/kmol at 25 °C and its slope per K; in the order of {@link Gas}. */
  private static final double[][] GAS = {
    {-0.0172, -0.338e-3}, // CO2
    {-0.0010, -0.605e-3}, // N2
    {0, -0.334e-3}, // O2
    {0.0057, -0.485e-3}, // Ar
    {-0.0353, 0.464e-3}, // He
    {-0.0080, -0.913e-3}, // Ne
    {-0.0071, 0}, // Kr
    {0.0133, -0.329e-3}, // Xe
    {-0.0218, -0.299e-3}, // H2
    {-0.0010, -0.605e-3}, // CO, taken as N2
    {-0.0333, 0}, // H2S
    {0.0022, -0.524e-3}, // CH4
    {0.0120, -0.601e-3}, // C2H6
    {0.0100, 0}, // SF6
  };

  private static final double NA = 0.1143;
  private static final double K = 0.0922;
  private static final double MG = 0.1694;
  private static final double CA = 0.1762;
  private static final double CL = 0.0318;
  private static final double HCO3 = 0.0967;
  private static final double SO4 = 0.1117;
  private static final double NO3 = 0.0128;
  private static final double CO3 = 0.1423;

  /** Sum of the ion parameters and number of ions of each salt. */
  private static final Map<String, double[]> SALT = salts();

  private final double ions;
  private final double count;

  private WeisenbergerSchumpe1996(double ions, double count) {
    this.ions = ions;
    this.count = count;
  }

  /**
   * The salting out by a mixture of salts.
   *
   * @param saltMolPerM3 salts by formula, mol/m³
   * @throws BadQuantityException when a salt is not known
   */
  public static WeisenbergerSchumpe1996 of(Map<String, Double> saltMolPerM3) {
    double ions = 0;
    double count = 0;
    for (Map.Entry<String, Double> entry : saltMolPerM3.entrySet()) {
      double[] salt = saltOf(entry.getKey());
      ions += entry.getValue() / MOL_PER_KMOL * salt[0];
      count += entry.getValue() / MOL_PER_KMOL * salt[1];
    }
    return new WeisenbergerSchumpe1996(ions, count);
  }

  /** Solubility over that in pure water. */
  public double factor(Gas gas, double temperatureK) {
    double[] g = GAS[gas.ordinal()];
    double own = g[0] + g[1] * (temperatureK - REFERENCE_K); // Eq. 3
    return Math.pow(10, -(ions + count * own)); // Eq. 2
  }

  private static double[] saltOf(String formula) {
    double[] salt = SALT.get(formula);
    if (salt == null) {
      throw new BadQuantityException(
          "the salt '"
              + formula
              + "' is not known; write one of "
              + String.join(", ", SALT.keySet()));
    }
    return salt;
  }

  private static Map<String, double[]> salts() {
    Map<String, double[]> salts = new LinkedHashMap<>();
    salts.put("NaCl", new double[] {NA + CL, 2});
    salts.put("KCl", new double[] {K + CL, 2});
    salts.put("MgCl2", new double[] {MG + 2 * CL, 3});
    salts.put("CaCl2", new double[] {CA + 2 * CL, 3});
    salts.put("NaHCO3", new double[] {NA + HCO3, 2});
    salts.put("KHCO3", new double[] {K + HCO3, 2});
    salts.put("Mg(HCO3)2", new double[] {MG + 2 * HCO3, 3});
    salts.put("Ca(HCO3)2", new double[] {CA + 2 * HCO3, 3});
    salts.put("Na2SO4", new double[] {2 * NA + SO4, 3});
    salts.put("K2SO4", new double[] {2 * K + SO4, 3});
    salts.put("MgSO4", new double[] {MG + SO4, 2});
    salts.put("CaSO4", new double[] {CA + SO4, 2});
    salts.put("NaNO3", new double[] {NA + NO3, 2});
    salts.put("KNO3", new double[] {K + NO3, 2});
    salts.put("Na2CO3", new double[] {2 * NA + CO3, 3});
    return salts;
  }
}

package tunwarden.physics.liquid;

import tunwarden.physics.Correlation;
import tunwarden.physics.Validity;
import tunwarden.units.Constants;

/** Density of ethanol–water mixtures: the general formula of OIML R 22 (1975). */
public final class OimlR22 {
  /** What is known about it. */
  public static final Correlation ABOUT =
      new Correlation(
          "OIML R 22",
          "OIML International Recommendation R 22 (1975), general formula",
          Validity.ofCelsiusAndBar(-20, 40, 0, 20),
          "0.02 %; above 40 C the mixture is given the expansion of water",
          Correlation.Standing.SEEN);

  /** Reference temperature of alcohol by volume, 20 °C, in K. */
  public static final double REFERENCE_K = 20 + Constants.ZERO_CELSIUS_K;

  private static final double MOST_K = 40 + Constants.ZERO_CELSIUS_K;
  private static final double WATER_AT_MOST = Kell1975.kgPerM3(MOST_K);
  private static final double PURE_ETHANOL = 789.239;

  private static final double[] A = {
    9.982012300E2, -1.929769495E2, 3.891238958E2, -1.668103923E3, 1.352215441E4, -8.829278388E4,
    3.062874042E5, -6.138381234E5, 7.470172998E5, -5.478461354E5, 2.234460334E5, -3.903285426E4
  };

  private static final double[] B = {
    0, -2.0618513E-1, -5.2682542E-3, 3.6130013E-5, -3.8957702E-7, 7.1693540E-9, -9.9739231E-11
  };

  /** C[i][k], power i + 1 of the temperature and k of the mass fraction. */
  private static final double[][] C = {
    {
      0,
      1.693443461530087E-1,
      -1.046914743455169E1,
      7.196353469546523E1,
      -7.047478054272792E2,
      3.924090430035045E3,
      -1.210164659068747E4,
      2.248646550400788E4,
      -2.605562982188164E4,
      1.852373922069467E4,
      -7.420201433430137E3,
      1.285617841998974E3
    },
    {
      0,
      -1.193013005057010E-2,
      2.517399633803461E-1,
      -2.170575700536993,
      1.353034988843029E1,
      -5.029988758547014E1,
      1.096355666577570E2,
      -1.422753946421155E2,
      1.080435942856230E2,
      -4.414153236817392E1,
      7.442971530188783
    },
    {
      0,
      -6.802995733503803E-4,
      1.876837790289664E-2,
      -2.002561813734156E-1,
      1.022992966719220,
      -2.895696483903638,
      4.810060584300675,
      -4.672147440794683,
      2.458043105903461,
      -5.411227621436812E-1
    },
    {0, 4.075376675622027E-6, -8.763058573471110E-6, 6.515031360099368E-6, -1.515784836987210E-6},
    {0, -2.788074354782409E-8, 1.345612883493354E-8}
  };

  private OimlR22() {}

  /** kg/m³ of a mixture with the given mass fraction of ethanol. */
  public static double kgPerM3(double massFraction, double temperatureK) {
    return kgPerM3(mixture(massFraction), temperatureK);
  }

  /**
   * The formula gathered for one mixture as a polynomial in the temperature above 20 °C, for code
   * that evaluates often.
   */
  static double[] mixture(double massFraction) {
    double[] gathered = B.clone();
    gathered[0] = polynomial(A, massFraction);
    for (int i = 0; i < C.length; i++) {
      gathered[i + 1] += polynomial(C[i], massFraction);
    }
    return gathered;
  }

  /** kg/m³ of a gathered mixture. */
  static double kgPerM3(double[] mixture, double temperatureK) {
    if (temperatureK <= MOST_K) {
      return polynomial(mixture, temperatureK - REFERENCE_K);
    }
    double atMost = polynomial(mixture, MOST_K - REFERENCE_K);
    return atMost * Kell1975.kgPerM3(temperatureK) / WATER_AT_MOST;
  }

  /** Mass fraction of ethanol of a mixture with the given share by volume at 20 °C. */
  public static double massFraction(double volumeFraction) {
    double mass = volumeFraction * PURE_ETHANOL / 1000;
    for (int i = 0; i < 40; i++) {
      mass = volumeFraction * PURE_ETHANOL / kgPerM3(mass, REFERENCE_K);
    }
    return mass;
  }

  private static double polynomial(double[] coefficient, double x) {
    double sum = 0;
    for (int i = coefficient.length - 1; i >= 0; i--) {
      sum = sum * x + coefficient[i];
    }
    return sum;
  }
}

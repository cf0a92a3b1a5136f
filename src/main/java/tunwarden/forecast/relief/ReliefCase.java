package tunwarden.forecast.relief;

import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.WagnerPruss1993;
import tunwarden.units.Constants;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.ReliefSetting;

/**
 * A relief valve blowing gas into the open.
 *
 * @param setting its setting
 * @param path its flow path, with the certified coefficient where it is known
 * @param gas what it passes
 * @param temperatureK of the gas, K
 * @param ambientPaAbsolute atmosphere, Pa absolute
 */
public record ReliefCase(
    ReliefSetting setting,
    ReliefOrifice path,
    GasMix gas,
    double temperatureK,
    double ambientPaAbsolute) {
  private static final double STEAM_KG_PER_MOL = 0.018015268;

  /** Ratio of heat capacities of low-pressure steam; usual value, from memory. */
  private static final double STEAM_K = 1.32;

  private static final double COLDEST_BOIL_K = 273.16;
  private static final double HOTTEST_BOIL_K = 500;

  /** Pressure at which the rated flow is counted: set + overpressure + atmosphere, Pa absolute. */
  public double relievingPaAbsolute() {
    return setting.setPaGauge() + ReliefLevels.overpressurePa(setting) + ambientPaAbsolute;
  }

  /** Flow of gas at the relieving pressure, kg/s. */
  public double gasKgPerS() {
    return orifice().kgPerS(gas, relievingPaAbsolute(), ambientPaAbsolute, temperatureK);
  }

  /** Flow of saturated steam at the relieving pressure, kg/s. */
  public double steamKgPerS() {
    double zrt = Constants.GAS_CONSTANT * boilingK() / STEAM_KG_PER_MOL;
    return path.areaM2()
        * path.dischargeCoefficient()
        * IsentropicOrifice.flux(STEAM_K, zrt, relievingPaAbsolute(), ambientPaAbsolute);
  }

  /** Where water boils under the relieving pressure, K. */
  public double boilingK() {
    double low = COLDEST_BOIL_K;
    double high = HOTTEST_BOIL_K;
    while (high - low > 1e-3) {
      double middle = (low + high) / 2;
      if (WagnerPruss1993.pa(middle) >= relievingPaAbsolute()) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return high;
  }

  private IsentropicOrifice orifice() {
    return new IsentropicOrifice(path.areaM2(), path.dischargeCoefficient());
  }
}

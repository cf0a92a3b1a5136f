package tunwarden.physics.gas;

import tunwarden.units.Constants;

/**
 * Compressibility of dry headspace gas, prepared at one temperature for code that evaluates often;
 * the same mixing rule as {@link RealGas}. Arrays are in the order of {@link Gas}. Not thread-safe,
 * does not allocate.
 */
public final class DryBlend {
  private static final int GASES = Gas.all().size();
  private static final int CO2 = Gas.CO2.ordinal();

  private final double[] second = new double[GASES];
  private final double[] excess = new double[GASES];
  private double rt;
  private double third;
  private double preparedK = Double.NaN;
  private int preparedGases;

  /** Prepares for a temperature, K, and the gases whose entry is above zero. */
  public DryBlend prepareAt(double temperatureK, double[] amount) {
    if (temperatureK != preparedK) {
      preparedK = temperatureK;
      preparedGases = 0;
      rt = Constants.GAS_CONSTANT * temperatureK;
      third = Weiss1974Virial.third(temperatureK);
    }
    for (int i = 0; i < GASES; i++) {
      if (amount[i] > 0 && (preparedGases & 1 << i) == 0) {
        Gas gas = Gas.all().get(i);
        second[i] = RealGas.second(gas, temperatureK);
        excess[i] = RealGas.excessWithCo2(gas, temperatureK);
        preparedGases |= 1 << i;
      }
    }
    return this;
  }

  /** Compressibility at these partial pressures, Pa. */
  public double z(double[] partialPa) {
    double dry = 0;
    double own = 0;
    double pairs = 0;
    for (int i = 0; i < GASES; i++) {
      double p = partialPa[i];
      dry += p;
      own += p * second[i];
      pairs += p * excess[i];
    }
    if (dry <= 0) {
      return 1;
    }
    double co2 = partialPa[CO2] / dry;
    double density = Math.min(dry, RealGas.SERIES_LIMIT_PA) / rt;
    double blend = (own + 2 * co2 * pairs) / dry;
    return 1 + density * (blend + density * co2 * co2 * co2 * third);
  }

  /** mol/m³ per Pa of partial pressure: 1/(Z R T). */
  public double molPerM3Pa(double[] partialPa) {
    return 1 / (z(partialPa) * rt);
  }
}

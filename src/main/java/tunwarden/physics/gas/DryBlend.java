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
  private final double[] pair = new double[GASES];
  private final int[] present = new int[GASES];
  private int count;
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
    count = 0;
    for (int i = 0; i < GASES; i++) {
      if (amount[i] > 0) {
        present[count++] = i;
        prepareGas(i);
      }
    }
    return this;
  }

  private void prepareGas(int i) {
    if ((preparedGases & 1 << i) == 0) {
      Gas gas = Gas.all().get(i);
      second[i] = RealGas.second(gas, preparedK);
      pair[i] = 2 * RealGas.excessWithCo2(gas, preparedK);
      preparedGases |= 1 << i;
    }
  }

  /** Compressibility at these partial pressures, Pa, of the gases prepared for. */
  public double z(double[] partialPa) {
    double dry = 0;
    double own = 0;
    double pairs = 0;
    for (int k = 0; k < count; k++) {
      int i = present[k];
      double p = partialPa[i];
      dry += p;
      own += p * second[i];
      pairs += p * pair[i];
    }
    if (dry <= 0) {
      return 1;
    }
    double perDry = 1 / dry;
    double co2 = partialPa[CO2] * perDry;
    double density = Math.min(dry, RealGas.SERIES_LIMIT_PA) / rt;
    double blend = (own + co2 * pairs) * perDry;
    return 1 + density * (blend + density * co2 * co2 * co2 * third);
  }

  /** mol/m³ per Pa of partial pressure: 1/(Z R T). */
  public double molPerM3Pa(double[] partialPa) {
    return 1 / (z(partialPa) * rt);
  }
}

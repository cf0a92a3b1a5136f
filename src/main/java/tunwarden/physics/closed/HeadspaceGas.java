package tunwarden.physics.closed;

import java.util.Arrays;
import tunwarden.physics.gas.DryBlend;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.liquid.WagnerPruss1993;
import tunwarden.units.Constants;

/**
 * The gas of a headspace by itself, between moles and pressure, real gas; the water vapour shares
 * the room as an ideal gas. Arrays are in the order of {@link Gas}. Not thread-safe, does not
 * allocate after construction.
 */
public final class HeadspaceGas {
  private static final int GASES = Gas.all().size();
  private static final int MOST_STEPS = 60;
  private static final double CLOSE_ENOUGH = 1e-13;

  private final DryBlend blend = new DryBlend();

  /**
   * Moles from partial pressures.
   *
   * @param partialPa partial pressures, Pa
   * @param volumeM3 room for gas, m³
   * @param temperatureK temperature, K
   * @param outMol moles
   */
  public void mol(double[] partialPa, double volumeM3, double temperatureK, double[] outMol) {
    double density = blend.prepareAt(temperatureK, partialPa).molPerM3Pa(partialPa);
    for (int i = 0; i < GASES; i++) {
      outMol[i] = partialPa[i] * volumeM3 * density;
    }
  }

  /**
   * Total pressure, Pa absolute, from moles, water vapour included. Without room there is no answer
   * from the gas alone, and the vapour pressure is returned.
   *
   * @param mol moles in the headspace
   * @param volumeM3 room for gas, m³
   * @param temperatureK temperature, K
   * @param outPartialPa partial pressures, Pa
   */
  public double totalPa(double[] mol, double volumeM3, double temperatureK, double[] outPartialPa) {
    double vapour = WagnerPruss1993.pa(temperatureK);
    if (!(volumeM3 > 0)) {
      Arrays.fill(outPartialPa, 0);
      return vapour;
    }
    double perMol = Constants.GAS_CONSTANT * temperatureK / volumeM3;
    double dry = 0;
    for (int i = 0; i < GASES; i++) {
      outPartialPa[i] = mol[i] * perMol;
      dry += outPartialPa[i];
    }
    double ideal = dry;
    blend.prepareAt(temperatureK, mol);
    double z = 1;
    for (int step = 0; step < MOST_STEPS; step++) {
      double next = blend.z(outPartialPa);
      boolean settled = Math.abs(next - z) <= CLOSE_ENOUGH;
      for (int i = 0; i < GASES; i++) {
        outPartialPa[i] *= next / z;
      }
      z = next;
      if (settled) {
        break;
      }
    }
    return vapour + ideal * z;
  }
}

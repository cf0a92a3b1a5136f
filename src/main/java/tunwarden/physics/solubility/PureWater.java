package tunwarden.physics.solubility;

import tunwarden.physics.gas.Weiss1974Virial;
import tunwarden.physics.liquid.Kell1975;
import tunwarden.physics.liquid.WagnerPruss1993;
import tunwarden.units.Constants;

/**
 * What every gas needs to know of water at one temperature, computed once and shared between the
 * lines of a solver. Not thread-safe, does not allocate.
 */
public final class PureWater {
  private static final double LEAST_K = 243.15;
  private static final double MOST_K = 423.15;

  private double temperature = Double.NaN;
  private double rt;
  private double vapour;
  private double density;
  private double third;

  /** Prepares for a temperature, K; outside −30..150 °C it is held at that edge. */
  public PureWater prepareAt(double temperatureK) {
    double held = Math.max(LEAST_K, Math.min(MOST_K, temperatureK));
    if (held != temperature) {
      temperature = held;
      rt = Constants.GAS_CONSTANT * held;
      vapour = WagnerPruss1993.pa(held);
      density = Kell1975.kgPerM3(held);
      third = Weiss1974Virial.third(held);
    }
    return this;
  }

  /** Temperature it is prepared for, K. */
  public double temperatureK() {
    return temperature;
  }

  /** Vapour pressure, Pa. */
  public double vapourPa() {
    return vapour;
  }

  double rt() {
    return rt;
  }

  double density() {
    return density;
  }

  double third() {
    return third;
  }
}

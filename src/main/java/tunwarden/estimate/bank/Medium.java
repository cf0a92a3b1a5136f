package tunwarden.estimate.bank;

import tunwarden.physics.closed.ClosedVessel;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.units.Constants;
import tunwarden.vessel.Vessel;

/**
 * Everything about one vessel that depends on temperature, tabulated once so that a step costs a
 * few multiplications; immutable and safe to share. Between the half-kelvin knots the error is
 * below 1e-5 of the value.
 */
public final class Medium {
  private static final double FIRST_K = Constants.ZERO_CELSIUS_K - 10;
  private static final double KNOT_K = 0.5;
  private static final int KNOTS = 181;
  private static final double LOW_PA = 1e5;
  private static final double HIGH_PA = 5e5;
  private static final double LEAST_ULLAGE = 1e-3;
  private static final double LEAST_FILL = 1e-3;

  private static final int SOLUBILITY = 0;
  private static final int SOLUBILITY_HIGH = 1;
  private static final int VIRIAL = 2;
  private static final int VAPOUR = 3;
  private static final int SWELL = 4;
  private static final int COLUMNS = 5;

  private final double[] table = new double[KNOTS * COLUMNS];
  private final Vessel vessel;
  private final double relationU;
  private final double co2Share;
  private final double fillM3;

  /** Tabulates the vessel's liquid. */
  public Medium(Vessel vessel) {
    this.vessel = vessel;
    LiquidSolubility solubility = LiquidSolubility.of(vessel.liquid());
    relationU = solubility.relativeStandardUncertainty(Gas.CO2);
    co2Share = vessel.gas().fraction(Gas.CO2);
    fillM3 = Math.max(vessel.fillM3(), LEAST_FILL * vessel.volumeM3());
    ClosedVessel closed =
        new ClosedVessel(vessel.volumeM3(), fillM3, Constants.ZERO_CELSIUS_K, vessel.liquid());
    for (int i = 0; i < KNOTS; i++) {
      double kelvin = FIRST_K + KNOT_K * i;
      int row = i * COLUMNS;
      table[row + SOLUBILITY] = chord(solubility, LOW_PA, kelvin);
      table[row + SOLUBILITY_HIGH] = chord(solubility, HIGH_PA, kelvin);
      table[row + VIRIAL] = (RealGas.z(Gas.CO2, LOW_PA, kelvin) - 1) / LOW_PA;
      table[row + VAPOUR] = solubility.vapourPressurePa(kelvin);
      table[row + SWELL] = closed.liquidM3(kelvin) / fillM3;
    }
  }

  private static double chord(LiquidSolubility solubility, double pa, double kelvin) {
    double partial = pa - solubility.vapourPressurePa(kelvin);
    return solubility.dissolvedKgPerM3(Gas.CO2, partial, pa, kelvin) / partial;
  }

  public Vessel vessel() {
    return vessel;
  }

  /** Relative standard uncertainty of the solubility relation. */
  public double relationU() {
    return relationU;
  }

  /** CO2 in the gas that is supplied, 0..1. */
  public double co2Share() {
    return co2Share;
  }

  /** Liquid volume at the temperature it was filled, m3; never quite zero. */
  public double fillM3() {
    return fillM3;
  }

  /** Water vapour, Pa. */
  public double vapourPa(double kelvin) {
    return column(VAPOUR, kelvin);
  }

  /** Dissolved CO2 over its partial pressure, kg/m3/Pa, under a total pressure in Pa absolute. */
  public double solubility(double kelvin, double paAbsolute) {
    double low = column(SOLUBILITY, kelvin);
    double high = column(SOLUBILITY_HIGH, kelvin);
    return low + (high - low) * (paAbsolute - LOW_PA) / (HIGH_PA - LOW_PA);
  }

  /** CO2 the headspace holds per Pa of partial pressure, in kg per m3 of liquid. */
  public double headspace(double kelvin, double paAbsolute, double fillKelvin) {
    double swell = column(SWELL, kelvin) / column(SWELL, fillKelvin);
    double liquid = fillM3 * swell;
    double gas = Math.max(vessel.volumeM3() - liquid, LEAST_ULLAGE * vessel.volumeM3());
    double z = 1 + column(VIRIAL, kelvin) * paAbsolute;
    double molarMass = Gas.CO2.molarMass();
    return molarMass * gas / (fillM3 * z * Constants.GAS_CONSTANT * kelvin);
  }

  private double column(int which, double kelvin) {
    double at = Math.max(0, Math.min(KNOTS - 1.001, (kelvin - FIRST_K) / KNOT_K));
    int i = (int) at;
    int k = i * COLUMNS + which;
    return table[k] + (table[k + COLUMNS] - table[k]) * (at - i);
  }
}

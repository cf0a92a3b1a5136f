package tunwarden.physics.solubility;

import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.gas.Weiss1974Virial;
import tunwarden.units.Constants;

/**
 * One gas in pure water, prepared at one temperature. In the gas phase the rest of the headspace is
 * taken as air for CO2 and as CO2 for every other gas (Weiss 1974, Eq. 9, for a pair), which keeps
 * the answer a function of the gas's own share.
 */
final class WaterLine {
  private static final double WATER_MOLAR_MASS = 0.018015268;
  private static final double LN_WATER_MOLAR_MASS = Math.log(WATER_MOLAR_MASS);

  private final Gas gas;
  private PureWater water;
  private double lnMolality;
  private double reference;
  private double volume;
  private double second;
  private double excess;

  WaterLine(Gas gas) {
    this.gas = gas;
  }

  WaterLine prepareAt(PureWater prepared) {
    double temperatureK = prepared.temperatureK();
    water = prepared;
    volume = DissolvedVolume.m3PerMol(gas, temperatureK);
    second = RealGas.second(gas, temperatureK);
    excess = 2 * RealGas.excessWithCo2(gas, temperatureK);
    if (gas == Gas.CO2) {
      lnMolality = Weiss1974.lnMolalityPerPa(temperatureK);
      reference = Constants.STANDARD_ATMOSPHERE_PA;
      excess = 2 * Weiss1974Virial.excessWithAir(temperatureK);
    } else {
      lnMolality = -lnHenryPa(gas, temperatureK) - LN_WATER_MOLAR_MASS;
      reference = prepared.vapourPa();
    }
    return this;
  }

  /** ln of the Henry fugacity over mole fraction, Pa, at the correlation's own reference. */
  static double lnHenryPa(Gas gas, double temperatureK) {
    return switch (gas) {
      case CO2 -> -Weiss1974.lnMolalityPerPa(temperatureK) - LN_WATER_MOLAR_MASS;
      case O2, N2 -> RettichFit.lnHenryPa(gas, temperatureK);
      default -> IapwsG704.lnHenryPa(gas, temperatureK);
    };
  }

  double vapourPa() {
    return water.vapourPa();
  }

  /** Dissolved gas, kg per m³ of solution, by Henry's law on the mole fraction. */
  double dissolved(double partialPa, double totalPa) {
    // mole fraction over the molar mass of water, mol/kg
    double dilute = partialPa * Math.exp(lnSlope(partialPa, totalPa));
    double density = water.density();
    double swelling = dilute * (volume * density - WATER_MOLAR_MASS);
    return dilute * gas.molarMass() * density / (1 + swelling);
  }

  /** ln of mole fraction over the molar mass of water and over partial pressure. */
  private double lnSlope(double partialPa, double totalPa) {
    double rt = water.rt();
    double q = Math.min(totalPa, RealGas.SERIES_LIMIT_PA) / rt;
    double rest = Math.max(0, 1 - partialPa / totalPa);
    double shape =
        gas == Gas.CO2 ? (1 - rest) * (1 - rest) * (1 + 2 * rest) : -2 * rest * rest * rest;
    double lnPhi = q * (second + rest * rest * excess + q * water.third() * shape / 2);
    return lnMolality + lnPhi - volume * (totalPa - reference) / rt;
  }
}

package tunwarden.forecast.relief;

import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.RealGas;
import tunwarden.units.Constants;
import tunwarden.vessel.ReliefOrifice;

/**
 * A supply regulator fails open: gas streams into the headspace until the supply's own pressure is
 * reached. The liquid takes none up meanwhile, which makes the time a short one.
 *
 * @param supplyPaAbsolute pressure behind the regulator, Pa absolute
 * @param seat flow path of the open regulator
 * @param gas what is supplied
 * @param temperatureK its temperature, K
 */
public record SupplyFailure(
    double supplyPaAbsolute, ReliefOrifice seat, GasMix gas, double temperatureK) {
  private static final int POINTS = 24;

  /**
   * Time to fill a headspace from one pressure to another, s; infinite if the supply cannot.
   *
   * @param headspaceM3 headspace, m³
   * @param fromPaAbsolute pressure now, Pa absolute
   * @param toPaAbsolute pressure to reach, Pa absolute
   */
  public double seconds(double headspaceM3, double fromPaAbsolute, double toPaAbsolute) {
    if (!(toPaAbsolute > fromPaAbsolute)) {
      return 0;
    }
    if (!(supplyPaAbsolute > toPaAbsolute)) {
      return Double.POSITIVE_INFINITY;
    }
    // p = supply − u² takes away the square-root end of the subcritical flow
    double turn = supplyPaAbsolute * IsentropicOrifice.criticalRatio(IsentropicOrifice.k(gas));
    double middle = Math.max(fromPaAbsolute, Math.min(toPaAbsolute, turn));
    return headspaceM3 * (leg(fromPaAbsolute, middle) + leg(middle, toPaAbsolute));
  }

  private double leg(double low, double high) {
    if (!(high > low)) {
      return 0;
    }
    double first = Math.sqrt(supplyPaAbsolute - high);
    double half = (Math.sqrt(supplyPaAbsolute - low) - first) / 2;
    var rule = new GaussIntegratorFactory().legendre(POINTS);
    return half * rule.integrate(x -> perRoot(first + half * (1 + x)));
  }

  private double perRoot(double u) {
    double pa = supplyPaAbsolute - u * u;
    double z = RealGas.z(gas, pa, temperatureK);
    double kgPerM3Pa =
        IsentropicOrifice.molarMass(gas) / (Constants.GAS_CONSTANT * temperatureK * z * z);
    var orifice = new IsentropicOrifice(seat.areaM2(), seat.dischargeCoefficient());
    return 2 * u * kgPerM3Pa / orifice.kgPerS(gas, supplyPaAbsolute, pa, temperatureK);
  }
}

package tunwarden.forecast.relief;

import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
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
 * @param seat flow path of the open regulator, if known
 * @param kgPerS its largest flow, kg/s, if that is known instead
 * @param gas what is supplied
 * @param temperatureK its temperature, K
 */
public record SupplyFailure(
    double supplyPaAbsolute,
    Optional<ReliefOrifice> seat,
    OptionalDouble kgPerS,
    GasMix gas,
    double temperatureK) {
  private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(24);

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
    if (seat.isEmpty()) {
      double kg = kgPerM3(toPaAbsolute) - kgPerM3(fromPaAbsolute);
      return headspaceM3 * kg / kgPerS.orElse(0);
    }
    // p = supply − u² takes away the square-root end of the subcritical flow
    double turn = supplyPaAbsolute * IsentropicOrifice.criticalRatio(IsentropicOrifice.k(gas));
    double middle = Math.max(fromPaAbsolute, Math.min(toPaAbsolute, turn));
    return headspaceM3 * (leg(fromPaAbsolute, middle) + leg(middle, toPaAbsolute));
  }

  private double kgPerM3(double pa) {
    double z = RealGas.z(gas, pa, temperatureK);
    return pa * IsentropicOrifice.molarMass(gas) / (Constants.GAS_CONSTANT * temperatureK * z);
  }

  private double leg(double low, double high) {
    if (!(high > low)) {
      return 0;
    }
    double first = Math.sqrt(supplyPaAbsolute - high);
    double half = (Math.sqrt(supplyPaAbsolute - low) - first) / 2;
    return half * RULE.integrate(x -> perRoot(first + half * (1 + x)));
  }

  private double perRoot(double u) {
    double pa = supplyPaAbsolute - u * u;
    double z = RealGas.z(gas, pa, temperatureK);
    double kgPerM3Pa =
        IsentropicOrifice.molarMass(gas) / (Constants.GAS_CONSTANT * temperatureK * z * z);
    ReliefOrifice open = seat.orElseThrow();
    var orifice = new IsentropicOrifice(open.areaM2(), open.dischargeCoefficient());
    return 2 * u * kgPerM3Pa / orifice.kgPerS(gas, supplyPaAbsolute, pa, temperatureK);
  }
}

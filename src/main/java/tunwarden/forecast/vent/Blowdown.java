package tunwarden.forecast.vent;

import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;
import tunwarden.forecast.World;
import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.RealGas;
import tunwarden.units.Constants;
import tunwarden.vessel.ReliefOrifice;

/**
 * How long the headspace takes to blow down through an orifice, gas only: the liquid gives nothing
 * off meanwhile. dt = dm / ṁ(p), integrated over u with p = ambient + u², which takes away the
 * square-root end of the subcritical flow; critical and subcritical parts are integrated apart.
 */
public final class Blowdown {
  private static final double ADIABATIC = 0.3;
  private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(24);

  private Blowdown() {}

  /**
   * Time, s, from the world's present pressure down to a target; isothermal or adiabatic as the
   * world's vent cooling says.
   */
  public static double seconds(World world, double toPaGauge, ReliefOrifice path) {
    GasMix gas = world.headspaceGas();
    double ambient = world.ambientPa();
    double from = world.paGauge() + ambient;
    double to = Math.max(toPaGauge, 0) + ambient;
    if (!(from > to)) {
      return 0;
    }
    var orifice = new IsentropicOrifice(path.areaM2(), path.dischargeCoefficient());
    double turn = ambient / IsentropicOrifice.criticalRatio(IsentropicOrifice.k(gas));
    double critical = Math.max(to, Math.min(from, turn));
    Leg leg = new Leg(world, gas, orifice, from);
    return leg.seconds(critical, from) + leg.seconds(to, critical);
  }

  /** The integrand. */
  private record Leg(World world, GasMix gas, IsentropicOrifice orifice, double fromPa) {
    double seconds(double low, double high) {
      double ambient = world.ambientPa();
      if (!(high > low)) {
        return 0;
      }
      double first = Math.sqrt(low - ambient);
      double half = (Math.sqrt(high - ambient) - first) / 2;
      return half * RULE.integrate(x -> perRoot(first + half * (1 + x)));
    }

    /** dt/du at p = ambient + u². */
    private double perRoot(double u) {
      double pa = world.ambientPa() + u * u;
      double exponent = 1 + ADIABATIC * world.ventCooling();
      double kelvin = world.temperatureK() * Math.pow(pa / fromPa, (exponent - 1) / exponent);
      double z = RealGas.z(gas, pa, kelvin);
      double kgPerPa =
          world.headspaceM3()
              * IsentropicOrifice.molarMass(gas)
              / (Constants.GAS_CONSTANT * kelvin * z * z * exponent);
      return 2 * u * kgPerPa / orifice.kgPerS(gas, pa, world.ambientPa(), kelvin);
    }
  }
}

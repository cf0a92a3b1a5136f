package tunwarden.forecast.vent;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BracketedUnivariateSolver;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.hipparchus.ode.ExpandableODE;
import org.hipparchus.ode.ODEState;
import org.hipparchus.ode.ODEStateAndDerivative;
import org.hipparchus.ode.OrdinaryDifferentialEquation;
import org.hipparchus.ode.events.Action;
import org.hipparchus.ode.events.AdaptableInterval;
import org.hipparchus.ode.events.ODEEventDetector;
import org.hipparchus.ode.events.ODEEventHandler;
import org.hipparchus.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Present;
import tunwarden.forecast.World;
import tunwarden.physics.liquid.Liquid;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.Vessel;

class BlowdownTest {
  private static final double BAR = 1e5;
  private static final double KELVIN = 277.15;
  private static final double AMBIENT = 101_325;

  private static World world(double volumeM3, double fillM3, double bar) {
    Vessel vessel = Vessel.plain("T", volumeM3, fillM3, Liquid.WATER);
    return Ensemble.of(Present.atRest(vessel, bar * BAR, KELVIN)).middle();
  }

  /** Both regimes, alone and across the turn at 0.84 bar gauge. */
  @ParameterizedTest
  @CsvSource({"3, 1.5", "2, 0.3", "1, 0", "0.6, 0.1", "0.3, 0", "8, 0.2"})
  void agreesWithAnIndependentIntegrationInTime(double fromBar, double toBar) {
    ReliefOrifice path = new ReliefOrifice(0.012, 0.62);
    double ours = Blowdown.seconds(world(2, 1.8, fromBar), toBar * BAR, path);
    double theirs = integrated(0.2, fromBar * BAR, toBar * BAR, path);
    assertEquals(theirs, ours, 0.01 * theirs);
  }

  /**
   * P = P0 exp(−t/τ) while choked; 1 m³ of ideal CO2 at 4 °C through 100 mm² with Kd 0.975 has τ =
   * 67 s (computed). The real gas holds 1/Z² more per pascal and flows 1/√Z faster; Z = 0.9807 at 3
   * bar absolute and 4 °C (gas_k_and_z.csv, computed with CoolProp).
   */
  @Test
  void agreesWithTheClosedFormWhileChoked() {
    ReliefOrifice path = new ReliefOrifice(Math.sqrt(100e-6 * 4 / Math.PI), 0.975);
    double ours = Blowdown.seconds(world(1.000_001, 1e-6, 3), 1 * BAR, path);
    double tau = 67 * Math.pow(0.9807, -1.5);
    double closedForm = tau * Math.log((3 * BAR + AMBIENT) / (BAR + AMBIENT));
    assertEquals(closedForm, ours, 0.01 * closedForm);
  }

  @Test
  void nothingToBlowDownTakesNoTime() {
    assertEquals(0, Blowdown.seconds(world(2, 1.8, 0.5), 0.5 * BAR, new ReliefOrifice(0.01, 1)));
  }

  @Test
  void twiceTheDiameterTakesAQuarterOfTheTime() {
    double narrow = Blowdown.seconds(world(2, 1.8, 1), 0.1 * BAR, new ReliefOrifice(0.01, 1));
    double wide = Blowdown.seconds(world(2, 1.8, 1), 0.1 * BAR, new ReliefOrifice(0.02, 1));
    assertEquals(4, narrow / wide, 1e-9);
    assertTrue(narrow > 0);
  }

  /** Mass against time with the gas law and the nozzle written out here, Dormand-Prince 8(5,3). */
  private static double integrated(
      double headspaceM3, double fromPa, double toPa, ReliefOrifice path) {
    double rt = 8.314462618 * KELVIN / 0.0440095;
    double b =
        (-1636.75 + KELVIN * (12.0408 + KELVIN * (-3.27957e-2 + KELVIN * 3.16528e-5))) * 1e-6;
    double bMass = b / 0.0440095;
    OrdinaryDifferentialEquation flow =
        new OrdinaryDifferentialEquation() {
          @Override
          public int getDimension() {
            return 1;
          }

          @Override
          public double[] computeDerivatives(double t, double[] kg) {
            double density = kg[0] / headspaceM3;
            return new double[] {-nozzle(pressure(density), density, path)};
          }

          private double pressure(double density) {
            return density * rt * (1 + bMass * density);
          }
        };
    double target = density(toPa + AMBIENT, rt, bMass) * headspaceM3;
    var integrator = new DormandPrince853Integrator(1e-9, 5, 1e-10, 1e-10);
    integrator.addEventDetector(reached(target));
    double start = density(fromPa + AMBIENT, rt, bMass) * headspaceM3;
    return integrator
        .integrate(new ExpandableODE(flow), new ODEState(0, new double[] {start}), 1e5)
        .getTime();
  }

  private static double density(double pa, double rt, double bMass) {
    return (Math.sqrt(1 + 4 * bMass * pa / rt) - 1) / (2 * bMass);
  }

  private static double nozzle(double pa, double density, ReliefOrifice path) {
    double k = 1.3;
    double ratio = AMBIENT / pa;
    double choked = Math.pow(2 / (k + 1), k / (k - 1));
    double r = Math.max(ratio, choked);
    double term = Math.max(0, Math.pow(r, 2 / k) - Math.pow(r, (k + 1) / k));
    double area = path.areaM2() * path.dischargeCoefficient();
    return area * Math.sqrt(2 * k / (k - 1) * pa * density * term);
  }

  /** Stops a hair before the target so that the square-root end at the atmosphere is reached. */
  private static ODEEventDetector reached(double targetKg) {
    return new ODEEventDetector() {
      @Override
      public AdaptableInterval getMaxCheckInterval() {
        return (state, forward) -> 1;
      }

      @Override
      public int getMaxIterationCount() {
        return 100;
      }

      @Override
      public BracketedUnivariateSolver<UnivariateFunction> getSolver() {
        return new BracketingNthOrderBrentSolver(0, 1e-6, 0, 5);
      }

      @Override
      public ODEEventHandler getHandler() {
        return (state, detector, increasing) -> Action.STOP;
      }

      @Override
      public double g(ODEStateAndDerivative state) {
        return state.getPrimaryState()[0] - targetKg * (1 + 1e-5);
      }
    };
  }
}

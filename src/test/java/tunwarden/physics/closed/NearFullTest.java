package tunwarden.physics.closed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;

/** The last two per cent of fill: a cliff, but never a jump and never an infinity. */
class NearFullTest {
  private static final double FILL_K = 275.15;

  /**
   * 99.5 % full at 2 °C, warmed to 30 °C with no gas going into the liquid: the headspace pressure
   * is multiplied by about 7.8 (computed from IAPWS-95 densities, ideal gas).
   */
  @Test
  void theHeadspaceAloneIsSqueezedNearlyEightfold() {
    ClosedVessel vessel = new ClosedVessel(1, 0.995, FILL_K, Liquid.WATER);
    double[] partial = new double[Gas.all().size()];
    partial[Gas.N2.ordinal()] = 1e5;
    double[] mol = new double[partial.length];
    HeadspaceGas gas = new HeadspaceGas();
    gas.mol(partial, vessel.headspaceM3(FILL_K), FILL_K, mol);
    double[] squeezed = new double[partial.length];
    gas.totalPa(mol, vessel.headspaceM3(303.15), 303.15, squeezed);
    assertEquals(7.8, squeezed[Gas.N2.ordinal()] / 1e5, 0.35);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.95, 0.99, 0.995, 0.999, 0.9999, 1.0})
  void pressureRisesWithoutAJumpThroughLiquidFull(double fill) {
    for (GasMix gas : new GasMix[] {GasMix.CO2, GasMix.pure(Gas.N2), GasMix.parse("50N2/50CO2")}) {
      ClosedVessel vessel = new ClosedVessel(1, fill, 277.15, Liquid.of(LiquidKind.BEER));
      double[] held = vessel.inventoryAt(2e5, 277.15, gas, 0).toArray();
      ClosedSolver solver = vessel.solver();
      double last = 0;
      boolean wasFull = fill == 1;
      for (double t = 279.15; t <= 333.15; t += 0.03) {
        solver.settle(held, t);
        double now = solver.totalPaAbsolute();
        String where = fill + " of " + gas + " at " + t;
        assertTrue(Double.isFinite(now) && now > last, where);
        if (last > 0) {
          assertTrue(now - last < 0.4e5, where + " rose by " + (now - last));
        }
        assertTrue(solver.liquidFull() || !wasFull, where);
        wasFull = solver.liquidFull();
        last = now;
      }
    }
  }

  /** Rigid, water at 20 °C: expansion over compressibility is 4.5 bar for each kelvin. */
  @Test
  void aFullRigidVesselRisesByBarsPerKelvin() {
    ClosedVessel vessel = new ClosedVessel(1, 1, 293.15, Liquid.WATER);
    ClosedState full = vessel.settle(Inventory.NONE, 294.15);
    ClosedState warmer = vessel.settle(Inventory.NONE, 295.15);
    assertTrue(full.liquidFull());
    double perKelvin = warmer.totalPaAbsolute() - full.totalPaAbsolute();
    assertEquals(2.15e-4 / 4.57e-10, perKelvin, 0.04e5 * 4.7);
  }

  @Test
  void aBrimfulVesselCooledOpensAHeadspaceAgain() {
    ClosedVessel vessel = new ClosedVessel(1, 1, 293.15, Liquid.of(LiquidKind.WINE));
    ClosedState cooled = vessel.settle(Inventory.NONE, 283.15);
    assertFalse(cooled.liquidFull());
    assertEquals(cooled.vapourPa(), cooled.totalPaAbsolute(), 1e-9);
  }
}

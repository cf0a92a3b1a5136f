package tunwarden.physics.closed;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.physics.liquid.WagnerPruss1993;

class ClosedVesselTest {
  private static final double COLD_K = 277.15;

  @Test
  void settlingWhatWasHeldGivesThePressureBack() {
    ClosedVessel vessel = new ClosedVessel(2, 1.8, COLD_K, Liquid.of(LiquidKind.BEER));
    for (double bar = 0.2; bar <= 20; bar += 0.3) {
      Inventory held = vessel.inventoryAt(bar * 1e5, COLD_K, GasMix.parse("70N2/30CO2"), 5000);
      ClosedState state = vessel.settle(held, COLD_K);
      assertEquals(bar * 1e5, state.totalPaAbsolute(), bar * 1e5 * 1e-10);
    }
  }

  @Test
  void headspaceMolesAndPressureAreInverse() {
    HeadspaceGas gas = new HeadspaceGas();
    double[] partial = new double[Gas.all().size()];
    partial[Gas.CO2.ordinal()] = 4e5;
    partial[Gas.N2.ordinal()] = 1e5;
    double[] mol = new double[partial.length];
    double[] back = new double[partial.length];
    gas.mol(partial, 0.1, COLD_K, mol);
    double total = gas.totalPa(mol, 0.1, COLD_K, back);
    assertArrayEquals(partial, back, 1e-5);
    assertEquals(5e5 + WagnerPruss1993.pa(COLD_K), total, 1e-5);
  }
}

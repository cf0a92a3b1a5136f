package tunwarden.physics.closed;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.junit.jupiter.api.Test;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.physics.liquid.WagnerPruss1993;
import tunwarden.units.Constants;

class ClosedVesselTest {
  private static final double COLD_K = 277.15;

  @Test
  void settlingWhatWasHeldGivesThePressureBack() {
    ClosedVessel vessel = new ClosedVessel(2, 1.8, COLD_K, Liquid.of(LiquidKind.BEER));
    for (double bar = 0.2; bar <= 20; bar += 0.3) {
      Inventory held = vessel.inventoryAt(bar * 1e5, COLD_K, GasMix.parse("70N2/30CO2"), 5000);
      ClosedState state = vessel.settle(held, COLD_K);
      assertEquals(bar * 1e5, state.totalPaAbsolute(), bar * 1e5 * 1e-9);
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

  /**
   * The balance written out afresh and solved by another solver: moles of CO2 in beer and headspace
   * against a Brent search on the partial pressure.
   */
  @Test
  void agreesWithABalanceWrittenOutAndSolvedOtherwise() {
    ClosedVessel vessel = new ClosedVessel(2, 1.9, COLD_K, Liquid.of(LiquidKind.BEER));
    Inventory held = vessel.inventoryAt(2.2e5, COLD_K, GasMix.CO2, 0);
    for (double t = 273.15; t < 333; t += 7) {
      double kelvin = t;
      double vapour = vessel.solubility().vapourPressurePa(kelvin);
      double root =
          new BracketingNthOrderBrentSolver(1e-6, 1e-6, 5)
              .solve(200, p -> held.mol(Gas.CO2) - co2(vessel, p, p + vapour, kelvin), 1, 40e5);
      ClosedState state = vessel.settle(held, kelvin);
      assertEquals(root + vapour, state.totalPaAbsolute(), 1e-3);
    }
  }

  private static double co2(ClosedVessel vessel, double partial, double total, double t) {
    double inLiquid =
        vessel.liquidM3(t)
            * vessel.solubility().dissolvedKgPerM3(Gas.CO2, partial, total, t)
            / Gas.CO2.molarMass();
    double z = RealGas.z(Gas.CO2, partial, t);
    return inLiquid + partial * vessel.headspaceM3(t) / (z * Constants.GAS_CONSTANT * t);
  }

  @Test
  void moreGasMeansMorePressureAndWarmerMeansMorePressure() {
    ClosedVessel vessel = new ClosedVessel(2, 1.8, COLD_K, Liquid.of(LiquidKind.CIDER));
    double last = 0;
    for (double mol = 0; mol < 900; mol += 10) {
      double now = vessel.settle(Inventory.NONE.plus(Gas.CO2, mol), COLD_K).totalPaAbsolute();
      assertTrue(now > last);
      last = now;
    }
    last = 0;
    for (double t = 271.15; t <= 333.15; t += 1) {
      double now = vessel.settle(Inventory.NONE.plus(Gas.CO2, 200), t).totalPaAbsolute();
      assertTrue(now > last);
      last = now;
    }
  }

  /** Left-over air of 50 mbar puts about 0.65 mg/L of oxygen into water at 4 °C. */
  @Test
  void airLeftOverIsSharedBetweenHeadspaceAndDrink() {
    ClosedVessel vessel = new ClosedVessel(1, 0.9, COLD_K, Liquid.WATER);
    Inventory held = vessel.inventoryAt(2e5, COLD_K, GasMix.CO2, 5000);
    ClosedState state = vessel.settle(held, COLD_K);
    assertEquals(5000 * 0.2095, state.partialPa(Gas.O2), 1);
    assertEquals(650, state.dissolvedOxygenMicrogramPerL(), 30);
  }

  @Test
  void anEmptyVesselIsAnIdealGasAtLowPressure() {
    ClosedVessel vessel = new ClosedVessel(3, 0, COLD_K, Liquid.WATER);
    Inventory held = Inventory.NONE.plus(Gas.N2, 0.5);
    double ideal = 0.5 * Constants.GAS_CONSTANT * 300 / 3;
    assertEquals(ideal, vessel.settle(held, 300).partialPa(Gas.N2), 0.01);
  }

  @Test
  void aFillThatDoesNotFitIsRefused() {
    assertThrows(
        IllegalArgumentException.class, () -> new ClosedVessel(1, 1.1, COLD_K, Liquid.WATER));
    assertThrows(
        IllegalArgumentException.class,
        () -> new ClosedVessel(1, Double.NaN, COLD_K, Liquid.WATER));
  }
}

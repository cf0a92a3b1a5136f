package tunwarden.physics.solubility;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static tunwarden.physics.Reference.kelvin;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.physics.closed.ClosedVessel;
import tunwarden.physics.closed.Inventory;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;

/** Facts every cellar hand knows. Common practice, no source. */
class TradeFactsTest {
  private static final LiquidSolubility WATER = LiquidSolubility.of(Liquid.WATER);

  private static double molPerBar(Gas gas, double t) {
    return WATER.dissolvedKgPerM3(gas, 1e5, 1e5 + WATER.vapourPressurePa(t), t) / gas.molarMass();
  }

  @Test
  void solubilityRisesFromNitrogenThroughOxygenAndArgonToKrypton() {
    for (double c = 0; c <= 60; c += 5) {
      double t = kelvin(c);
      assertTrue(molPerBar(Gas.N2, t) < molPerBar(Gas.O2, t), "N2 under O2 at " + c);
      assertTrue(molPerBar(Gas.O2, t) < molPerBar(Gas.AR, t), "O2 under Ar at " + c);
      assertTrue(molPerBar(Gas.AR, t) < molPerBar(Gas.KR, t), "Ar under Kr at " + c);
    }
  }

  @ParameterizedTest
  @EnumSource(Gas.class)
  void itIsProportionalToThePartialPressure(Gas gas) {
    double t = kelvin(10);
    double one = WATER.dissolvedKgPerM3(gas, 0.1e5, 1e5, t);
    double three = WATER.dissolvedKgPerM3(gas, 0.3e5, 1e5, t);
    assertEquals(3, three / one, 0.01);
  }

  @ParameterizedTest
  @EnumSource(
      value = Gas.class,
      names = {"CO2", "N2", "O2", "AR", "KR", "XE", "CH4"})
  void warmerLiquidHoldsLess(Gas gas) {
    for (double c = 0; c < 40; c += 2) {
      assertTrue(molPerBar(gas, kelvin(c)) > molPerBar(gas, kelvin(c + 2)), gas + " at " + c);
    }
  }

  @Test
  void aWarmLakeHoldsLessOxygenThanACoolOne() {
    assertTrue(molPerBar(Gas.O2, kelvin(25)) < 0.75 * molPerBar(Gas.O2, kelvin(8)));
  }

  /** Four grams per litre, filled cold, 3 % headspace, brought to a room of 20 °C. */
  @ParameterizedTest
  @EnumSource(
      value = LiquidKind.class,
      names = {"BEER", "SOFT_DRINK", "CIDER", "MINERAL_WATER", "KOMBUCHA"})
  void aClosedCarbonatedDrinkStandsUnderMoreThanOneAtmosphereOfCo2(LiquidKind kind) {
    Liquid liquid = Liquid.of(kind);
    ClosedVessel bottle = new ClosedVessel(0.5e-3, 0.485e-3, kelvin(4), liquid);
    double partial = bottle.solubility().partialPa(Gas.CO2, 4, 2e5, kelvin(4));
    double total = partial + bottle.solubility().vapourPressurePa(kelvin(4));
    Inventory held = bottle.inventoryAt(total, kelvin(4), GasMix.CO2, 0);
    assertTrue(bottle.settle(held, kelvin(20)).partialPa(Gas.CO2) > 101_325);
  }
}

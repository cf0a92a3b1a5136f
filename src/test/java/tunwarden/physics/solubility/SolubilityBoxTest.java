package tunwarden.physics.solubility;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.liquid.BeerMethod;
import tunwarden.physics.liquid.Kell1975;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.BadQuantityException;

/** Properties of every liquid over −2..60 °C and 0..20 bar absolute. */
class SolubilityBoxTest {
  private static final double[] SHARES = {0.02, 0.3, 0.8, 1};

  @ParameterizedTest
  @EnumSource(LiquidKind.class)
  void risesWithPressureAndComesBackThroughTheInverse(LiquidKind kind) {
    LiquidSolubility solubility = LiquidSolubility.of(Liquid.of(kind));
    Gas[] drinks = {Gas.CO2, Gas.N2, Gas.O2};
    for (Gas gas : kind == LiquidKind.WATER ? Gas.values() : drinks) {
      GasLine line = solubility.line(gas);
      for (double c = -2; c <= 60; c += 3.1) {
        line.prepareAt(273.15 + c);
        for (double share : SHARES) {
          double below = 0;
          for (double bar = 0.05; bar <= 20; bar += 0.95) {
            double total = bar * 1e5;
            double partial = share * total;
            double dissolved = line.dissolvedKgPerM3(partial, total);
            String where = gas + " at " + c + " C and " + share + " of " + bar + " bar";
            assertTrue(dissolved > below && Double.isFinite(dissolved), where);
            assertEquals(partial, line.partialPa(dissolved, total), partial * 1e-10, where);
            below = dissolved;
          }
        }
      }
    }
  }

  /** A relation's factor on water is held beyond its range, so nothing jumps at the edge. */
  @ParameterizedTest
  @EnumSource(LiquidKind.class)
  void isContinuousOverTheWholeBox(LiquidKind kind) {
    GasLine line = LiquidSolubility.of(Liquid.of(kind)).line(Gas.CO2);
    for (double bar = 0.1; bar <= 20; bar += 0.85) {
      double before = Double.NaN;
      for (double c = -2; c <= 60; c += 0.05) {
        line.prepareAt(273.15 + c);
        double dissolved = line.dissolvedKgPerM3(0.5 * bar * 1e5, bar * 1e5);
        if (!Double.isNaN(before)) {
          assertEquals(before, dissolved, 0.004 * before, "at " + c + " C and " + bar + " bar");
        }
        before = dissolved;
      }
    }
  }

  @ParameterizedTest
  @EnumSource(LiquidKind.class)
  void preparedAndUnpreparedAgreeToTheLastDigit(LiquidKind kind) {
    LiquidSolubility solubility = LiquidSolubility.of(Liquid.of(kind));
    GasLine line = solubility.line(Gas.CO2);
    for (double c : new double[] {30, -2, 4, 60, 4, 24.99}) {
      double t = 273.15 + c;
      assertEquals(
          solubility.dissolvedKgPerM3(Gas.CO2, 2e5, 3e5, t),
          line.prepareAt(t).dissolvedKgPerM3(2e5, 3e5));
    }
  }

  /**
   * In the gas phase a line takes the rest of the headspace as air, or as CO2 for any other gas;
   * that must stay near the fugacity of the true blend.
   */
  @Test
  void theGasPhaseOfALineIsNearThatOfTheTrueBlend() {
    GasMix[] blends = {GasMix.CO2, GasMix.parse("70N2/30CO2"), GasMix.parse("10N2/5O2/85CO2")};
    for (GasMix blend : blends) {
      for (Gas gas : new Gas[] {Gas.CO2, Gas.N2, Gas.O2}) {
        for (double bar = 1; bar <= 10 && blend.fraction(gas) > 0; bar++) {
          double t = 277.15;
          double pa = bar * 1e5;
          double share = blend.fraction(gas);
          double ratio = fugacityCoefficient(gas, share, pa, t);
          double whole = RealGas.fugacityCoefficient(gas, blend, pa, t);
          double within = gas == Gas.CO2 ? 0.0015 : 0.012;
          assertEquals(whole, ratio, within, gas + " in " + blend + " at " + bar);
        }
      }
    }
  }

  /** What the line uses, told from the dissolved amount with the liquid's terms taken out. */
  private static double fugacityCoefficient(Gas gas, double share, double pa, double t) {
    LiquidSolubility water = LiquidSolubility.of(Liquid.WATER);
    double moles = water.dissolvedKgPerM3(gas, share * pa, pa, t) / gas.molarMass();
    double volume = DissolvedVolume.m3PerMol(gas, t);
    double waterMoles = Kell1975.kgPerM3(t) * (1 - moles * volume) / 0.018015268;
    double fraction = moles / (moles + waterMoles);
    double reference = gas == Gas.CO2 ? 101_325 : water.vapourPressurePa(t);
    double squeeze = Math.exp(volume * (pa - reference) / (8.314462618 * t));
    return fraction * Math.exp(WaterLine.lnHenryPa(gas, t)) * squeeze / (share * pa);
  }

  @Test
  void noPressureDissolvesNothingAndNothingNeedsNoPressure() {
    LiquidSolubility beer = LiquidSolubility.of(Liquid.of(LiquidKind.BEER));
    assertEquals(0, beer.dissolvedKgPerM3(Gas.CO2, 0, 1e5, 277));
    assertEquals(0, beer.dissolvedKgPerM3(Gas.CO2, -1e5, 1e5, 277));
    assertEquals(0, beer.partialPa(Gas.CO2, 0, 1e5, 277));
  }

  /** Half a mole of common salt: log10(c0/c) = 0.5 (0.1143 + 0.0318 + 2 · −0.0172) at 25 °C. */
  @Test
  void saltDrivesGasOut() {
    double salted = mineral(Map.of("NaCl", 500.0)).dissolvedKgPerM3(Gas.CO2, 1e5, 1.03e5, 298.15);
    double plain = mineral(Map.of()).dissolvedKgPerM3(Gas.CO2, 1e5, 1.03e5, 298.15);
    assertEquals(Math.pow(10, -0.5 * 0.1117), salted / plain, 1e-9);
  }

  @Test
  void anUnknownSaltIsRefusedByName() {
    BadQuantityException refused =
        assertThrows(BadQuantityException.class, () -> mineral(Map.of("XyZ", 1.0)));
    assertTrue(refused.getMessage().startsWith("the salt 'XyZ' is not known; write one of NaCl"));
  }

  private static LiquidSolubility mineral(Map<String, Double> salts) {
    return LiquidSolubility.of(
        new Liquid(
            LiquidKind.MINERAL_WATER,
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            OptionalDouble.empty(),
            BeerMethod.EUROPEAN,
            salts));
  }
}

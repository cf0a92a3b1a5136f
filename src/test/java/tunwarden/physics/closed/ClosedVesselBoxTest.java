package tunwarden.physics.closed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;

/**
 * Properties of the closed vessel over the whole box −2..60 °C, 0..20 bar absolute, every liquid,
 * fills from empty to brim, CO2 with and without nitrogen and air. Random states, fixed seed.
 */
class ClosedVesselBoxTest {
  private static final int STATES = 2000;
  private static final double VOLUME = 2;
  private static final double[] FILLS = {0, 0.3, 0.8, 0.95, 0.99, 0.999, 1};
  private static final GasMix[] GASES = {
    GasMix.CO2, GasMix.parse("70N2/30CO2"), GasMix.parse("25N2/75CO2"), GasMix.pure(Gas.N2)
  };

  /** A random state of the box. */
  private record Drawn(ClosedVessel vessel, double kelvin, double pa, GasMix gas, double air) {
    static Drawn of(LiquidKind kind, SplittableRandom random) {
      double fill = VOLUME * FILLS[random.nextInt(FILLS.length)];
      double kelvin = 271.15 + 62 * random.nextDouble();
      double pa = 20e5 * random.nextDouble();
      GasMix gas = GASES[random.nextInt(GASES.length)];
      double air = random.nextInt(3) * 20e3 * random.nextDouble();
      return new Drawn(
          new ClosedVessel(VOLUME, fill, kelvin, Liquid.of(kind)), kelvin, pa, gas, air);
    }

    Inventory held() {
      return vessel.inventoryAt(pa, kelvin, gas, air);
    }

    double vapour() {
      return vessel.solubility().vapourPressurePa(kelvin);
    }
  }

  @ParameterizedTest
  @EnumSource(LiquidKind.class)
  void settlingGivesBackThePressureItWasFilledTo(LiquidKind kind) {
    SplittableRandom random = new SplittableRandom(1);
    for (int n = 0; n < STATES; n++) {
      Drawn d = Drawn.of(kind, random);
      ClosedSolver solver = d.vessel.solver();
      solver.settle(d.held().toArray(), d.kelvin);
      double expected = Math.max(d.pa, d.vapour());
      if (d.vessel.headspaceM3(d.kelvin) > 0 || d.vessel.liquidM3(d.kelvin) > 0) {
        assertEquals(expected, solver.totalPaAbsolute(), expected * 1e-8, d::toString);
      }
      assertTrue(solver.steps() <= 12, () -> solver.steps() + " steps for " + d);
    }
  }

  @ParameterizedTest
  @EnumSource(LiquidKind.class)
  void nothingIsLostAndNothingIsInfiniteAtAnyOtherTemperature(LiquidKind kind) {
    SplittableRandom random = new SplittableRandom(2);
    for (int n = 0; n < STATES; n++) {
      Drawn d = Drawn.of(kind, random);
      Inventory held = d.held();
      double to = 271.15 + 62 * random.nextDouble();
      ClosedState state = d.vessel.settle(held, to);
      ClosedSolver solver = d.vessel.solver();
      solver.settle(held.toArray(), to);
      assertTrue(Double.isFinite(state.totalPaAbsolute()) && state.totalPaAbsolute() > 0);
      assertEquals(state.liquidFull(), state.headspaceM3() == 0);
      double[] partial = new double[Gas.all().size()];
      for (Gas gas : Gas.all()) {
        partial[gas.ordinal()] = state.partialPa(gas);
      }
      double[] back = new double[partial.length];
      d.vessel.solver().inventoryAt(partial, gasPa(state), to, back);
      for (Gas gas : Gas.all()) {
        double there = held.mol(gas);
        assertEquals(there, back[gas.ordinal()], there * 1e-8, () -> gas + " of " + d);
      }
    }
  }

  private static double gasPa(ClosedState state) {
    double sum = state.vapourPa();
    for (Gas gas : Gas.all()) {
      sum += state.partialPa(gas);
    }
    return sum;
  }
}

package tunwarden.physics.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.physics.closed.ClosedVessel;
import tunwarden.physics.closed.Inventory;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.physics.uncertainty.MonteCarlo;

/**
 * The first-order interval against one drawn by Monte Carlo (JCGM 101) through the engine itself,
 * within 5 %. Gauge, thermometer, barometer, left-over air, fill and relation all vary.
 */
class MonteCarloTest {
  private static final double WITHIN = 0.05;
  private static final GaugeState STATE = new GaugeState(1.1e5, 279.15, 1.01e5, 6000);
  private static final Doubt DOUBT = new Doubt(1500, 0.4, 1500, 1500, 0.02);
  private static final double VOLUME = 2;
  private static final double FILL = 1.7;
  private static final double WARM_K = 298.15;

  @ParameterizedTest
  @EnumSource(LiquidKind.class)
  void dissolved(LiquidKind kind) {
    LiquidSolubility solubility = LiquidSolubility.of(Liquid.of(kind));
    double[] value = {STATE.paGauge(), STATE.temperatureK(), STATE.ambientPaAbsolute(), 6000, 1};
    double[] standard = {1500, 0.4, 1500, 1500, solubility.relativeStandardUncertainty(Gas.CO2)};
    double drawn =
        new MonteCarlo(
                value,
                standard,
                60_000,
                x -> {
                  double total = x[0] + x[2];
                  double partial = total - solubility.vapourPressurePa(x[1]) - x[3];
                  return x[4] * solubility.dissolvedKgPerM3(Gas.CO2, partial, total, x[1]);
                })
            .u95();
    Answer answer = Equilibrium.of(Liquid.of(kind), GasMix.CO2).dissolved(Gas.CO2, STATE, DOUBT);
    assertEquals(drawn, answer.u95(), WITHIN * drawn);
  }

  @ParameterizedTest
  @EnumSource(
      value = LiquidKind.class,
      names = {"BEER", "SPARKLING_WINE", "WATER"})
  void warmedPressure(LiquidKind kind) {
    Liquid liquid = Liquid.of(kind);
    LiquidSolubility solubility = LiquidSolubility.of(liquid);
    double relation = solubility.relativeStandardUncertainty(Gas.CO2);
    double course = relation * (WARM_K - STATE.temperatureK()) / 20;
    double[] value = {1.1e5, 279.15, 1.01e5, 6000, FILL, 1, 1};
    double[] standard = {1500, 0.4, 1500, 1500, 0.02, relation, course};
    double drawn =
        new MonteCarlo(
                value,
                standard,
                12_000,
                x -> {
                  ClosedVessel vessel = new ClosedVessel(VOLUME, x[4], x[1], liquid);
                  Inventory held =
                      vessel
                          .withSolubility(solubility.scaled(x[5]))
                          .inventoryAt(x[0] + x[2], x[1], GasMix.CO2, x[3]);
                  return vessel
                          .withSolubility(solubility.scaled(x[5] * x[6]))
                          .settle(held, WARM_K)
                          .totalPaAbsolute()
                      - x[2];
                })
            .u95();
    Answer answer =
        Warming.of(VOLUME, FILL, liquid, GasMix.CO2).pressurePaGauge(STATE, WARM_K, DOUBT);
    assertEquals(drawn, answer.u95(), WITHIN * drawn);
  }
}

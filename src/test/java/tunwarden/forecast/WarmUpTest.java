package tunwarden.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

class WarmUpTest {
  private static final double BAR = 1e5;
  private static final double COLD_K = 277.15;
  private static final double WARM_K = 297.15;
  private static final double TAU_S = 30 * 3600;
  private static final Vessel TANK = Vessel.plain("T", 2, 1.8, Liquid.of(LiquidKind.BEER));
  private static final World WORLD = Ensemble.of(Present.atRest(TANK, 0.8 * BAR, COLD_K)).middle();

  private static Spread rates(double low, double middle, double high) {
    return new Spread(low, middle, high);
  }

  /** With instant transfer the vessel is always at rest: τ ln((Ta − T0)/(Ta − Tl)). */
  @Test
  void aLivelyLiquidLiftsTheValveAtTheLiftTemperature() {
    double lift = 1.4 * BAR;
    double liftK = Forecaster.liftK(WORLD, ReliefSetting.stated(lift, 0)).orElseThrow();
    double exact = TAU_S * Math.log((WARM_K - COLD_K) / (WARM_K - liftK));
    TimeRange range = new WarmUp(WORLD, WARM_K, TAU_S).until(lift, rates(1, 1, 1)).orElseThrow();
    assertEquals(exact, range.middle().toSeconds(), 0.01 * exact);
  }

  /** Without transfer only the gas heats: p T'/T and the liquid's swelling, by the gas law. */
  @Test
  void aDeadLiquidLetsOnlyTheHeadspaceHeat() {
    double reached = WORLD.unmixedPaGauge(287.15);
    TimeRange range = new WarmUp(WORLD, WARM_K, TAU_S).until(reached, rates(0, 0, 0)).orElseThrow();
    double exact = TAU_S * Math.log(2);
    assertEquals(exact, range.middle().toSeconds(), 0.01 * exact);
  }

  @Test
  void theRangeIsOrderedAndOpenWhereASlowLiquidNeverGetsThere() {
    TimeRange range =
        new WarmUp(WORLD, WARM_K, TAU_S).until(1.4 * BAR, rates(1e-9, 1e-6, 1e-4)).orElseThrow();
    assertTrue(range.low().compareTo(range.middle()) < 0, range.toString());
    assertTrue(range.high().isEmpty(), range.toString());
  }

  /** Explicit Euler in small steps of the same two-part law, written out here. */
  @Test
  void agreesWithAnIntegrationInSmallSteps() {
    double kla = 2e-6;
    double rate = kla * (1 + WORLD.capacityRatio());
    double pa = WORLD.paGauge();
    double step = 60;
    double t = 0;
    while (pa < 1.2 * BAR) {
      double now = WARM_K - (WARM_K - COLD_K) * Math.exp(-t / TAU_S);
      double next = WARM_K - (WARM_K - COLD_K) * Math.exp(-(t + step) / TAU_S);
      pa += WORLD.unmixedPaGauge(next) - WORLD.unmixedPaGauge(now);
      pa += rate * step * (WORLD.restPaGauge(now) - pa);
      t += step;
    }
    TimeRange range =
        new WarmUp(WORLD, WARM_K, TAU_S).until(1.2 * BAR, rates(kla, kla, kla)).orElseThrow();
    assertEquals(t, range.middle().toSeconds(), 0.01 * t);
  }

  @Test
  void aValveSetHighIsNotReached() {
    assertTrue(new WarmUp(WORLD, WARM_K, TAU_S).until(5 * BAR, rates(1e-5, 1e-5, 1)).isEmpty());
  }
}

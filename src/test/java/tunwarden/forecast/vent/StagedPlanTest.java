package tunwarden.forecast.vent;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimate.Spread;

/** The liquid here takes up gas in proportion to pressure, so that every step can be checked. */
class StagedPlanTest {
  private static final double BAR = 1e5;
  private static final double HENRY = 2.5 / BAR;
  private static final double KLA = 1e-5;

  private static StagedPlan plan(double fromBar, double toBar, double dissolved, double bound) {
    return StagedPlan.of(
        new StagedPlan.Start(
            fromBar * BAR,
            toBar * BAR,
            BAR,
            dissolved,
            2,
            new Spread(KLA / 5, KLA, 5 * KLA),
            pa -> HENRY * pa,
            pa -> 3 * pa / BAR),
        bound);
  }

  @Test
  void noStepPassesTheBoundAndTheLastReachesTheTarget() {
    StagedPlan plan = plan(3, 1, 7.5, 0.4);
    assertTrue(plan.isComplete());
    double dissolved = 7.5;
    for (Stage stage : plan.stages()) {
      double equilibrium = HENRY * (stage.toPaGauge() + BAR);
      assertEquals(dissolved / equilibrium - 1, stage.supersaturation(), 1e-4);
      assertTrue(stage.supersaturation() <= 0.4 + 1e-4, stage.toString());
      dissolved -= stage.followsKg() / 2;
    }
    Stage last = plan.stages().get(plan.stages().size() - 1);
    assertEquals(0, last.toPaGauge(), 1.01);
    assertTrue(last.hold().isEmpty());
  }

  @Test
  void headspaceGasAddsUpOverTheSteps() {
    double once = plan(3, 1, 7.5, 0.4).stages().stream().mapToDouble(Stage::leavesAtOnceKg).sum();
    assertEquals(6, once, 1e-3);
  }

  @Test
  void aWaitLetsThreeQuartersOfTheExcessGoAndItsRangeFollowsTheTransferRate() {
    var hold = plan(3, 1, 7.5, 0.4).stages().get(0).hold().orElseThrow();
    assertEquals(Math.log(4) / KLA, hold.middle().toSeconds(), 1e-4 * Math.log(4) / KLA * 5);
    assertEquals(Math.log(4) / KLA / 5, hold.low().toSeconds(), 1e-4 * Math.log(4) / KLA * 5);
    assertEquals(
        Math.log(4) / KLA * 5, hold.high().orElseThrow().toSeconds(), 1e-4 * Math.log(4) / KLA * 5);
  }

  @Test
  void oneStepIsEnoughWhenTheBoundAllowsIt() {
    StagedPlan plan = plan(1.3, 1, 1.3 * 2.5, 0.5);
    assertEquals(1, plan.stages().size());
    assertEquals(0.3, plan.stages().get(0).supersaturation(), 1e-9);
  }

  @Test
  void aLiquidAlreadyAboveTheBoundWaitsBeforeAnythingIsVented() {
    StagedPlan plan = plan(2, 1, 10, 0.5);
    assertEquals(BAR, plan.stages().get(0).toPaGauge(), 1e-9);
    assertEquals(0, plan.stages().get(0).leavesAtOnceKg(), 1e-9);
    assertTrue(plan.stages().get(0).hold().isPresent());
  }

  @Test
  void aBoundTooTightForAnyoneToFollowIsNotCalledComplete() {
    StagedPlan plan = plan(6, 1, 15, 0.02);
    assertFalse(plan.isComplete());
    assertEquals(StagedPlan.MOST_STAGES, plan.stages().size());
  }

  @Test
  void nothingToVentIsAnEmptyPlan() {
    assertEquals(0, plan(1, 1, 2.5, 0.5).stages().size());
  }
}

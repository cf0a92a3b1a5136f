package tunwarden.forecast.vent;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Present;
import tunwarden.forecast.Uncertain;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.Room;
import tunwarden.vessel.Vessel;

class VentTest {
  private static final double BAR = 1e5;
  private static final double COLD_K = 277.15;
  private static final Vessel TANK = Vessel.plain("FV2", 2, 1.8, Liquid.of(LiquidKind.BEER));

  private static VentQuestion to(double bar) {
    return new VentQuestion(bar * BAR, Optional.empty(), Optional.empty(), 0.5);
  }

  private static VentQuestion into(Room room, double bar) {
    return new VentQuestion(
        bar * BAR, Optional.of(new ReliefOrifice(0.015, 0.6)), Optional.of(room), 0.5);
  }

  private static VentAnswer vent(double fromBar, VentQuestion question) {
    return Vent.of(Ensemble.of(Present.atRest(TANK, fromBar * BAR, COLD_K)), question);
  }

  /** Headspace gas by the tabulated density of CO2 at 4 °C (gas_k_and_z.csv, computed). */
  @Test
  void whatLeavesAtOnceIsTheDifferenceOfTwoTabulatedDensities() {
    VentAnswer answer = vent(1, to(0));
    double kg = 0.2 * (3.89496 - 1.94766);
    assertEquals(kg, answer.once().kg().middle(), 0.01 * kg); // water vapour is 0.8 % of it
    assertEquals(answer.once().kg().middle() / 1.97681, answer.once().normalM3().middle(), 1e-9);
    assertEquals(answer.once().kg().middle(), answer.once().co2Kg().middle(), 1e-9);
  }

  /** European equation of the beer trade: 10 exp(−10.73797 + 2617.25/T) g/L per bar absolute. */
  @Test
  void whatFollowsIsTheDifferenceOfTheTradeEquation() {
    double perBar = 10 * Math.exp(-10.73797 + 2617.25 / COLD_K);
    VentAnswer answer = vent(1, to(0.2));
    assertEquals(1.8 * 0.8 * perBar, answer.followsKg().middle(), 0.005 * 1.8 * 0.8 * perBar);
    assertEquals(0.8 / 1.21325, answer.supersaturation().middle(), 0.002);
  }

  @Test
  void theReboundLiesBetweenTargetAndStartAndClosesTheBalance() {
    VentAnswer answer = vent(1, to(0.2));
    Spread rebound = answer.reboundPaGauge();
    assertTrue(rebound.middle() > 0.8 * BAR && rebound.middle() < BAR, rebound.toString());
    double perBar = 1.8 * 10 * Math.exp(-10.73797 + 2617.25 / COLD_K) + 0.2 * 1.92;
    double byBalance = 1 - answer.once().kg().middle() / perBar;
    assertEquals(byBalance * BAR, rebound.middle(), 0.003 * BAR);
  }

  @Test
  void leftOverAirLeavesInProportionAndHoldsLessGasInTheLiquid() {
    Present airy =
        new Present(
            TANK,
            Instant.EPOCH,
            BAR,
            COLD_K,
            COLD_K,
            Optional.empty(),
            new Uncertain(0.4 * BAR, 0),
            Present.atRest(TANK, BAR, COLD_K).activity());
    VentAnswer with = Vent.of(Ensemble.of(airy), to(0));
    VentAnswer without = vent(1, to(0));
    double share = with.once().co2Kg().middle() / without.once().co2Kg().middle();
    assertEquals(1.6 / 2, share, 0.01);
    assertTrue(with.followsKg().middle() < without.followsKg().middle());
    assertTrue(with.once().kg().middle() > with.once().co2Kg().middle());
  }

  @Test
  void nitrogenBlendsAreCountedInTheRoomsOxygenNotInItsCo2() {
    Vessel stout =
        new Vessel(
            "N",
            "",
            2,
            0.2,
            new Vessel.Contents(Liquid.of(LiquidKind.BEER), GasMix.parse("70N2/30CO2"), 0),
            TANK.closure(),
            TANK.limits(),
            Optional.empty(),
            TANK.site(),
            TANK.warmToK(),
            TANK.accuracy(),
            TANK.prospects());
    VentAnswer answer =
        Vent.of(Ensemble.of(Present.atRest(stout, 2 * BAR, COLD_K)), into(new Room(20, 0), 0));
    double left = answer.room().orElseThrow().leastOxygen();
    assertTrue(left < 0.18, "oxygen " + left);
    assertTrue(answer.cautions().stream().anyMatch(c -> c.text().startsWith("Oxygen")));
  }

  /** 1 kg in 100 m³ gives 5,440 ppm above what was there (computed). */
  @Test
  void theRoomFollowsTheDilutionRule() {
    VentAnswer answer = vent(1, into(new Room(180, 0), 0.2));
    RoomAfter room = answer.room().orElseThrow();
    double kg = answer.once().co2Kg().middle();
    assertEquals(420e-6 + kg * 5440e-6 * 100 / 180, room.onceCo2().middle(), 2e-6);
    double all = kg + answer.followsKg().middle();
    assertEquals(420e-6 + all * 5440e-6 * 100 / 180, room.heldCo2().middle(), 2e-5);
    assertTrue(room.ventilatedCo2().isEmpty());
  }

  @Test
  void ventilationHelpsWithWhatFollowsSlowly() {
    RoomAfter room = vent(1, into(new Room(180, 2.0 / 3600), 0.2)).room().orElseThrow();
    double peak = room.ventilatedCo2().orElseThrow().middle();
    assertTrue(peak < room.heldCo2().middle() && peak >= room.onceCo2().middle());
  }

  @Test
  void aRoomThatTurnsDeadlyIsSaidGravelyAndABarnIsNot() {
    assertTrue(
        vent(1, into(new Room(30, 0), 0)).cautions().stream()
            .filter(Caution::grave)
            .anyMatch(c -> c.text().contains("40,000")));
    assertTrue(
        vent(1, into(new Room(30_000, 0), 0)).cautions().stream()
            .noneMatch(c -> c.text().startsWith("Room")));
  }

  @Test
  void theFoamCautionNamesThePlan() {
    VentAnswer deep = vent(2, to(0));
    assertTrue(deep.plan().stages().size() > 1);
    assertTrue(deep.cautions().stream().anyMatch(c -> c.text().contains("steps of the plan")));
    VentAnswer slight = vent(0.3, to(0.25));
    assertTrue(slight.cautions().stream().noneMatch(c -> c.text().contains("foam")));
  }

  @Test
  void everyValueHasARangeAroundIt() {
    VentAnswer answer = vent(1, into(new Room(180, 0), 0.2));
    for (Spread spread :
        new Spread[] {
          answer.once().kg(),
          answer.followsKg(),
          answer.reboundPaGauge(),
          answer.supersaturation(),
          answer.blowdownS().orElseThrow(),
          answer.room().orElseThrow().onceCo2()
        }) {
      assertTrue(
          spread.low() < spread.middle() && spread.middle() < spread.high(), spread.toString());
    }
  }

  @Test
  void ventingToWhereItStandsLetsNothingOut() {
    VentAnswer answer = vent(1, to(1));
    assertEquals(0, answer.once().kg().middle(), 1e-12);
    assertEquals(0, answer.followsKg().middle(), 1e-9);
    assertEquals(BAR, answer.reboundPaGauge().middle(), 1);
  }

  @Test
  void aQuestionThatMakesNoSenseIsAnsweredInOneSentence() {
    Present present = Present.atRest(TANK, BAR, COLD_K);
    assertTrue(to(1.2).fault(present).orElseThrow().contains("above the present pressure"));
    assertTrue(to(-0.1).fault(present).orElseThrow().contains("0 bar"));
    assertTrue(to(Double.NaN).fault(present).isPresent());
    VentQuestion wide =
        new VentQuestion(0, Optional.of(new ReliefOrifice(1.6, 0.6)), Optional.empty(), 0.5);
    assertTrue(wide.fault(present).orElseThrow().contains("wider than a vessel"));
    assertTrue(to(0.5).fault(present).isEmpty());
    assertThrows(IllegalArgumentException.class, () -> Vent.of(Ensemble.of(present), to(1.2)));
  }
}

package tunwarden.forecast.whatif;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Mode;
import tunwarden.forecast.Hindsight;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Present;
import tunwarden.forecast.Uncertain;
import tunwarden.forecast.WhatIf;
import tunwarden.forecast.WhatIf.Kind;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.vessel.Limits;
import tunwarden.vessel.Prospects;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

class ForesightTest {
  private static final double BAR = 1e5;
  private static final double COLD_K = 277.15;
  private static final double HOUR = 3600;

  private static Vessel vessel(Prospects told, LiquidKind kind) {
    Vessel plain = Vessel.plain("FV2", 2, 1.8, Liquid.of(kind));
    return new Vessel(
        "FV2",
        "",
        2,
        1.8,
        new Vessel.Contents(Liquid.of(kind), GasMix.CO2, 0),
        plain.closure(),
        new Limits(
            Optional.of(ReliefSetting.stated(1.5 * BAR, 0.1 * BAR)),
            OptionalDouble.of(2 * BAR),
            OptionalDouble.of(-2000)),
        Optional.of(new ReliefOrifice(0.015, 0.6)),
        plain.site(),
        OptionalDouble.of(COLD_K + 20),
        plain.accuracy(),
        told);
  }

  private static Prospects supplied(Prospects.Supply supply) {
    return new Prospects(
        Optional.empty(),
        Optional.empty(),
        Optional.of(supply),
        OptionalDouble.empty(),
        OptionalDouble.empty());
  }

  private static Prospects fermenting(OptionalDouble now, OptionalDouble drop) {
    return new Prospects(
        Optional.of(new Prospects.Ferment(OptionalDouble.empty(), now, 2.5, drop)),
        Optional.of(new Prospects.Target(5, OptionalDouble.of(COLD_K))),
        Optional.empty(),
        OptionalDouble.of(40 * HOUR),
        OptionalDouble.of(12));
  }

  private static Outlook outlook(Prospects told, LiquidKind kind, double bar, double kelvin) {
    return Foresight.outlook(
        Present.atRest(vessel(told, kind), bar * BAR, kelvin), List.of(), Hindsight.NONE);
  }

  private static WhatIf of(Outlook outlook, Kind kind) {
    return outlook.whatIf(kind).orElseThrow(() -> new AssertionError(kind + " is missing"));
  }

  @Test
  void nothingIsSaidOfWhatWasNotTold() {
    Outlook bare = outlook(Prospects.NONE, LiquidKind.BEER, 0.9, COLD_K);
    for (Kind kind : List.of(Kind.SUPPLY, Kind.SEAL, Kind.HOLD)) {
      assertTrue(bare.whatIf(kind).isEmpty(), kind::name);
    }
    assertEquals(
        "how soon is not known: no time constant is stated or learnt yet",
        of(bare, Kind.WARM).detail());
    assertTrue(of(bare, Kind.WARM).toLift().isEmpty());
    assertTrue(of(bare, Kind.RELIEF).detail().endsWith("; no source of gas is stated"));
  }

  @Test
  void aStatedTimeConstantGivesTheTimeToLift() {
    Prospects told = fermenting(OptionalDouble.empty(), OptionalDouble.empty());
    WhatIf warm = of(outlook(told, LiquidKind.BEER, 0.9, COLD_K), Kind.WARM);
    assertEquals("time constant 40 h as stated", warm.detail());
    double hours = warm.toLift().orElseThrow().middle().toSeconds() / HOUR;
    // Lifts at about 11.5 °C: -40 h ln(1 - 7.5/20) = 19 h at rest, later where gas lags behind.
    assertTrue(hours > 18 && hours < 60, hours + " h");
    assertTrue(outlook(told, LiquidKind.BEER, 0.9, COLD_K).whatIf(Kind.SEAL).isEmpty());
  }

  /** Balling: 0.9565/2.0665 g CO2 per g of real extract, 0.8192 real for apparent. */
  @Test
  void closingAFermentationCountsTheGasToCome() {
    Prospects told = fermenting(OptionalDouble.of(4), OptionalDouble.of(1.5));
    WhatIf seal = of(outlook(told, LiquidKind.BEER, 0.3, COLD_K + 14), Kind.SEAL);
    // 1.5 °P apparent · 0.8192 real · 0.4629 CO2 · 10.16 g/L per °P = 5.8 g/L, less a little.
    assertTrue(seal.detail().startsWith("5.7") || seal.detail().startsWith("5.8"), seal.detail());
    assertTrue(seal.detail().contains("1.016 SG as stated, 1.5 P a day as stated"), seal.detail());
    assertTrue(seal.paGauge().orElseThrow().middle() > 2.5 * BAR);
    double hours = seal.toLift().orElseThrow().middle().toSeconds() / HOUR;
    assertTrue(hours > 5 && hours < 24, hours + " h: all of it would take a day");
    assertTrue(seal.cautions().get(0).text().contains("the vessel's limit"));
  }

  @Test
  void aReadGravityGoesBeforeTheStatedOne() {
    Prospects told = fermenting(OptionalDouble.of(9), OptionalDouble.empty());
    Instant then = Instant.EPOCH.minusSeconds(3 * 3600);
    Outlook outlook =
        Foresight.outlook(
            Present.atRest(vessel(told, LiquidKind.BEER), 0.3 * BAR, COLD_K),
            List.of(),
            Hindsight.NONE.gravity(then, 3));
    assertTrue(
        of(outlook, Kind.SEAL).detail().contains("1.012 SG read 3.0 h ago, at a pace not known"),
        of(outlook, Kind.SEAL).detail());
  }

  @Test
  void gasBeingMadeIsTakenForThePaceWhereNothingElseIsKnown() {
    Prospects told = fermenting(OptionalDouble.of(4), OptionalDouble.empty());
    Present rest = Present.atRest(vessel(told, LiquidKind.BEER), 0.3 * BAR, COLD_K);
    Present making =
        new Present(
            rest.vessel(),
            rest.at(),
            rest.pressurePaGauge(),
            rest.temperatureK(),
            rest.fillTemperatureK(),
            Optional.of(new Uncertain(3.4, 0.2)),
            rest.airPaAbsolute(),
            new Present.Activity(Mode.SEALED, rest.activity().transferPerS(), 0.25 / HOUR));
    Outlook outlook = Foresight.outlook(making, List.of(), Hindsight.NONE);
    assertTrue(of(outlook, Kind.SEAL).detail().endsWith("0.25 g/L/h as the gauge tells"));
  }

  /** The carbonation table for beer: 5.0 g/L at 4 °C lies at about 0.8 bar gauge. */
  @Test
  void theLevelToHoldIsHigherAtAWarmerFermentation() {
    Prospects told = fermenting(OptionalDouble.of(3), OptionalDouble.empty());
    WhatIf cold = of(outlook(told, LiquidKind.BEER, 0.3, COLD_K), Kind.HOLD);
    WhatIf warm = of(outlook(told, LiquidKind.BEER, 0.3, COLD_K + 14), Kind.HOLD);
    assertEquals(0.82 * BAR, cold.paGauge().orElseThrow().middle(), 0.05 * BAR);
    assertTrue(warm.paGauge().orElseThrow().middle() > 1.6 * BAR);
    assertTrue(warm.detail().endsWith("on a supply at 4 °C hold 0.81 bar g"), warm.detail());
    assertEquals(1, warm.cautions().size(), "above the valve's earliest opening");
  }

  /** Choked all the way: dt = dm/ṁ, densities of CO2 at 4 °C from gas_k_and_z.csv. */
  @Test
  void aSupplyThatFailsOpenFillsTheHeadspace() {
    Prospects.Supply supply =
        new Prospects.Supply(8 * BAR, Optional.empty(), OptionalDouble.of(30 / HOUR));
    WhatIf failed = of(outlook(supplied(supply), LiquidKind.BEER, 1, COLD_K), Kind.SUPPLY);
    assertEquals(8 * BAR, failed.paGauge().orElseThrow().middle());
    double kgPerBar = 0.2 * (5.86806 - 3.89496);
    double lift = kgPerBar * 0.4 / 30 * HOUR;
    assertEquals(lift, failed.toLift().orElseThrow().middle().toMillis() / 1000.0, 0.02 * lift);
    assertEquals(
        "the setting of 1.50 bar g in 24 s, the vessel limit of 2.00 bar g in 47 s",
        failed.detail());
    assertEquals(1, failed.cautions().size());
  }

  @Test
  void ofASupplyWithoutOpeningOnlyThePressureIsKnown() {
    Prospects.Supply supply =
        new Prospects.Supply(1.2 * BAR, Optional.empty(), OptionalDouble.empty());
    WhatIf failed = of(outlook(supplied(supply), LiquidKind.BEER, 1, COLD_K), Kind.SUPPLY);
    assertEquals("how soon is not known: state its orifice or its flow", failed.detail());
    assertTrue(failed.toLift().isEmpty() && failed.cautions().isEmpty());
  }

  /** p (1 − x f), and the gas law for a headspace that grows tenfold; both in the reference. */
  @Test
  void causticAndDrawingOffEndInAVacuum() {
    Outlook outlook = outlook(Prospects.NONE, LiquidKind.WATER, 0.5, COLD_K);
    WhatIf caustic = of(outlook, Kind.CAUSTIC);
    double vapour = 813; // Pa at 4 °C, IAPWS saturation line
    assertEquals(vapour - 101_325, caustic.paGauge().orElseThrow().middle(), 15);
    assertEquals("35 % of it already reaches the vacuum limit of -0.02 bar g", caustic.detail());
    WhatIf drawn = of(outlook, Kind.DRAW);
    double dry = 151_325 - vapour;
    assertEquals(dry / 10 + vapour - 101_325, drawn.paGauge().orElseThrow().middle(), 0.01 * dry);
    double litres = 200 * (dry / (99_325 - vapour) - 1);
    assertTrue(drawn.detail().startsWith(Math.round(litres) + " L ("), drawn.detail());
    assertEquals(1, drawn.cautions().size());
  }

  @Test
  void theReliefValveIsHeldAgainstEverySourceTold() {
    Prospects told = fermenting(OptionalDouble.of(4), OptionalDouble.of(6));
    WhatIf relief = of(outlook(told, LiquidKind.BEER, 0.3, COLD_K), Kind.RELIEF);
    assertTrue(
        relief
            .detail()
            .matches(
                "2\\d\\d kg/h of gas at 1.65 bar g; used by fermentation"
                    + " 0.6 %, warming less than 0.1 %, fire \\d+ %"),
        relief.detail());
    assertTrue(relief.assumes().contains("foam and two-phase flow"));
  }

  @Test
  void whatWeighsMostComesFirst() {
    List<WhatIf> all =
        outlook(
                fermenting(OptionalDouble.of(4), OptionalDouble.empty()),
                LiquidKind.BEER,
                0.9,
                COLD_K)
            .whatIfs();
    assertEquals(Kind.WARM, all.get(0).kind());
    for (WhatIf each : all) {
      assertTrue(!each.words().isEmpty() && each.words().length() <= 26, each.words());
      assertTrue(!each.assumes().isEmpty() && !each.assumes().endsWith("."), each.assumes());
    }
  }
}

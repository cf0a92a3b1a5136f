package tunwarden.forecast.relief;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

class DemandsTest {
  private static final double BAR = 1e5;
  private static final double ATMOSPHERE_PA = 101_325;
  private static final double HOUR = 3600;
  private static final ReliefCase VALVE =
      new ReliefCase(
          ReliefSetting.iso4126(BAR),
          new ReliefOrifice(0.015, 0.6),
          GasMix.CO2,
          277.15,
          ATMOSPHERE_PA);

  private static Vessel beer(double volumeM3, double fillM3) {
    return Vessel.plain("FV", volumeM3, fillM3, Liquid.of(LiquidKind.BEER));
  }

  /** 50 m³ of wort at 1.6 g/L/h make 80 kg/h (computed). */
  @Test
  void fermentationPeakOfAFiftyCubicMetreTank() {
    Demand demand = Demands.fermentation(VALVE, 50, FermentationRate.SCREENING_KG_PER_M3_PER_S);
    assertEquals(81.4, demand.kgPerS() * HOUR, 0.1);
    assertEquals(demand.kgPerS() / demand.capacityKgPerS(), demand.share(), 1e-12);
  }

  /** The same needs about 39 mm² of effective area at 1 bar gauge (computed, no overpressure). */
  @Test
  void areaForThatPeak() {
    double zrt = 0.9807 * 8.314462618 * 277.15 / 0.0440095;
    double area = ReliefSizing.areaM2(80 / HOUR, 1.3, zrt, BAR + ATMOSPHERE_PA, ATMOSPHERE_PA, 1);
    assertEquals(39, area * 1e6, 2);
  }

  @Test
  void ratedFlowIsCountedAtTheOverpressure() {
    assertEquals(1.1 * BAR + ATMOSPHERE_PA, VALVE.relievingPaAbsolute(), 1e-9);
    assertTrue(VALVE.gasKgPerS() > 0);
  }

  /** At 4 °C beer loses 0.095 g/L for each kelvin and bar, by the slope of the trade equation. */
  @Test
  void warmingDrivesOutWhatTheTradeEquationSays() {
    double perBar = 10 * Math.exp(-10.73797 + 2617.25 / 277.15);
    double slope = perBar * 2617.25 / (277.15 * 277.15);
    double bar = VALVE.relievingPaAbsolute() / BAR;
    Demand demand = Demands.warming(VALVE, beer(2, 2), 1 / HOUR);
    assertEquals(2 * slope * bar, demand.kgPerS() * HOUR, 0.02 * 2 * slope * bar);
  }

  @Test
  void anEmptyVesselOnlyExpands() {
    Demand demand = Demands.warming(VALVE, beer(2, 0), 1 / HOUR);
    double kg = VALVE.relievingPaAbsolute() * 2 * 0.0440095 / (8.314462618 * 277.15);
    assertEquals(kg / 277.15, demand.kgPerS() * HOUR, 1e-6);
  }

  /** 20 m² bare, drained: 504 kW, about 825 kg/h of steam (computed). */
  @Test
  void fireBoilsTheDrink() {
    Demand demand = Demands.fire(VALVE, beer(10, 9), FireHeat.watts(20, true));
    assertEquals(825, demand.kgPerS() * HOUR, 3);
    assertTrue(demand.words().contains("504 kW"), demand.words());
    assertFalse(demand.isMet());
  }

  @Test
  void waterBoilsAtTheRelievingPressure() {
    assertEquals(373.12, steamAt(0).boilingK(), 0.1);
  }

  private static ReliefCase steamAt(double setBar) {
    return new ReliefCase(
        ReliefSetting.stated(setBar * BAR, 0),
        VALVE.path(),
        GasMix.CO2,
        293.15,
        ATMOSPHERE_PA - 0.1 * BAR);
  }

  @Test
  void aSmallSeatIsMetAndALargeOneIsNot() {
    assertTrue(Demands.supply(VALVE, 8 * BAR, new ReliefOrifice(0.002, 0.6)).isMet());
    assertFalse(Demands.supply(VALVE, 58 * BAR, new ReliefOrifice(0.012, 0.8)).isMet());
    assertTrue(Demands.statedSupply(VALVE, VALVE.gasKgPerS()).isMet());
  }

  /** While the seat is choked the flow is constant: t = Δm / ṁ. */
  @Test
  void chokedSupplyFillsTheHeadspaceAtAConstantFlow() {
    SupplyFailure failure = through(8 * BAR, new ReliefOrifice(0.002, 0.6));
    double kg = 0.2 * (5.86806 - 3.89496); // gas_k_and_z.csv: 3.01 and 2.01 bar absolute, 4 °C
    var orifice = new IsentropicOrifice(new ReliefOrifice(0.002, 0.6).areaM2(), 0.6);
    double flow = orifice.kgPerS(GasMix.CO2, 8 * BAR, 2 * BAR, 277.15);
    assertEquals(kg / flow, failure.seconds(0.2, 201_325, 301_325), 0.005 * kg / flow);
  }

  @Test
  void aSupplyBelowTheTargetNeverReachesIt() {
    SupplyFailure weak = through(2 * BAR, new ReliefOrifice(0.002, 0.6));
    assertEquals(Double.POSITIVE_INFINITY, weak.seconds(0.2, 1.5 * BAR, 2.5 * BAR));
    assertTrue(Double.isFinite(weak.seconds(0.2, 1.5 * BAR, 1.999 * BAR)));
    assertEquals(0, weak.seconds(0.2, 1.5 * BAR, 1.4 * BAR));
  }

  private static SupplyFailure through(double paAbsolute, ReliefOrifice seat) {
    return new SupplyFailure(
        paAbsolute, Optional.of(seat), OptionalDouble.empty(), GasMix.CO2, 277.15);
  }

  /** Densities of CO2 at 4 °C from gas_k_and_z.csv; 30 kg/h as stated. */
  @Test
  void aStatedFlowFillsTheHeadspaceSteadily() {
    SupplyFailure stated =
        new SupplyFailure(
            8 * BAR, Optional.empty(), OptionalDouble.of(30 / 3600.0), GasMix.CO2, 277.15);
    double kg = 0.2 * (5.86806 - 3.89496);
    assertEquals(kg / 30 * 3600, stated.seconds(0.2, 201_325, 301_325), 0.002 * kg / 30 * 3600);
  }
}

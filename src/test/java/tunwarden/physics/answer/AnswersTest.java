package tunwarden.physics.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;

class AnswersTest {
  private static final Liquid BEER = Liquid.of(LiquidKind.BEER);
  private static final GaugeState COLD = new GaugeState(1.0e5, 277.15, 101_325, 0);
  private static final Doubt DOUBT = Doubt.ofU95(1000, 0.3, 3000, 0, 0.02);
  private static final Equilibrium UNDER_CO2 = Equilibrium.of(BEER, GasMix.CO2);
  private static final Warming VESSEL = Warming.of(2, 1.8, BEER, GasMix.CO2);

  /** European equation by hand: 10 · 2.01325 · exp(−10.73797 + 2617.25/277.15) = 5.517 g/L. */
  @Test
  void dissolvedIsTheEuropeanEquation() {
    Answer answer = UNDER_CO2.dissolved(Gas.CO2, COLD, DOUBT);
    assertEquals(5.5168, answer.value().getAsDouble(), 0.0005);
    assertTrue(answer.u95() > 0.1 && answer.u95() < 0.3, () -> "u95 " + answer.u95());
    assertTrue(answer.model().contains("European beer equation"), answer::model);
    assertEquals(List.of(), answer.remarks());
  }

  @Test
  void holdingWhatIsDissolvedGivesThePressureBack() {
    double dissolved = UNDER_CO2.dissolved(Gas.CO2, COLD, DOUBT).value().getAsDouble();
    Answer hold = UNDER_CO2.hold(dissolved, COLD, DOUBT);
    assertEquals(1.0e5, hold.value().getAsDouble(), 0.01);
  }

  @Test
  void holdingThroughABlendNeedsThePressureOfTheBlend() {
    GasMix blend = GasMix.parse("70N2/30CO2");
    Equilibrium stout = Equilibrium.of(BEER, blend);
    Answer hold = stout.hold(2.2, COLD, DOUBT);
    GaugeState held = new GaugeState(hold.value().getAsDouble(), 277.15, 101_325, 0);
    double back = stout.dissolved(Gas.CO2, held, DOUBT).value().getAsDouble();
    assertEquals(2.2, back, 1e-6);
    assertTrue(hold.value().getAsDouble() > 1.2e5);
  }

  @Test
  void warmingToTheTemperatureOfAPressureGivesThatPressure() {
    Answer lifts = VESSEL.temperatureK(COLD, 2.0e5, DOUBT);
    double kelvin = lifts.value().getAsDouble();
    Answer back = VESSEL.pressurePaGauge(COLD, kelvin, DOUBT);
    assertEquals(2.0e5, back.value().getAsDouble(), 1);
    assertTrue(lifts.u95() > 0.05 && lifts.u95() < 5, () -> "u95 " + lifts.u95());
  }

  @Test
  void chillingACarbonatedLiquidCanDrawAVacuum() {
    GaugeState barely = new GaugeState(0.1e5, 293.15, 101_325, 0);
    Answer chilled = VESSEL.pressurePaGauge(barely, 274.15, DOUBT);
    assertTrue(chilled.value().getAsDouble() < 0, () -> "" + chilled.value());
  }

  @Test
  void aVesselFilledToTheBrimIsToldToBeFull() {
    Warming brim = Warming.of(2, 1.995, BEER, GasMix.CO2);
    Answer warmed = brim.pressurePaGauge(COLD, 303.15, DOUBT);
    assertTrue(warmed.remarks().stream().anyMatch(r -> r.contains("fills the whole vessel")));
    assertTrue(Double.isFinite(warmed.value().getAsDouble()));
  }

  @Test
  void aFillThatMightReachTheBrimIsToldSo() {
    Warming nearly = Warming.of(2, 1.97, BEER, GasMix.CO2);
    Answer warmed = nearly.pressurePaGauge(COLD, 298.15, Doubt.ofU95(1000, 0.3, 3000, 0, 0.04));
    assertTrue(warmed.remarks().stream().anyMatch(r -> r.startsWith("the fill is not known")));
    assertTrue(warmed.u95() < 2e5, () -> "u95 " + warmed.u95());
  }

  @Test
  void outsideItsRangeACorrelationSaysSo() {
    GaugeState hot = new GaugeState(1.0e5, 318.15, 101_325, 0);
    Answer answer = UNDER_CO2.dissolved(Gas.CO2, hot, DOUBT);
    assertTrue(answer.value().isPresent());
    assertTrue(
        answer.remarks().stream().anyMatch(r -> r.startsWith("European beer equation is used")),
        () -> answer.remarks().toString());
  }

  @Test
  void atFreezingPointNothingIsOutsideItsRange() {
    GaugeState freezing = new GaugeState(1.0e5, 273.15, 101_325, 0);
    assertEquals(List.of(), UNDER_CO2.dissolved(Gas.CO2, freezing, DOUBT).remarks());
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, -2e5})
  void whatIsNoPressureGivesNoNumberButAReason(double paGauge) {
    GaugeState bad = new GaugeState(paGauge, 277.15, 101_325, 0);
    for (Answer answer :
        List.of(
            UNDER_CO2.dissolved(Gas.CO2, bad, DOUBT),
            UNDER_CO2.partialPressure(Gas.CO2, bad, DOUBT),
            VESSEL.pressurePaGauge(bad, 290, DOUBT),
            VESSEL.dissolvedKgPerM3(bad, 290, DOUBT),
            VESSEL.temperatureK(bad, 1e5, DOUBT),
            OrificeFlow.kgPerS(
                IsentropicOrifice.round(0.01, 0.6), GasMix.CO2, bad, 101_325, DOUBT))) {
      assertTrue(answer.value().isEmpty());
      assertFalse(answer.remarks().isEmpty());
    }
  }

  @ParameterizedTest
  @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, 0, -5})
  void whatIsNoTemperatureGivesNoNumberButAReason(double kelvin) {
    GaugeState bad = new GaugeState(1e5, kelvin, 101_325, 0);
    assertTrue(UNDER_CO2.dissolved(Gas.CO2, bad, DOUBT).value().isEmpty());
    assertTrue(UNDER_CO2.hold(5, bad, DOUBT).value().isEmpty());
    assertTrue(Solubility.of(BEER, Gas.CO2, kelvin).bunsen().value().isEmpty());
  }

  /** Oxygen from left-over air: Henry's law on 0.209476 · 20 mbar gives about 260 µg/L at 4 °C. */
  @Test
  void leftOverAirPutsOxygenIntoTheDrink() {
    GaugeState airy = new GaugeState(1.0e5, 277.15, 101_325, 2000);
    Answer oxygen = Equilibrium.of(Liquid.WATER, GasMix.CO2).dissolved(Gas.O2, airy, DOUBT);
    double microgramPerL = oxygen.value().getAsDouble() * 1e6;
    assertEquals(260, microgramPerL, 13);
  }
}

package tunwarden.app.reckon;

import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.app.options.VesselOptions;
import tunwarden.physics.answer.Answer;
import tunwarden.physics.answer.Doubt;
import tunwarden.physics.answer.GaugeState;
import tunwarden.physics.answer.Warming;
import tunwarden.units.BadInputException;
import tunwarden.units.Display;
import tunwarden.vessel.Vessel;

/** A closed vessel that is brought to another temperature. */
final class WarmingOptions {
  @Option(
      names = "--to",
      required = true,
      paramLabel = "TEMPERATURE",
      converter = Convert.ToKelvin.class,
      description = "Temperature it comes to, -2 to 60 C.")
  private double toK;

  @Mixin private StateOptions state;
  @Mixin private VesselOptions vessel;

  /**
   * The vessel at its new temperature.
   *
   * @param vessel as described
   * @param now what gauge and thermometer show before
   * @param doubt how well that is known
   * @param warming the closed vessel
   * @param toK the new temperature, K
   */
  record Case(Vessel vessel, GaugeState now, Doubt doubt, Warming warming, double toK) {}

  Case read() {
    if (!(toK >= Warming.LEAST_K && toK <= Warming.MOST_K)) {
      throw new BadInputException(
          "--to: write a temperature from "
              + Display.METRIC.temperature(Warming.LEAST_K)
              + " to "
              + Display.METRIC.temperature(Warming.MOST_K)
              + ", where the relations hold");
    }
    Vessel described = vessel.vessel("vessel");
    GaugeState now = state.state(described);
    PresentOptions.refuseRelief(described, now.paGauge());
    return new Case(
        described,
        now,
        state.doubt(described),
        Warming.of(described.volumeM3(), described.fillM3(), described.liquid(), described.gas()),
        toK);
  }

  /** Puts down what holds for warming and chilling alike; returns the pressure. */
  Answer pressure(AnswerSheet sheet, Case at) {
    Answer pressure = at.warming().pressurePaGauge(at.now(), at.toK(), at.doubt());
    double paGauge = Answers.value(sheet, pressure);
    sheet.gauge("pressure_bar_g", "pressure", paGauge, pressure.u95());
    Answer dissolved = at.warming().dissolvedKgPerM3(at.now(), at.toK(), at.doubt());
    sheet.content(
        "dissolved_g_per_l", "dissolved", Answers.value(sheet, dissolved), dissolved.u95());
    sheet.model(at.warming().model());
    if (!vessel.liquidIsNamed()) {
      sheet.caution("no liquid was named: reckoned for water");
    }
    sheet.assume(
        "shut, nothing let in or out, the vessel rigid; liquid and gas at rest with each other before"
            + " and after");
    sheet.assume(Assumed.gas(at.vessel()));
    sheet.caution(
        "true once settled: a still vessel takes days to weeks to follow its temperature");
    return pressure;
  }
}

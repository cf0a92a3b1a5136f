package tunwarden.app.reckon;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import tunwarden.app.options.VesselOptions;
import tunwarden.physics.answer.Answer;
import tunwarden.physics.answer.Doubt;
import tunwarden.physics.answer.Equilibrium;
import tunwarden.physics.answer.GaugeState;
import tunwarden.physics.gas.Gas;
import tunwarden.units.Constants;
import tunwarden.units.Unit;
import tunwarden.vessel.Vessel;

/** How much gas the liquid holds once it has come to rest under a pressure. */
@Command(name = "dissolved", description = "Gas dissolved at equilibrium under a pressure.")
final class Dissolved extends AnswerCommand {
  private static final double MICROGRAM_PER_L = 1e6;

  @Mixin private StateOptions state;
  @Mixin private VesselOptions vessel;

  @Override
  void fill(AnswerSheet sheet) {
    vessel.requireLiquid();
    Vessel described = vessel.vesselOfAnySize("vessel");
    GaugeState now = state.state(described);
    Doubt doubt = state.doubt(described);
    Equilibrium rest = Equilibrium.of(described.liquid(), described.gas());

    Answer dissolved = rest.dissolved(Gas.CO2, now, doubt);
    double content = Answers.value(sheet, dissolved);
    sheet.content("dissolved_g_per_l", "dissolved", content, dissolved.u95());
    sheet.json(
        "dissolved_volumes",
        Unit.VOLUMES.fromSi(content),
        dissolved.u95() / Constants.CO2_VOLUME_KG_PER_M3);
    Answer partial = rest.partialPressure(Gas.CO2, now, doubt);
    sheet.absolute(
        "co2_partial_pressure_bar_a", "CO2 pressure", Answers.value(sheet, partial), partial.u95());
    if (described.contents().airPaAbsolute() > 0 || described.gas().fraction(Gas.O2) > 0) {
      Answer oxygen = rest.dissolved(Gas.O2, now, doubt);
      sheet.number(
          "dissolved_oxygen_ug_per_l",
          "oxygen",
          MICROGRAM_PER_L * Answers.value(sheet, oxygen),
          MICROGRAM_PER_L * oxygen.u95(),
          "ug/L, until the drink uses it up");
    }
    ReliefLines.margin(sheet, described, now.paGauge());
    sheet.model(rest.model(Gas.CO2));
    Assumed.equilibrium(sheet, described);
    sheet.caution(Equilibrium.CAUTION);
  }
}

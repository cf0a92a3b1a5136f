package tunwarden.app.reckon;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.app.options.VesselOptions;
import tunwarden.physics.answer.Answer;
import tunwarden.physics.answer.Equilibrium;
import tunwarden.physics.answer.GaugeState;
import tunwarden.physics.gas.Gas;
import tunwarden.vessel.Vessel;

/** The pressure to hold for a wanted carbonation. */
@Command(name = "hold", description = "Pressure to hold for a wanted carbonation at a temperature.")
final class Hold extends AnswerCommand {
  @Option(
      names = "--target",
      required = true,
      paramLabel = "CONTENT",
      converter = Convert.ToContent.class,
      description = "Wanted CO2, as '5.1 g/L' or '2.6 vol'.")
  private double targetKgPerM3;

  @Option(
      names = "--temperature",
      required = true,
      paramLabel = "TEMPERATURE",
      converter = Convert.ToKelvin.class,
      description = "Liquid temperature, as '4 C' or '39.2 F'.")
  private double temperatureK;

  @Mixin private VesselOptions vessel;

  @Override
  void fill(AnswerSheet sheet) {
    vessel.requireLiquid();
    Vessel described = vessel.vesselOfAnySize("vessel");
    double ambient = described.site().ambientPaAbsolute();
    GaugeState wanted =
        new GaugeState(0, temperatureK, ambient, described.contents().airPaAbsolute());
    Equilibrium rest = Equilibrium.of(described.liquid(), described.gas());
    Answer hold =
        rest.hold(
            targetKgPerM3, wanted, StateOptions.doubt(described, described.site().ambientU95Pa()));
    double paGauge = Answers.value(sheet, hold);
    sheet.gauge("pressure_bar_g", "hold at", paGauge, hold.u95());
    if (paGauge <= 0) {
      sheet.caution("that little stays dissolved without any overpressure");
    }
    ReliefLines.margin(sheet, described, paGauge);
    ReliefLines.forecast(sheet, described, paGauge, hold.u95());
    sheet.model(rest.model(Gas.CO2));
    Assumed.equilibrium(sheet, described);
    sheet.caution(Equilibrium.CAUTION);
  }
}

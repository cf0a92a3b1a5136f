package tunwarden.app.reckon;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.app.options.InstrumentOptions;
import tunwarden.app.options.SiteOptions;
import tunwarden.physics.answer.Answer;
import tunwarden.physics.answer.Doubt;
import tunwarden.physics.answer.GaugeState;
import tunwarden.physics.answer.OrificeFlow;
import tunwarden.physics.flow.IsentropicOrifice;
import tunwarden.physics.gas.GasMix;
import tunwarden.units.Pressure;
import tunwarden.units.Unit;
import tunwarden.vessel.Accuracy;
import tunwarden.vessel.Site;

/** Gas through an orifice. */
@Command(name = "flow", description = "Gas flow through an orifice between two pressures.")
final class Flow extends AnswerCommand {
  @Option(
      names = "--gas",
      required = true,
      paramLabel = "GAS",
      converter = Convert.ToGas.class,
      description = "Gas or blend, as CO2 or 70N2/30CO2.")
  private GasMix gas;

  @Option(
      names = "--to",
      required = true,
      paramLabel = "PRESSURE",
      converter = Convert.ToPressure.class,
      description = "Pressure behind the orifice, gauge unless written with 'a'.")
  private Pressure to;

  @Option(
      names = "--orifice",
      required = true,
      paramLabel = "LENGTH",
      converter = Convert.ToDiameter.class,
      description = "Orifice diameter, as '6 mm'.")
  private double orificeM;

  @Option(
      names = "--kd",
      required = true,
      paramLabel = "NUMBER",
      converter = Convert.ToCoefficient.class,
      description = "Coefficient of discharge, above 0 and at most 1.")
  private double kd;

  @Mixin private StateOptions state;
  @Mixin private SiteOptions place;
  @Mixin private InstrumentOptions instruments;

  @Override
  void fill(AnswerSheet sheet) {
    Site site = place.site();
    Accuracy accuracy = instruments.accuracy(1);
    GaugeState inlet = state.state(site);
    double behind = to.absolutePa(site.ambientPaAbsolute());
    Answer flow =
        OrificeFlow.kgPerS(
            IsentropicOrifice.round(orificeM, kd),
            gas,
            inlet,
            behind,
            Doubt.ofU95(
                accuracy.pressureU95Pa(), accuracy.temperatureU95K(), site.ambientU95Pa(), 0, 0));
    sheet.number(
        "mass_flow_kg_per_h",
        "flow",
        Unit.KILOGRAM_PER_HOUR.fromSi(Answers.value(sheet, flow)),
        Unit.KILOGRAM_PER_HOUR.fromSi(flow.u95()),
        "kg/h");
    String regime = IsentropicOrifice.regime(gas, inlet.paAbsolute(), behind).word();
    sheet.plain("regime", regime, "regime", regime);
    sheet.model(flow.model());
    sheet.assume(
        "the gas is at rest before the opening, at the stated pressure and temperature; nothing is"
            + " lost in the line before or behind it");
    sheet.caution("dry gas only: foam or liquid in the line passes quite differently");
  }
}

package tunwarden.app.reckon;

import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.app.options.LiquidOptions;
import tunwarden.physics.answer.Answer;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.GasMix;
import tunwarden.units.BadInputException;
import tunwarden.units.Unit;

/** Solubility of one gas in the forms handbooks print. */
@Command(
    name = "solubility",
    description = "Solubility of one gas in one liquid, in the forms handbooks print.")
final class Solubility extends AnswerCommand {
  @Option(
      names = "--gas",
      required = true,
      paramLabel = "GAS",
      converter = Convert.ToGas.class,
      description = "One gas, as CO2, N2, O2 or Ar.")
  private GasMix gas;

  @Option(
      names = "--temperature",
      required = true,
      paramLabel = "TEMPERATURE",
      converter = Convert.ToKelvin.class,
      description = "Liquid temperature.")
  private double temperatureK;

  @Mixin private LiquidOptions liquid;

  @Override
  void fill(AnswerSheet sheet) {
    liquid.requireKind();
    Gas one =
        pure().orElseThrow(() -> new BadInputException("--gas: name one gas here, not a blend"));
    var found = tunwarden.physics.answer.Solubility.of(liquid.liquid(), one, temperatureK);
    Answer henry = found.henryPa();
    sheet.number(
        "henry_mpa",
        "Henry",
        Unit.MPA.differenceFromSi(Answers.value(sheet, henry)),
        Unit.MPA.differenceFromSi(henry.u95()),
        "MPa (fugacity over mole fraction)");
    number(sheet, "bunsen", "Bunsen", found.bunsen(), "(gas at 0 °C and 1 atm, per volume)");
    number(sheet, "g_per_l_per_bar", "dissolved", found.kgPerM3PerBar(), "g/L at 1 bar of the gas");
    sheet.model(henry.model());
    sheet.assume(
        "at equilibrium, so little dissolved that it goes by proportion; the gas alone over the"
            + " liquid, water vapour apart");
  }

  private static void number(
      AnswerSheet sheet, String key, String label, Answer answer, String unit) {
    sheet.number(key, label, Answers.value(sheet, answer), answer.u95(), unit);
  }

  private Optional<Gas> pure() {
    return Gas.all().stream().filter(each -> gas.fraction(each) == 1).findFirst();
  }
}

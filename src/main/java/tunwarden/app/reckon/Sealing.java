package tunwarden.app.reckon;

import java.util.Optional;
import java.util.OptionalDouble;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.forecast.seal.Seal;
import tunwarden.forecast.seal.SealAnswer;
import tunwarden.forecast.seal.SealQuestion;
import tunwarden.units.BadInputException;
import tunwarden.units.Display;

/** A fermenting vessel closed on paper. */
@Command(
    name = "seal",
    description = "Where the pressure goes if a fermenting vessel is closed now.")
final class Sealing extends AnswerCommand {
  @Option(
      names = "--gravity",
      required = true,
      paramLabel = "EXTRACT",
      converter = Convert.ToGravity.class,
      description = "Apparent extract now, as '1.014 SG' or '3.5 P'.")
  private double nowPlato;

  @Option(
      names = "--final-gravity",
      required = true,
      paramLabel = "EXTRACT",
      converter = Convert.ToGravity.class,
      description = "Apparent extract when it will have ended.")
  private double finalPlato;

  @Option(
      names = "--original-gravity",
      paramLabel = "EXTRACT",
      converter = Convert.ToGravity.class,
      description = "Extract before fermentation. Default: as now.")
  private Double originalPlato;

  @Option(
      names = "--extract-drop",
      paramLabel = "EXTRACT",
      converter = Convert.ToGravity.class,
      description = "Fall of the apparent extract in a day, as '1.5 P'. Default: a wide range.")
  private Double dropPlato;

  @Option(
      names = "--target",
      paramLabel = "CONTENT",
      converter = Convert.ToContent.class,
      description = "Carbonation wanted at the end: adds the pressure to hold until then.")
  private Double targetKgPerM3;

  @Option(
      names = "--target-temperature",
      paramLabel = "TEMPERATURE",
      converter = Convert.ToKelvin.class,
      description = "Temperature it is then brought to, closed. Default: as now.")
  private Double targetK;

  @Mixin private PresentOptions present;

  @Override
  void fill(AnswerSheet sheet) {
    Ensemble ensemble = present.ensemble();
    SealQuestion question = question(ensemble);
    question
        .fault()
        .ifPresent(
            sentence -> {
              throw new BadInputException(sentence);
            });
    SealAnswer answer = Seal.of(ensemble, question);
    Spread toCome = answer.toComeKgPerM3();
    sheet.content("co2_to_come_g_per_l", "CO2 to come", toCome.middle(), u95(toCome));
    Spread pressure = answer.paGauge();
    sheet.gauge("pressure_bar_g", "pressure", pressure.middle(), u95(pressure));
    Spread dissolved = answer.dissolvedKgPerM3();
    sheet.content("dissolved_g_per_l", "dissolved", dissolved.middle(), u95(dissolved));
    answer
        .lifts()
        .ifPresentOrElse(
            lifts -> lifts(sheet, answer, lifts),
            () -> sheet.none("lifts", "valve lifts", "no relief setting was given"));
    answer
        .holdPaGauge()
        .ifPresent(hold -> sheet.gauge("hold_bar_g", "hold at", hold.middle(), u95(hold)));
    answer.reachesWanted().ifPresent(enough -> sheet.hidden("reaches_target", enough));
    present.model(sheet, ensemble, ", Balling's balance of fermentation");
    answer.cautions().forEach(caution -> sheet.caution(caution.text()));
    SealAnswer.ASSUMPTIONS.forEach(sheet::assume);
  }

  private SealQuestion question(Ensemble ensemble) {
    if (dropPlato != null && !(dropPlato > 0)) {
      throw new BadInputException("--extract-drop: write a fall above 0 P");
    }
    return new SealQuestion(
        nowPlato,
        finalPlato,
        originalPlato == null ? OptionalDouble.empty() : OptionalDouble.of(originalPlato),
        dropPlato == null ? FermentationRate.UNKNOWN : FermentationRate.stated(dropPlato),
        Optional.ofNullable(targetKgPerM3)
            .map(
                target ->
                    new SealQuestion.Wanted(
                        target, targetK == null ? ensemble.middle().temperatureK() : targetK)));
  }

  private static void lifts(AnswerSheet sheet, SealAnswer answer, boolean lifts) {
    sheet.plain("lifts", lifts, "valve lifts", lifts ? "yes" : "no");
    answer.untilLift().ifPresent(range -> until(sheet, range));
  }

  private static void until(AnswerSheet sheet, TimeRange range) {
    double high = range.high().orElseThrow().toSeconds() / 3600.0;
    double low = range.low().toSeconds() / 3600.0;
    double middle = range.middle().toSeconds() / 3600.0;
    sheet.json("time_to_lift_h", middle, Math.max(high - middle, middle - low));
    sheet.hidden("time_to_lift_low_h", low);
    sheet.hidden("time_to_lift_high_h", high);
    sheet.line(
        "lifts after",
        Display.number(middle, 1)
            + " h ("
            + Display.number(low, 1)
            + " to "
            + Display.number(high, 1)
            + ")");
  }

  private static double u95(Spread spread) {
    return PresentOptions.u95(spread);
  }
}

package tunwarden.app.reckon;

import java.util.Optional;
import java.util.OptionalDouble;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import tunwarden.app.options.Convert;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Forecaster;
import tunwarden.forecast.Present;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.WarmUp;
import tunwarden.physics.answer.Answer;
import tunwarden.physics.answer.Warming;
import tunwarden.units.BadInputException;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;

/** What a closed vessel comes to when it warms, and where its valve lifts. */
@Command(
    name = "warm",
    description = "Pressure of a closed vessel once it has warmed, and where the valve lifts.")
final class Warm extends AnswerCommand {
  private static final double HOUR_S = 3600;

  @Option(
      names = "--time-constant",
      paramLabel = "TIME",
      converter = Convert.ToSeconds.class,
      description = "How fast it warms: time to close 63 %% of the gap, as '30 h'.")
  private Double constantS;

  @Mixin private WarmingOptions options;

  @Override
  void fill(AnswerSheet sheet) {
    if (constantS != null && !(constantS > 0)) {
      throw new BadInputException("--time-constant: write a time above zero, as '30 h'");
    }
    WarmingOptions.Case at = options.read();
    Answer pressure = options.pressure(sheet, at);
    Optional<ReliefSetting> relief = at.vessel().limits().relief();
    if (relief.isPresent()) {
      lift(sheet, at, "relief_temperature_c", "valve lifts", relief.get().setPaGauge());
      lift(
          sheet,
          at,
          "earliest_lift_temperature_c",
          "earliest lift",
          relief.get().earliestLiftPaGauge());
    } else {
      sheet.none("relief_temperature_c", "valve lifts", "no relief setting was given");
    }
    if (constantS != null && relief.isPresent()) {
      time(sheet, at, relief.get().earliestLiftPaGauge());
    }
    full(sheet, at);
    ReliefLines.forecast(sheet, at.vessel(), pressure.value().orElseThrow(), pressure.u95());
  }

  /** Said only of a vessel that may come to be full. */
  private static void full(AnswerSheet sheet, WarmingOptions.Case at) {
    if (at.vessel().fillM3() >= at.vessel().volumeM3()) {
      return;
    }
    Ensemble ensemble =
        Ensemble.of(Present.atRest(at.vessel(), at.now().paGauge(), at.now().temperatureK()));
    OptionalDouble full = Forecaster.liquidFullK(ensemble.middle());
    if (full.isEmpty()) {
      sheet.hidden("liquid_full_temperature_c", null);
      return;
    }
    Spread range = ensemble.range(world -> Forecaster.liquidFullK(world).orElse(Warming.MOST_K));
    sheet.temperature(
        "liquid_full_temperature_c",
        "full of liquid",
        full.getAsDouble(),
        PresentOptions.u95(range));
    if (full.getAsDouble() <= at.toK()) {
      sheet.caution(
          "on the way no headspace is left: from there the pressure rises by bars per degree, and"
              + " the relief valve passes liquid; draw some off first");
    }
  }

  private void time(AnswerSheet sheet, WarmingOptions.Case at, double liftPaGauge) {
    Present present = Present.atRest(at.vessel(), at.now().paGauge(), at.now().temperatureK());
    WarmUp warming = new WarmUp(Ensemble.of(present).middle(), at.toK(), constantS);
    Optional<TimeRange> range = warming.until(liftPaGauge, present.activity().transferPerS());
    if (range.isEmpty()) {
      sheet.none("time_to_lift_h", "lifts after", "not reached while it warms");
      return;
    }
    sheet.assume(
        "warming: the gap to the surroundings closes by 63 % in the time constant as stated; the"
            + " range is that of how fast gas leaves the liquid");
    double middle = range.get().middle().toSeconds() / HOUR_S;
    double low = range.get().low().toSeconds() / HOUR_S;
    String high =
        range.get().high().map(t -> Display.number(t.toSeconds() / HOUR_S, 1)).orElse("never");
    sheet.hidden("time_to_lift_h", middle);
    sheet.hidden("time_to_lift_low_h", low);
    range.get().high().ifPresent(t -> sheet.hidden("time_to_lift_high_h", t.toSeconds() / HOUR_S));
    sheet.line(
        "lifts after",
        Display.number(middle, 1) + " h (" + Display.number(low, 1) + " to " + high + ")");
  }

  private static void lift(
      AnswerSheet sheet, WarmingOptions.Case at, String key, String label, double paGauge) {
    Answer lift = at.warming().temperatureK(at.now(), paGauge, at.doubt());
    if (lift.value().isEmpty()) {
      sheet.none(key, label, String.join("; ", lift.remarks()));
    } else {
      sheet.temperature(key, label, lift.value().getAsDouble(), lift.u95());
    }
  }
}

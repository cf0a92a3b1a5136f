package tunwarden.app.reckon;

import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import tunwarden.physics.answer.Answer;
import tunwarden.vessel.ReliefSetting;

/** What a closed vessel comes to when it warms, and where its valve lifts. */
@Command(
    name = "warm",
    description = "Pressure of a closed vessel once it has warmed, and where the valve lifts.")
final class Warm extends AnswerCommand {
  @Mixin private WarmingOptions options;

  @Override
  void fill(AnswerSheet sheet) {
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
    ReliefLines.forecast(sheet, at.vessel(), pressure.value().orElseThrow(), pressure.u95());
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

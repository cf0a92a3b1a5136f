package tunwarden.app.reckon;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import tunwarden.physics.answer.Answer;

/** What a closed vessel comes to when it is cooled, and how near that is to its vacuum limit. */
@Command(
    name = "chill",
    description = "Pressure of a closed vessel once it has cooled, against its vacuum limit.")
final class Chill extends AnswerCommand {
  @Mixin private WarmingOptions options;

  @Override
  void fill(AnswerSheet sheet) {
    WarmingOptions.Case at = options.read();
    Answer pressure = options.pressure(sheet, at);
    double margin = pressure.value().orElseThrow() - at.vessel().limits().vacuumOrNonePaGauge();
    sheet.difference("vacuum_margin_bar", "vacuum margin", margin, pressure.u95());
    if (margin - pressure.u95() < 0) {
      sheet.caution(
          "it may fall below the vacuum limit: let gas in while cooling; a thin wall collapses"
              + " under a small vacuum");
    }
  }
}

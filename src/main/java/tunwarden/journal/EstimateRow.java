package tunwarden.journal;

import java.util.OptionalDouble;
import tunwarden.assess.Assessment;
import tunwarden.assess.Margins;
import tunwarden.assess.Observed;
import tunwarden.estimate.Estimate;
import tunwarden.replay.LogWriter;
import tunwarden.units.Display;
import tunwarden.units.Unit;

/** One line of an estimates file: what was believed at that time. */
final class EstimateRow {
  static final String HEADER =
      "time,pressure_bar_g,temperature_c,dissolved_g_per_l,dissolved_u95_g_per_l,"
          + "equilibrium_g_per_l,settled,air_fraction,relief_margin_bar,mode";

  private EstimateRow() {}

  static String of(Assessment assessment) {
    Estimate estimate = assessment.estimate().orElseThrow();
    OptionalDouble margin =
        assessment
            .margins()
            .map(Margins::reliefPa)
            .map(OptionalDouble::of)
            .orElseGet(OptionalDouble::empty);
    return String.join(
        ",",
        LogWriter.timeText(assessment.time()),
        number(pressureBar(assessment.pressure()), 5),
        number(celsius(assessment.temperature()), 3),
        number(estimate.dissolvedKgPerM3(), 4),
        number(estimate.dissolvedU95KgPerM3(), 4),
        number(estimate.equilibriumKgPerM3(), 4),
        number(estimate.settled(), 4),
        number(estimate.airFraction(), 4),
        number(Unit.BAR.fromSi(margin.orElse(Double.NaN)), 4),
        estimate.mode().word());
  }

  private static double pressureBar(Observed observed) {
    return observed.isUsable() ? Unit.BAR.fromSi(observed.value().getAsDouble()) : Double.NaN;
  }

  private static double celsius(Observed observed) {
    return observed.isUsable() ? Unit.CELSIUS.fromSi(observed.value().getAsDouble()) : Double.NaN;
  }

  private static String number(double value, int decimals) {
    return Double.isFinite(value) ? Display.number(value, decimals) : "";
  }
}

package tunwarden.screen.view;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import tunwarden.assess.History;
import tunwarden.assess.History.Trace;
import tunwarden.screen.model.VesselBoard;
import tunwarden.units.Display;

/** How pressure and temperature have moved in the last half hour, in words. */
final class Lately {
  private static final Duration SPAN = Duration.ofMinutes(30);
  private static final int COLUMNS = 30;

  /** Columns averaged at either end, against noise. */
  private static final int END_COLUMNS = 5;

  private static final double SECONDS_PER_HOUR = 3_600;

  private Lately() {}

  /** {@code +0.03 bar/h, +0.5 °C/h}; empty while less than half is known. */
  static String of(VesselBoard vessel, Instant now, Display units) {
    History.Window window = vessel.history().window(now.minus(SPAN), now.plusMillis(1), COLUMNS);
    Optional<Double> pressure = perHour(window.pressure());
    Optional<Double> temperature = perHour(window.temperature());
    if (pressure.isEmpty()) {
      return "";
    }
    String text = rate(units.signedPressureNumber(pressure.get()), units.pressure().symbol());
    if (temperature.isPresent()) {
      double k = units.temperature().differenceFromSi(temperature.get());
      String number = (k < 0 ? "-" : "+") + Display.number(Math.abs(k), 1);
      text += ", " + rate(number, "°" + units.temperature().symbol());
    }
    return text;
  }

  private static String rate(String number, String symbol) {
    boolean zero = number.chars().noneMatch(c -> c >= '1' && c <= '9');
    return zero ? "0 " + symbol + "/h" : number + " " + symbol + "/h";
  }

  /** Difference of the means at both ends over the time between them, SI per hour. */
  private static Optional<Double> perHour(Trace trace) {
    double first = 0;
    double last = 0;
    for (int i = 0; i < END_COLUMNS; i++) {
      int end = trace.columns() - 1 - i;
      if (!trace.has(i) || !trace.has(end)) {
        return Optional.empty();
      }
      first += trace.last()[i] / END_COLUMNS;
      last += trace.last()[end] / END_COLUMNS;
    }
    double apart = SPAN.toSeconds() * (COLUMNS - END_COLUMNS) / (double) COLUMNS;
    return Optional.of((last - first) / apart * SECONDS_PER_HOUR);
  }
}

package tunwarden.config;

import java.time.Duration;
import java.util.Optional;
import tunwarden.alarm.AlarmSettings;
import tunwarden.units.Display;

/** The {@code [alarms]} and {@code [display]} tables. */
final class AlarmsReader {
  private AlarmsReader() {}

  static AlarmSettings read(Section alarms, Display display) {
    AlarmSettings usual = AlarmSettings.DEFAULT;
    double margin =
        alarms.quantity("margin-low", Texts::pressureDifferencePa).orElse(usual.marginLowPa());
    Optional<Duration> relief = alarms.parsed("time-to-relief", ReadingsReader::duration);
    Optional<Duration> stale = alarms.parsed("stale", ReadingsReader::duration);
    alarms.close();
    return usual
        .withMarginLow(margin)
        .withTimeToRelief(relief.orElse(usual.timeToRelief()))
        .withStale(stale.orElse(usual.stale()))
        .withDisplay(display);
  }

  static Display display(Section display) {
    Optional<Display> units = display.parsed("units", Texts::display);
    display.close();
    return units.orElse(Display.METRIC);
  }
}

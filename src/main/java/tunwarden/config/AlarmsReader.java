package tunwarden.config;

import java.time.Duration;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tunwarden.alarm.AlarmSettings;
import tunwarden.units.BadQuantityException;
import tunwarden.units.Display;

/** The {@code [alarms]} and {@code [display]} tables. */
final class AlarmsReader {
  private static final Map<String, Display> UNITS =
      new TreeMap<>(Map.of("metric", Display.METRIC, "us", Display.US, "si", Display.SI));

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
    Optional<Display> units = display.parsed("units", AlarmsReader::units);
    display.close();
    return units.orElse(Display.METRIC);
  }

  private static Display units(String text) {
    Display units = UNITS.get(text);
    if (units == null) {
      throw new BadQuantityException(
          "'"
              + text
              + "' is not a set of units; write one of "
              + String.join(", ", UNITS.keySet()));
    }
    return units;
  }
}

package tunwarden.config;

import java.time.Duration;
import java.util.Optional;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmManner;
import tunwarden.alarm.AlarmSettings;
import tunwarden.alarm.AlarmSettings.Delays;
import tunwarden.alarm.Priority;
import tunwarden.units.BadInputException;
import tunwarden.units.Display;
import tunwarden.units.Kind;

/** The {@code [alarms]} and {@code [display]} tables. */
final class AlarmsReader {
  /** A longer on-delay would switch an alarm of high priority off in disguise. */
  private static final Duration LONGEST_HIGH = Duration.ofSeconds(60);

  private static final Duration LONGEST = Duration.ofHours(24);

  private AlarmsReader() {}

  static AlarmSettings read(Section alarms, Display display) {
    AlarmSettings usual = AlarmSettings.DEFAULT;
    double margin =
        alarms.quantity("margin-low", Texts::pressureDifferencePa).orElse(usual.marginLowPa());
    Optional<Duration> relief = alarms.parsed("time-to-relief", ReadingsReader::duration);
    Optional<Duration> stale = alarms.parsed("stale", ReadingsReader::duration);
    double full =
        alarms
            .quantity("liquid-full-within", Texts.of(Kind.TEMPERATURE_DIFFERENCE))
            .orElse(usual.liquidFullWithinK());
    AlarmManner manner = manner(alarms, usual.manner());
    alarms.close();
    return usual
        .withMarginLow(margin)
        .withTimeToRelief(relief.orElse(usual.timeToRelief()))
        .withStale(stale.orElse(usual.stale()))
        .withLiquidFullWithin(full)
        .withManner(manner)
        .withDisplay(display);
  }

  private static AlarmManner manner(Section alarms, AlarmManner usual) {
    AlarmSettings.Deadbands bands = usual.deadbands();
    double band =
        alarms.quantity("deadband", Texts::pressureDifferencePa).orElse(bands.pressurePa());
    Optional<Duration> shelf = alarms.parsed("longest-shelf", AlarmsReader::upToADay);
    AlarmManner manner =
        usual
            .withDeadbands(new AlarmSettings.Deadbands(band, bands.temperatureK(), bands.time()))
            .withLongestShelf(shelf.orElse(usual.longestShelf()));
    Section each = alarms.section("each");
    for (AlarmKind kind : AlarmKind.values()) {
      if (each.has(kind.id())) {
        manner = oneKind(each.section(kind.id()), kind, manner);
      }
    }
    each.close();
    return manner;
  }

  private static AlarmManner oneKind(Section section, AlarmKind kind, AlarmManner manner) {
    Delays usual = manner.delays().getOrDefault(kind, Delays.NONE);
    Duration most = kind.priority() == Priority.HIGH ? LONGEST_HIGH : LONGEST;
    Optional<Duration> on = section.parsed("on-delay", text -> atMost(text, most));
    Optional<Duration> off = section.parsed("off-delay", AlarmsReader::upToADay);
    Optional<String> why = section.text("switched-off");
    AlarmManner changed =
        manner.withDelays(kind, new Delays(on.orElse(usual.on()), off.orElse(usual.off())));
    if (why.isPresent()) {
      if (kind.priority() == Priority.HIGH || why.get().isBlank()) {
        section.problem(
            "switched-off",
            "write why in a few words; an alarm of high priority cannot be switched off for good,"
                + " it can be shelved or taken out of service with the alarms command");
      } else {
        changed = changed.withSwitchedOff(kind, why.get());
      }
    }
    section.close();
    return changed;
  }

  private static Duration upToADay(String text) {
    return atMost(text, LONGEST);
  }

  private static Duration atMost(String text, Duration most) {
    Duration stated = Duration.ofMillis(Math.round(Texts.of(Kind.DURATION).apply(text) * 1000));
    if (stated.compareTo(most) > 0) {
      throw new BadInputException(
          "'" + text + "' is too long; write at most " + most.toSeconds() + " s");
    }
    return stated;
  }

  static Display display(Section display) {
    Optional<Display> units = display.parsed("units", Texts::display);
    display.close();
    return units.orElse(Display.METRIC);
  }
}

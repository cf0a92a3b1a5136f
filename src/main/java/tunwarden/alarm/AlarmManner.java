package tunwarden.alarm;

import java.time.Duration;
import java.util.EnumMap;
import java.util.Map;

/**
 * How alarms come and go, whatever they are about. Where no standard is named the defaults are
 * common practice, no source.
 *
 * @param deadbands how far a value must go back before its alarm ends
 * @param delays how long a condition must hold, by kind; {@link AlarmSettings.Delays#NONE} where
 *     absent
 * @param switchedOff alarms that are never raised, and why; none of high priority
 * @param longestShelf longest time an alarm may be shelved for
 */
public record AlarmManner(
    AlarmSettings.Deadbands deadbands,
    Map<AlarmKind, AlarmSettings.Delays> delays,
    Map<AlarmKind, String> switchedOff,
    Duration longestShelf) {

  /** What a small producer can leave alone. */
  public static final AlarmManner USUAL =
      new AlarmManner(
          new AlarmSettings.Deadbands(0.02e5, 1, Duration.ofMinutes(20)),
          usualDelays(),
          Map.of(),
          Duration.ofHours(24));

  /** Keeps its own copies and refuses to switch off what protects people. */
  public AlarmManner {
    delays = Map.copyOf(delays);
    switchedOff = Map.copyOf(switchedOff);
    for (AlarmKind kind : switchedOff.keySet()) {
      if (kind.priority() == Priority.HIGH) {
        throw new IllegalArgumentException(
            "an alarm of high priority cannot be switched off for good; shelve it, or take it out"
                + " of service with the alarms command");
      }
    }
  }

  public AlarmManner withDeadbands(AlarmSettings.Deadbands other) {
    return new AlarmManner(other, delays, switchedOff, longestShelf);
  }

  public AlarmManner withLongestShelf(Duration other) {
    return new AlarmManner(deadbands, delays, switchedOff, other);
  }

  /** The same manner with other delays for one kind. */
  public AlarmManner withDelays(AlarmKind kind, AlarmSettings.Delays other) {
    Map<AlarmKind, AlarmSettings.Delays> changed = new EnumMap<>(AlarmKind.class);
    changed.putAll(delays);
    changed.put(kind, other);
    return new AlarmManner(deadbands, changed, switchedOff, longestShelf);
  }

  /**
   * The same manner with one kind never raised.
   *
   * @throws IllegalArgumentException when it is of high priority
   */
  public AlarmManner withSwitchedOff(AlarmKind kind, String why) {
    Map<AlarmKind, String> changed = new EnumMap<>(AlarmKind.class);
    changed.putAll(switchedOff);
    changed.put(kind, why);
    return new AlarmManner(deadbands, delays, changed, longestShelf);
  }

  private static Map<AlarmKind, AlarmSettings.Delays> usualDelays() {
    Map<AlarmKind, AlarmSettings.Delays> usual = new EnumMap<>(AlarmKind.class);
    usual.put(AlarmKind.MARGIN_LOW, AlarmSettings.Delays.seconds(10, 60));
    usual.put(AlarmKind.TIME_TO_RELIEF_SHORT, AlarmSettings.Delays.seconds(60, 300));
    usual.put(AlarmKind.ABOVE_EARLIEST_LIFT, AlarmSettings.Delays.seconds(2, 30));
    usual.put(AlarmKind.ABOVE_VESSEL_LIMIT, AlarmSettings.Delays.seconds(2, 30));
    usual.put(AlarmKind.VACUUM, AlarmSettings.Delays.seconds(2, 30));
    usual.put(AlarmKind.LIQUID_FULL, AlarmSettings.Delays.seconds(10, 60));
    usual.put(AlarmKind.WARM_UP_WOULD_LIFT, AlarmSettings.Delays.seconds(60, 600));
    // NAMUR NE 43: a loop outside 3.6 to 21 mA is a failure once it has lasted 4 s (from memory).
    usual.put(AlarmKind.INSTRUMENT_BAD, AlarmSettings.Delays.seconds(5, 30));
    usual.put(AlarmKind.INSTRUMENT_STALE, AlarmSettings.Delays.seconds(0, 10));
    usual.put(AlarmKind.CLOCK, AlarmSettings.Delays.seconds(0, 600));
    return usual;
  }
}

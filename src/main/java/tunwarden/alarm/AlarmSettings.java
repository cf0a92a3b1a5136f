package tunwarden.alarm;

import java.time.Duration;
import java.util.EnumMap;
import java.util.Map;
import tunwarden.units.Display;

/**
 * When alarms come and go. The defaults are meant to be left alone by a small producer; where no
 * standard is named they are common practice, no source.
 *
 * @param marginLowPa relief margin below which to warn, Pa
 * @param timeToRelief time to the earliest lift below which to warn
 * @param stale age from which an instrument counts as silent; the assessment is given it
 * @param liquidFullWithinK warming that would fill the vessel with liquid, K, below which to warn
 * @param deadbands how far a value must go back before its alarm ends
 * @param delays how long a condition must hold, by kind; {@link Delays#NONE} where absent
 * @param longestShelf longest time an alarm may be shelved for
 * @param display units the texts are written in
 */
public record AlarmSettings(
    double marginLowPa,
    Duration timeToRelief,
    Duration stale,
    double liquidFullWithinK,
    Deadbands deadbands,
    Map<AlarmKind, Delays> delays,
    Duration longestShelf,
    Display display) {

  /** What the cellar file gets when it says nothing. */
  public static final AlarmSettings DEFAULT =
      new AlarmSettings(
          0.2e5,
          Duration.ofHours(4),
          Duration.ofSeconds(30),
          5,
          new Deadbands(0.02e5, 1, Duration.ofMinutes(20)),
          usualDelays(),
          Duration.ofHours(24),
          Display.METRIC);

  /** Keeps its own copy and refuses what would switch an alarm off in disguise. */
  public AlarmSettings {
    delays = Map.copyOf(delays);
    if (!(marginLowPa >= 0) || timeToRelief.isNegative() || stale.isZero() || stale.isNegative()) {
      throw new IllegalArgumentException("alarm limits must not be negative and stale not zero");
    }
  }

  /**
   * How far back is back.
   *
   * @param pressurePa for pressures and margins, Pa
   * @param temperatureK for temperatures, K
   * @param time for forecast times
   */
  public record Deadbands(double pressurePa, double temperatureK, Duration time) {}

  /**
   * How long a condition must hold.
   *
   * @param on before the alarm is raised
   * @param off before it has returned to normal
   */
  public record Delays(Duration on, Duration off) {
    /** At once, both ways. */
    public static final Delays NONE = new Delays(Duration.ZERO, Duration.ZERO);

    /** Whole seconds. */
    public static Delays seconds(long on, long off) {
      return new Delays(Duration.ofSeconds(on), Duration.ofSeconds(off));
    }
  }

  public Delays delays(AlarmKind kind) {
    return delays.getOrDefault(kind, Delays.NONE);
  }

  public AlarmSettings withMarginLow(double pa) {
    return new AlarmSettings(
        pa, timeToRelief, stale, liquidFullWithinK, deadbands, delays, longestShelf, display);
  }

  public AlarmSettings withTimeToRelief(Duration time) {
    return new AlarmSettings(
        marginLowPa, time, stale, liquidFullWithinK, deadbands, delays, longestShelf, display);
  }

  /** The same settings with another age from which an instrument counts as silent. */
  public AlarmSettings withStale(Duration age) {
    return new AlarmSettings(
        marginLowPa,
        timeToRelief,
        age,
        liquidFullWithinK,
        deadbands,
        delays,
        longestShelf,
        display);
  }

  /** The same settings with texts in other units. */
  public AlarmSettings withDisplay(Display units) {
    return new AlarmSettings(
        marginLowPa,
        timeToRelief,
        stale,
        liquidFullWithinK,
        deadbands,
        delays,
        longestShelf,
        units);
  }

  /** The same settings with other delays for one kind. */
  public AlarmSettings withDelays(AlarmKind kind, Delays other) {
    Map<AlarmKind, Delays> changed = new EnumMap<>(AlarmKind.class);
    changed.putAll(delays);
    changed.put(kind, other);
    return new AlarmSettings(
        marginLowPa,
        timeToRelief,
        stale,
        liquidFullWithinK,
        deadbands,
        changed,
        longestShelf,
        display);
  }

  private static Map<AlarmKind, Delays> usualDelays() {
    Map<AlarmKind, Delays> usual = new EnumMap<>(AlarmKind.class);
    usual.put(AlarmKind.MARGIN_LOW, Delays.seconds(10, 60));
    usual.put(AlarmKind.TIME_TO_RELIEF_SHORT, Delays.seconds(60, 300));
    usual.put(AlarmKind.ABOVE_EARLIEST_LIFT, Delays.seconds(2, 30));
    usual.put(AlarmKind.ABOVE_VESSEL_LIMIT, Delays.seconds(2, 30));
    usual.put(AlarmKind.VACUUM, Delays.seconds(2, 30));
    usual.put(AlarmKind.LIQUID_FULL, Delays.seconds(10, 60));
    usual.put(AlarmKind.WARM_UP_WOULD_LIFT, Delays.seconds(60, 600));
    usual.put(AlarmKind.INSTRUMENT_BAD, Delays.seconds(5, 30));
    usual.put(AlarmKind.INSTRUMENT_STALE, Delays.seconds(0, 10));
    usual.put(AlarmKind.CLOCK, Delays.seconds(0, 600));
    return usual;
  }
}

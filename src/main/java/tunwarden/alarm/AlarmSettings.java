package tunwarden.alarm;

import java.time.Duration;
import tunwarden.units.Display;

/**
 * When alarms come and go. The defaults are meant to be left alone by a small producer.
 *
 * @param marginLowPa relief margin below which to warn, Pa
 * @param timeToRelief likely time to the earliest lift below which to warn; of its early edge, half
 * @param stale age from which an instrument counts as silent; the assessment is given it
 * @param liquidFullWithinK warming that would fill the vessel with liquid, K, below which to warn
 * @param manner deadbands, delays and shelves
 * @param display units the texts are written in
 */
public record AlarmSettings(
    double marginLowPa,
    Duration timeToRelief,
    Duration stale,
    double liquidFullWithinK,
    AlarmManner manner,
    Display display) {

  /** What the cellar file gets when it says nothing. */
  public static final AlarmSettings DEFAULT =
      new AlarmSettings(
          0.2e5, Duration.ofHours(4), Duration.ofSeconds(30), 5, AlarmManner.USUAL, Display.METRIC);

  /** Refuses what would switch an alarm off in disguise. */
  public AlarmSettings {
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

  /** How far a value must go back before its alarm ends. */
  public Deadbands deadbands() {
    return manner.deadbands();
  }

  /** How long the condition of a kind must hold. */
  public Delays delays(AlarmKind kind) {
    return manner.delays().getOrDefault(kind, Delays.NONE);
  }

  /** Longest time an alarm may be shelved for. */
  public Duration longestShelf() {
    return manner.longestShelf();
  }

  /** What a condition comes to: nothing, if its kind is switched off. */
  Condition heeded(Condition condition) {
    return manner.switchedOff().containsKey(condition.kind())
        ? Condition.no(condition.kind())
        : condition;
  }

  public AlarmSettings withMarginLow(double pa) {
    return new AlarmSettings(pa, timeToRelief, stale, liquidFullWithinK, manner, display);
  }

  public AlarmSettings withTimeToRelief(Duration time) {
    return new AlarmSettings(marginLowPa, time, stale, liquidFullWithinK, manner, display);
  }

  /** The same settings with another age from which an instrument counts as silent. */
  public AlarmSettings withStale(Duration age) {
    return new AlarmSettings(marginLowPa, timeToRelief, age, liquidFullWithinK, manner, display);
  }

  /** The same settings with another warming, K, that must be left before the vessel is full. */
  public AlarmSettings withLiquidFullWithin(double kelvin) {
    return new AlarmSettings(marginLowPa, timeToRelief, stale, kelvin, manner, display);
  }

  /** The same settings with texts in other units. */
  public AlarmSettings withDisplay(Display units) {
    return new AlarmSettings(marginLowPa, timeToRelief, stale, liquidFullWithinK, manner, units);
  }

  public AlarmSettings withManner(AlarmManner other) {
    return new AlarmSettings(marginLowPa, timeToRelief, stale, liquidFullWithinK, other, display);
  }
}

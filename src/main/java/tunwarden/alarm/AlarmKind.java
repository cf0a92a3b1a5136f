package tunwarden.alarm;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** The conditions a person must act on, each with what to do about it. */
public enum AlarmKind {
  MARGIN_LOW(
      "margin low",
      Priority.WARNING,
      "Find out why the pressure rises; cool the vessel or plan a staged vent before it reaches the"
          + " relief setting."),
  TIME_TO_RELIEF_SHORT(
      "time to relief short",
      Priority.WARNING,
      "Go and look before that time: cool the vessel, or air the room and vent in stages."),
  ABOVE_EARLIEST_LIFT(
      "above earliest lift",
      Priority.HIGH,
      "The valve may open at any moment: keep clear of its outlet, air the room, lower the pressure"
          + " by the usual vent. Never block or reset a relief valve."),
  OVER_RELIEF(
      "above relief setting, no lift seen",
      Priority.HIGH,
      "The valve should be open and no lift is seen: keep people away, compare a second gauge, stop"
          + " what feeds the pressure and call a licensed person."),
  ABOVE_VESSEL_LIMIT(
      "above vessel limit",
      Priority.HIGH,
      "Keep people away, stop any gas supply, lower the pressure from a safe place, and let a"
          + " licensed person inspect the vessel before it is used again."),
  LIFT_SEEN(
      "relief valve lifted",
      Priority.HIGH,
      "Measure the CO2 in the room before going in; find the cause of the pressure, check that the"
          + " valve has closed tight, and have it looked at under local code."),
  COOLING_LOST(
      "cooling lost",
      Priority.WARNING,
      "See whether the cooling runs; the pressure follows the temperature."),
  WARM_UP_WOULD_LIFT(
      "warm-up would lift the valve",
      Priority.ADVICE,
      "Nothing now; know that without cooling this vessel reaches its relief setting."),
  VACUUM(
      "vacuum",
      Priority.HIGH,
      "Stop cooling, pumping out or cleaning with caustic, and let gas in slowly: a tank collapses"
          + " faster than it swells."),
  LIQUID_FULL(
      "nearly liquid-full",
      Priority.WARNING,
      "Do not let it warm; draw liquid off to make headspace. A relief valve sized for gas may not"
          + " cope with expanding liquid."),
  LEAK(
      "leak",
      Priority.CAUTION,
      "Measure the CO2 in the room before searching; then check seals, taps and hoses."),
  UNEXPLAINED_PRESSURE(
      "unexplained pressure",
      Priority.CAUTION,
      "Look at the vessel: something adds or takes gas that the description does not know of."),
  INSTRUMENT_BAD(
      "instrument bad",
      Priority.CAUTION,
      "Compare with a second gauge; until it is put right the figures for this vessel are not to be"
          + " relied on."),
  INSTRUMENT_STALE(
      "instrument silent",
      Priority.CAUTION,
      "Check plug, cable and supply; read the gauge on the vessel itself until it answers."),
  DISK(
      "disk",
      Priority.CAUTION,
      "Make room in the data folder or mend the disk; recording resumes by itself."),
  CLOCK(
      "clock",
      Priority.CAUTION,
      "Check the date and time of this computer and of the instruments' loggers."),
  CONFIGURATION(
      "cellar file",
      Priority.CAUTION,
      "Correct the cellar file; the one read before stays in use."),
  NOTICE(
      "notice not delivered",
      Priority.CAUTION,
      "Nobody is being told of alarms: check the network and the [notice] part of the cellar file.");

  private final String word;
  private final Priority priority;
  private final String action;

  AlarmKind(String word, Priority priority, String action) {
    this.word = word;
    this.priority = priority;
    this.action = action;
  }

  /** What a person reads. */
  public String word() {
    return word;
  }

  /** Name in files and commands: {@code margin-low}. */
  public String id() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /** The kind with that {@link #id()}, if there is one. */
  public static Optional<AlarmKind> ofId(String id) {
    return Arrays.stream(values()).filter(kind -> kind.id().equals(id)).findFirst();
  }

  public Priority priority() {
    return priority;
  }

  /** What the person should do, one sentence. */
  public String action() {
    return action;
  }

  /** Whether it is of the station itself, not of a vessel; a clock can be wrong in both. */
  public boolean isOfStation() {
    return switch (this) {
      case DISK, CLOCK, CONFIGURATION, NOTICE -> true;
      default -> false;
    };
  }

  /** Whether it is told by an event that begins and ends, not by a level that is passed. */
  boolean isEvent() {
    return switch (this) {
      case LIFT_SEEN, LEAK, UNEXPLAINED_PRESSURE, OVER_RELIEF, COOLING_LOST -> true;
      default -> false;
    };
  }

  /** Whether its return to normal must be seen by a person too. */
  boolean latches() {
    return priority != Priority.ADVICE;
  }
}

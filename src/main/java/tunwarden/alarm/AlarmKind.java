package tunwarden.alarm;

/** The conditions a person must act on. */
public enum AlarmKind {
  MARGIN_LOW("margin low", Priority.WARNING),
  TIME_TO_RELIEF_SHORT("time to relief short", Priority.WARNING),
  ABOVE_EARLIEST_LIFT("above earliest lift", Priority.HIGH),
  ABOVE_VESSEL_LIMIT("above vessel limit", Priority.HIGH),
  LIFT_SEEN("relief valve lifted", Priority.HIGH),
  WARM_UP_WOULD_LIFT("warm-up would lift the valve", Priority.ADVICE),
  VACUUM("vacuum", Priority.HIGH),
  LIQUID_FULL("nearly liquid-full", Priority.WARNING),
  LEAK("leak", Priority.CAUTION),
  UNEXPLAINED_PRESSURE("unexplained pressure", Priority.CAUTION),
  INSTRUMENT_BAD("instrument bad", Priority.CAUTION),
  INSTRUMENT_STALE("instrument silent", Priority.CAUTION),
  DISK("disk", Priority.CAUTION),
  CLOCK("clock", Priority.CAUTION),
  CONFIGURATION("cellar file", Priority.CAUTION);

  private final String word;
  private final Priority priority;

  AlarmKind(String word, Priority priority) {
    this.word = word;
    this.priority = priority;
  }

  public String word() {
    return word;
  }

  public Priority priority() {
    return priority;
  }
}

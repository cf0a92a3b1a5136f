package tunwarden.alarm;

import java.util.Locale;

/** States of ISA-18.2; an alarm in state normal is not listed. */
public enum AlarmState {
  NORMAL("normal"),
  UNACKNOWLEDGED("unacknowledged"),
  ACKNOWLEDGED("acknowledged"),
  RETURNED_UNACKNOWLEDGED("returned to normal, unacknowledged"),
  SHELVED("shelved"),
  SUPPRESSED("suppressed"),
  OUT_OF_SERVICE("out of service");

  private final String word;

  AlarmState(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }

  /** Name in files and metrics: {@code returned-unacknowledged}. */
  public String id() {
    return name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  /** Whether a person has yet to say that they have seen it. */
  public boolean wantsAcknowledging() {
    return this == UNACKNOWLEDGED || this == RETURNED_UNACKNOWLEDGED;
  }
}

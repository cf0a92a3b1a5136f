package tunwarden.alarm;

import java.time.Instant;

/**
 * One change in the life of an alarm: what the journal keeps and what people are told.
 *
 * @param change what happened
 * @param from state before
 * @param alarm the alarm after it
 * @param at data time of the change
 * @param remark who or why, where a person caused it; may be empty
 */
public record Transition(Change change, AlarmState from, Alarm alarm, Instant at, String remark) {

  /** What can happen to an alarm. */
  public enum Change {
    /** The condition came true. */
    RAISED("raised"),
    /** It is still true and there is news: another lift, another sensor, or suppression ended. */
    RAISED_AGAIN("raised again"),
    /** The condition ended. */
    RETURNED("returned to normal"),
    ACKNOWLEDGED("acknowledged"),
    SHELVED("shelved"),
    UNSHELVED("no longer shelved"),
    SUPPRESSED("suppressed"),
    UNSUPPRESSED("no longer suppressed"),
    OUT_OF_SERVICE("taken out of service"),
    IN_SERVICE("back in service");

    private final String word;

    Change(String word) {
      this.word = word;
    }

    public String word() {
      return word;
    }
  }

  /** State after it. */
  public AlarmState to() {
    return alarm.state();
  }

  /** Whether a person should be told now: it wants acknowledging and did not a moment ago. */
  public boolean annunciates() {
    return alarm.state() == AlarmState.UNACKNOWLEDGED
        && (from != AlarmState.UNACKNOWLEDGED || change == Change.RAISED_AGAIN);
  }
}

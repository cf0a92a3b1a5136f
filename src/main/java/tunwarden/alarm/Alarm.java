package tunwarden.alarm;

import java.time.Instant;
import java.util.Optional;

/**
 * One alarm of one vessel.
 *
 * @param kind the condition
 * @param vessel identity of the vessel; empty for the station itself
 * @param state where it is in its life
 * @param since when the condition began, data time
 * @param changed when the state last changed
 * @param shelvedUntil end of shelving, if shelved
 * @param text what is the case, one sentence with its numbers
 * @param action what the person should do, one sentence
 * @param remark the word given when it was acknowledged, shelved or taken out of service; may be
 *     empty
 * @param chattering whether it comes and goes more often than a person can follow
 */
public record Alarm(
    AlarmKind kind,
    String vessel,
    AlarmState state,
    Instant since,
    Instant changed,
    Optional<Instant> shelvedUntil,
    String text,
    String action,
    String remark,
    boolean chattering) {
  public Priority priority() {
    return kind.priority();
  }
}

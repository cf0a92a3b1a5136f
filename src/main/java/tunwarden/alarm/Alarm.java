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
 */
public record Alarm(
    AlarmKind kind,
    String vessel,
    AlarmState state,
    Instant since,
    Instant changed,
    Optional<Instant> shelvedUntil,
    String text,
    String action) {
  public Priority priority() {
    return kind.priority();
  }
}

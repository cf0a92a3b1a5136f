package tunwarden.alarm;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import java.util.Set;

/**
 * What one assessment says about one kind of alarm.
 *
 * @param kind the alarm
 * @param truth whether it is the case
 * @param text the sentence with its numbers; empty unless it is or was the case
 * @param causes what makes it so (an instrument, the start of an event): a cause not seen before
 *     raises the alarm again
 * @param began when it began, if that is earlier than the assessment
 * @param ownDelay replaces the kind's on-delay, where the condition has its own
 */
record Condition(
    AlarmKind kind,
    Truth truth,
    String text,
    Set<String> causes,
    Optional<Instant> began,
    Optional<Duration> ownDelay) {

  /** Silence is not a "no". */
  enum Truth {
    YES,
    NO,
    /** It was the case and is over within the same assessment. */
    OVER,
    /** No news of an event: what has begun goes on. */
    STANDS,
    /** Nothing can be said: the alarm keeps its state. */
    UNKNOWN,
    /** The instrument it rests on is out of service. */
    SUPPRESSED
  }

  static Condition no(AlarmKind kind) {
    return plain(kind, Truth.NO, "");
  }

  static Condition unknown(AlarmKind kind) {
    return plain(kind, Truth.UNKNOWN, "");
  }

  static Condition plain(AlarmKind kind, Truth truth, String text) {
    return new Condition(kind, truth, text, Set.of(), Optional.empty(), Optional.empty());
  }

  Condition withCauses(Set<String> others) {
    return new Condition(kind, truth, text, Set.copyOf(others), began, ownDelay);
  }

  Condition since(Instant time) {
    return new Condition(kind, truth, text, causes, Optional.of(time), ownDelay);
  }

  Condition after(Duration delay) {
    return new Condition(kind, truth, text, causes, began, Optional.of(delay));
  }
}

package tunwarden.notice;

import java.time.Duration;
import tunwarden.alarm.Priority;

/**
 * When to send.
 *
 * @param least alarms of a lower priority are not sent
 * @param together how long the first alarm waits for others
 * @param perHour messages an hour at most; what comes above that is folded into the next
 */
public record NoticeRules(Priority least, Duration together, int perHour) {
  /** All but advice, five seconds, twelve an hour. */
  public static final NoticeRules USUAL =
      new NoticeRules(Priority.CAUTION, Duration.ofSeconds(5), 12);
}

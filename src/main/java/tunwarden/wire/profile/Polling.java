package tunwarden.wire.profile;

import java.time.Duration;

/**
 * How an instrument is asked, or how often it speaks unasked.
 *
 * @param period between readings
 * @param timeout longest wait for an answer, transmission not counted
 * @param retries further tries within one poll, 0 to 2
 * @param turnaround pause between an answer and the next request on the same line
 */
public record Polling(Duration period, Duration timeout, int retries, Duration turnaround) {
  /** Once a second, 150 ms for an answer, one retry. */
  public static final Polling USUAL =
      new Polling(Duration.ofSeconds(1), Duration.ofMillis(150), 1, Duration.ZERO);
}

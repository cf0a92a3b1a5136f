package tunwarden.alarm;

import java.time.Instant;
import java.util.Optional;

/**
 * What people and rules did about an alarm.
 *
 * @param acknowledged whether somebody has seen its latest raise
 * @param suppressed whether its instrument is out of service
 * @param shelf where it is put away until later
 * @param outOfService why a person took it out of service
 * @param changed when its state last changed
 * @param remark the latest word a person gave; may be empty
 */
public record Handling(
    boolean acknowledged,
    boolean suppressed,
    Optional<Shelf> shelf,
    Optional<String> outOfService,
    Instant changed,
    String remark) {

  /**
   * An alarm put away for a while.
   *
   * @param until when it comes back by itself
   * @param reason why
   */
  public record Shelf(Instant until, String reason) {}

  static Handling untouched(Instant at) {
    return new Handling(true, false, Optional.empty(), Optional.empty(), at, "");
  }

  /** Nothing here that must be remembered. */
  boolean isUntouched() {
    return acknowledged && !suppressed && shelf.isEmpty() && outOfService.isEmpty();
  }

  Handling seen(boolean seen) {
    return new Handling(seen, suppressed, shelf, outOfService, changed, remark);
  }

  Handling suppressed(boolean now) {
    return new Handling(acknowledged, now, shelf, outOfService, changed, remark);
  }

  Handling shelf(Optional<Shelf> now) {
    return new Handling(acknowledged, suppressed, now, outOfService, changed, remark);
  }

  Handling outOfService(Optional<String> reason) {
    return new Handling(acknowledged, suppressed, shelf, reason, changed, remark);
  }

  Handling remark(String word) {
    return new Handling(acknowledged, suppressed, shelf, outOfService, changed, word);
  }

  Handling changed(Instant at) {
    return new Handling(acknowledged, suppressed, shelf, outOfService, at, remark);
  }
}

package tunwarden.journal;

import java.time.Duration;
import java.time.Instant;
import java.util.HashMap;
import java.util.Map;
import tunwarden.assess.Assessment;

/** Says when the estimate of a vessel is due to be recorded. Used by the station's thread. */
final class EstimatePace {
  private final Duration every;
  private final Map<String, Instant> last = new HashMap<>();

  EstimatePace(Duration every) {
    this.every = every;
  }

  boolean isDue(Assessment assessment) {
    if (assessment.estimate().isEmpty()) {
      return false;
    }
    Instant now = assessment.time();
    Instant before = last.get(assessment.vessel().id());
    // A clock that stepped back must not silence the record until it has caught up.
    boolean due = before == null || now.isBefore(before) || !now.isBefore(before.plus(every));
    if (due) {
      last.put(assessment.vessel().id(), now);
    }
    return due;
  }
}

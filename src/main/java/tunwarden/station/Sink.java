package tunwarden.station;

import tunwarden.assess.Assessment;
import tunwarden.estimate.Step;
import tunwarden.reading.Sample;

/**
 * Where the station's output goes. Called on the station's thread, which must not be held up: a
 * sink that does slow work hands over to a thread of its own and states its loss rule.
 */
public interface Sink {
  /** A sample went through the estimator. */
  default void sampled(Sample sample, Step step) {}

  /** A new snapshot of one vessel. */
  default void assessed(Assessment assessment) {}
}

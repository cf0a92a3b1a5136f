package tunwarden.estimate;

import java.time.Instant;
import tunwarden.reading.Sample;
import tunwarden.vessel.Vessel;

/**
 * Turns samples into beliefs about one vessel. Stateless itself: all memory is in {@link State}. A
 * step is taken when a pressure arrives, with the newest temperature; within one log row the
 * pressure therefore comes last.
 */
public interface Estimator {
  /** The state before anything was seen. */
  State begin(Vessel vessel);

  /** Digests one sample; never throws for bad data. */
  Step step(State previous, Sample sample);

  /** Nothing arrived until {@code now}: ages the state, ends or opens gap events. */
  Step idle(State previous, Instant now);
}

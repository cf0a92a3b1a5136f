package tunwarden.station;

import java.time.Instant;
import tunwarden.estimate.State;
import tunwarden.forecast.Outlook;
import tunwarden.vessel.Vessel;

/** Computes the futures of one vessel from the estimator's state; pure. */
@FunctionalInterface
public interface Forecasts {
  /** The outlook as of {@code now}, data time; {@link Outlook#NONE} where nothing can be said. */
  Outlook outlook(Vessel vessel, State state, Instant now);
}

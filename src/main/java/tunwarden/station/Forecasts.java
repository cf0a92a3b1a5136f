package tunwarden.station;

import tunwarden.estimate.State;
import tunwarden.forecast.Hindsight;
import tunwarden.forecast.Outlook;
import tunwarden.vessel.Vessel;

/** Computes the futures of one vessel from the estimator's state; pure. */
@FunctionalInterface
public interface Forecasts {
  /**
   * The outlook as of the newest reading; {@link Outlook#NONE} where nothing can be said.
   *
   * @param vessel its description
   * @param state the estimator's
   * @param seen what the readings have taught beside the estimator
   */
  Outlook outlook(Vessel vessel, State state, Hindsight seen);
}

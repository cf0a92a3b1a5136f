package tunwarden.station;

import tunwarden.estimate.State;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.RecentRise;
import tunwarden.vessel.Vessel;

/** Computes the futures of one vessel from the estimator's state; pure. */
@FunctionalInterface
public interface Forecasts {
  /**
   * The outlook as of the newest reading; {@link Outlook#NONE} where nothing can be said.
   *
   * @param vessel its description
   * @param state the estimator's
   * @param rise how the gauge itself has been rising
   */
  Outlook outlook(Vessel vessel, State state, RecentRise rise);
}

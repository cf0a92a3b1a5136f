package tunwarden.screen.model;

import java.util.List;
import tunwarden.alarm.Alarm;
import tunwarden.assess.Assessment;
import tunwarden.assess.History;
import tunwarden.estimate.Event;

/**
 * One vessel as the dashboard sees it.
 *
 * @param assessment the newest assessment
 * @param alarms its alarms that are not in state normal
 * @param history its pressures and temperatures, for the charts; read concurrently
 * @param goingOn events that have begun and not ended
 */
public record VesselBoard(
    Assessment assessment, List<Alarm> alarms, History history, List<Event> goingOn) {
  /** Keeps its own copies. */
  public VesselBoard {
    alarms = List.copyOf(alarms);
    goingOn = List.copyOf(goingOn);
  }

  /** Identity of the vessel. */
  public String id() {
    return assessment.vessel().id();
  }
}

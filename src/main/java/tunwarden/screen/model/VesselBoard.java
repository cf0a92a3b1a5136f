package tunwarden.screen.model;

import java.util.List;
import tunwarden.alarm.Alarm;
import tunwarden.assess.Assessment;
import tunwarden.assess.History;

/**
 * One vessel as the dashboard sees it.
 *
 * @param assessment the newest assessment
 * @param alarms its alarms that are not in state normal
 * @param history its pressures and temperatures, for the charts; read concurrently
 */
public record VesselBoard(Assessment assessment, List<Alarm> alarms, History history) {
  /** Keeps its own copy. */
  public VesselBoard {
    alarms = List.copyOf(alarms);
  }

  /** Identity of the vessel. */
  public String id() {
    return assessment.vessel().id();
  }
}

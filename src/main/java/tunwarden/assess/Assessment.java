package tunwarden.assess;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Event;
import tunwarden.forecast.Outlook;
import tunwarden.vessel.Vessel;

/**
 * Everything known about one vessel at one moment of data time. Screen, alarms, journal and server
 * read nothing else.
 *
 * @param vessel its description
 * @param time data time of this assessment
 * @param pressure newest pressure, Pa gauge
 * @param temperature newest liquid temperature, K
 * @param estimate the belief; empty until both instruments have spoken
 * @param margins distance to relief; empty where no relief setting was stated or no reading is
 *     usable
 * @param outlook the futures
 * @param ladder all pressures that matter, highest first
 * @param events events that began, changed or ended with this assessment
 * @param notes what a person should be told about the readings, in words
 */
public record Assessment(
    Vessel vessel,
    Instant time,
    Observed pressure,
    Observed temperature,
    Optional<Estimate> estimate,
    Optional<Margins> margins,
    Outlook outlook,
    List<Rung> ladder,
    List<Event> events,
    List<String> notes) {
  /** Keeps its own copies. */
  public Assessment {
    ladder = List.copyOf(ladder);
    events = List.copyOf(events);
    notes = List.copyOf(notes);
  }
}

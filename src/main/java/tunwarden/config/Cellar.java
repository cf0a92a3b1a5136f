package tunwarden.config;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import tunwarden.alarm.AlarmSettings;
import tunwarden.journal.RecorderSettings;
import tunwarden.vessel.Site;
import tunwarden.vessel.Vessel;

/**
 * Everything a cellar file says, checked.
 *
 * @param file where it was read from
 * @param site where the vessels stand
 * @param vessels in the order of the file, at least one
 * @param instruments where their quantities are read
 * @param alarms when alarms come and go, and the units texts are written in
 * @param recording how readings are recorded and kept
 * @param notice whom to tell of an alarm
 */
public record Cellar(
    Path file,
    Site site,
    List<Vessel> vessels,
    List<Instrument> instruments,
    AlarmSettings alarms,
    RecorderSettings recording,
    NoticePlan notice) {
  /** Keeps its own copies. */
  public Cellar {
    vessels = List.copyOf(vessels);
    instruments = List.copyOf(instruments);
  }

  /** The vessel with that name, if there is one. */
  public Optional<Vessel> vessel(String id) {
    return vessels.stream().filter(vessel -> vessel.id().equals(id)).findFirst();
  }
}

package tunwarden.screen.model;

import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.util.List;
import java.util.Optional;
import tunwarden.alarm.Alarm;

/**
 * One immutable snapshot of everything the dashboard shows.
 *
 * @param origin where the readings come from
 * @param now data time: the clock when live, the log's own time in a replay. Ages are counted from
 *     it, so when live it must be read afresh for every board, also when no reading arrives
 * @param zone time zone in which times of day are shown
 * @param staleAfter age from which a reading is stale
 * @param vessels the vessels, in the order of the cellar file
 * @param stationAlarms alarms of the station itself: disk, clock, cellar file
 * @param instruments health of the instruments
 * @param replay where the replay stands; empty unless the origin is a replay
 * @param journal newest entries, oldest first
 * @param progress long work under way, if any
 */
public record Board(
    Origin origin,
    Instant now,
    ZoneId zone,
    Duration staleAfter,
    List<VesselBoard> vessels,
    List<Alarm> stationAlarms,
    List<Instrument> instruments,
    Optional<ReplayStatus> replay,
    List<JournalEntry> journal,
    Optional<Progress> progress) {
  /** Keeps its own copies. */
  public Board {
    vessels = List.copyOf(vessels);
    stationAlarms = List.copyOf(stationAlarms);
    instruments = List.copyOf(instruments);
    journal = List.copyOf(journal);
  }

  /** The vessel with that identity, if it is on the board. */
  public Optional<VesselBoard> vessel(String id) {
    return vessels.stream().filter(vessel -> vessel.id().equals(id)).findFirst();
  }
}

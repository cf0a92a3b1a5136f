package tunwarden.app.keeping;

import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.State;
import tunwarden.estimate.StateCodec;
import tunwarden.forecast.Outlook;
import tunwarden.journal.DataFolder;
import tunwarden.journal.SavedEstimates;
import tunwarden.replay.LogRow;
import tunwarden.station.Station;
import tunwarden.station.StationSettings;
import tunwarden.vessel.Vessel;

/**
 * Begins the estimates where they were left: from the saved state of a vessel, with the readings
 * recorded since. A state that cannot be understood (another version wrote it) is made again from
 * the record. A vessel that is described otherwise, or whose state is too old, starts afresh. What
 * was done is said for each.
 */
final class Resumption {
  private static final Duration LONGEST = Duration.ofSeconds(20);

  /** A clock may have been corrected by this much since the state was saved. */
  private static final Duration CORRECTION = Duration.ofMinutes(2);

  private final DataFolder folder;
  private final Duration oldest;
  private final Instant now;
  private final long endNanos = System.nanoTime() + LONGEST.toNanos();
  private final Set<String> resumed = new LinkedHashSet<>();
  private final List<String> words = new ArrayList<>();
  private Station warmed;

  /**
   * Nothing is read yet.
   *
   * @param oldest how old a state may be
   */
  Resumption(DataFolder folder, Duration oldest, Instant now) {
    this.folder = folder;
    this.oldest = oldest;
    this.now = now;
  }

  /**
   * Takes in what is known of each vessel.
   *
   * @param descriptions as the vessels were described when the alarms were saved last
   */
  void run(
      List<Vessel> vessels,
      Optional<SavedEstimates> saved,
      Optional<Map<String, String>> descriptions) {
    warmed =
        new Station(
            vessels,
            Estimators.standard(),
            (vessel, state, rise) -> Outlook.NONE,
            StationSettings.USUAL,
            List.of());
    for (Vessel vessel : vessels) {
      Optional<SavedEstimates.Kept> kept =
          saved.map(estimates -> estimates.vessels().get(vessel.id()));
      String before = descriptions.orElse(Map.of()).get(vessel.id());
      if (kept.isPresent()) {
        goOn(vessel, kept.get(), saved.get().savedAt(), vessel.toString().equals(before));
      } else if (before == null) {
        afresh(vessel, "nothing was known of this vessel");
      } else if (!before.equals(vessel.toString())) {
        afresh(vessel, "its description has changed");
      } else {
        makeAgain(vessel, "");
      }
    }
  }

  private void goOn(
      Vessel vessel, SavedEstimates.Kept kept, Instant savedAt, boolean describedAsBefore) {
    Duration age = Duration.between(savedAt, now);
    if (age.compareTo(oldest) > 0) {
      afresh(vessel, "its saved state is " + span(age) + " old, more than " + span(oldest));
      return;
    }
    if (age.plus(CORRECTION).isNegative()) {
      afresh(vessel, "its saved state is of " + savedAt + ", later than now");
      return;
    }
    State state;
    try {
      state = StateCodec.decode(vessel, kept.state());
    } catch (IllegalArgumentException refused) {
      if (describedAsBefore) {
        String reason = refused.getMessage().replaceFirst(";.*", "");
        makeAgain(vessel, reason + ", so ");
      } else {
        afresh(vessel, "its description has changed");
      }
      return;
    }
    warmed.resume(vessel.id(), state);
    int rows = replay(vessel, kept.seenUntil().orElse(savedAt));
    resumed.add(vessel.id());
    words.add(
        vessel.id()
            + ": the estimate goes on from its state of "
            + savedAt
            + (rows < 0 ? "; the readings since could not be taken in." : rowWords(rows)));
  }

  private static String rowWords(int rows) {
    return ", with " + rows + " row(s) recorded since.";
  }

  /** Without a state that can be used: the record of the last hours gives one. */
  private void makeAgain(Vessel vessel, String because) {
    int rows = replay(vessel, now.minus(oldest));
    if (rows <= 0) {
      afresh(vessel, because.replace(", so ", " and ") + "there is no record to make it from");
      return;
    }
    resumed.add(vessel.id());
    words.add(
        vessel.id()
            + ": "
            + because
            + "the estimate is made again from "
            + rows
            + " recorded row(s).");
  }

  /** Takes in what was recorded after that moment; negative when that could not be done. */
  private int replay(Vessel vessel, Instant after) {
    if (System.nanoTime() - endNanos > 0) {
      return -1;
    }
    try {
      List<LogRow> rows = new RecentRows(folder, vessel.id(), after, now).read();
      rows.forEach(row -> row.samples().forEach(warmed::accept));
      return rows.size();
    } catch (IOException unreadable) {
      words.add(vessel.id() + ": the record cannot be read: " + unreadable.getMessage() + ".");
      return -1;
    }
  }

  private void afresh(Vessel vessel, String reason) {
    words.add(vessel.id() + ": the estimate starts afresh; " + reason + ".");
  }

  private static String span(Duration time) {
    return time.toHours() > 0 ? time.toHours() + " h" : time.toMinutes() + " min";
  }

  /** What is remembered of the vessels that go on. */
  Station.Checkpoint checkpoint() {
    return warmed.checkpoint().only(resumed).withoutOutlooks();
  }

  Set<String> resumed() {
    return resumed;
  }

  /** One sentence for each vessel. */
  List<String> words() {
    return words;
  }
}

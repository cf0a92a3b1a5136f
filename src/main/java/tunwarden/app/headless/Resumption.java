package tunwarden.app.headless;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import tunwarden.estimate.Estimators;
import tunwarden.forecast.Outlook;
import tunwarden.journal.DataFolder;
import tunwarden.replay.BadLogException;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogOptions;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;
import tunwarden.station.Station;
import tunwarden.station.StationSettings;
import tunwarden.vessel.Vessel;

/**
 * Begins the estimates where they were left: takes in the readings recorded lately, so that what
 * the estimator remembers needs no format of its own and cannot disagree with the record. A vessel
 * that was described otherwise, or whose newest reading is too old, starts afresh, and that is
 * said.
 */
final class Resumption {
  /** More rows than this are thinned evenly, so that a start never takes long. */
  private static final int MOST_ROWS = 4000;

  private static final Duration LONGEST = Duration.ofSeconds(20);

  private final DataFolder folder;
  private final Duration oldest;
  private final Instant now;
  private final Station warmed;
  private final Set<String> resumed = new LinkedHashSet<>();
  private final List<String> words = new ArrayList<>();

  Resumption(DataFolder folder, List<Vessel> vessels, Duration oldest, Instant now) {
    this.folder = folder;
    this.oldest = oldest;
    this.now = now;
    this.warmed =
        new Station(
            vessels,
            Estimators.standard(),
            (vessel, state, at) -> Outlook.NONE,
            StationSettings.USUAL,
            List.of());
  }

  /** Takes in what was recorded of each vessel whose description is the same as before. */
  void run(List<Vessel> vessels, Map<String, String> descriptions) {
    long end = System.nanoTime() + LONGEST.toNanos();
    for (Vessel vessel : vessels) {
      String before = descriptions.get(vessel.id());
      if (before == null) {
        words.add(vessel.id() + ": the estimate starts afresh; nothing was known of this vessel.");
      } else if (!before.equals(vessel.toString())) {
        words.add(vessel.id() + ": the estimate starts afresh; its description has changed.");
      } else if (System.nanoTime() - end > 0) {
        words.add(
            vessel.id() + ": the estimate starts afresh; taking in the record took too long.");
      } else {
        take(vessel);
      }
    }
  }

  private void take(Vessel vessel) {
    List<LogRow> rows = new ArrayList<>();
    LocalDate today = LocalDate.ofInstant(now, ZoneOffset.UTC);
    Instant from = now.minus(oldest);
    try {
      for (LocalDate day = LocalDate.ofInstant(from, ZoneOffset.UTC);
          !day.isAfter(today);
          day = day.plusDays(1)) {
        read(vessel, day, from, rows);
      }
    } catch (IOException | BadLogException unreadable) {
      words.add(
          vessel.id() + ": the estimate starts afresh; the record: " + unreadable.getMessage());
      return;
    }
    if (rows.isEmpty()) {
      words.add(
          vessel.id()
              + ": the estimate starts afresh; nothing was recorded in the last "
              + oldest.toHours()
              + " h.");
      return;
    }
    int step = 1 + rows.size() / MOST_ROWS;
    for (int i = (rows.size() - 1) % step; i < rows.size(); i += step) {
      rows.get(i).samples().forEach(warmed::accept);
    }
    resumed.add(vessel.id());
    words.add(
        vessel.id()
            + ": the estimate goes on from "
            + rows.size()
            + " recorded rows since "
            + rows.get(0).time()
            + ".");
  }

  private void read(Vessel vessel, LocalDate day, Instant from, List<LogRow> rows)
      throws IOException {
    Path plain = folder.readings(vessel.id(), day);
    Path packed = plain.resolveSibling(plain.getFileName() + ".gz");
    for (Path file : List.of(packed, plain)) {
      if (Files.exists(file) && Files.size(file) > 0) {
        LogFile log = LogFile.open(file, LogOptions.NONE.forVessel(vessel.id()));
        try (RowSource source = log.open()) {
          for (LogRow row = source.next(); row != null; row = source.next()) {
            if (row.time().isAfter(from) && !row.time().isAfter(now)) {
              rows.add(row);
            }
          }
        }
      }
    }
  }

  /** What is remembered of the vessels that go on. */
  Station.Checkpoint checkpoint() {
    return warmed.checkpoint().only(resumed);
  }

  Set<String> resumed() {
    return resumed;
  }

  /** One sentence for each vessel. */
  List<String> words() {
    return words;
  }
}

package tunwarden.app.keeping;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import tunwarden.journal.DataFolder;
import tunwarden.replay.BadLogException;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogOptions;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;

/** The recorded rows of one vessel in a span of time. */
final class RecentRows {
  /** More rows than this are thinned evenly, so that a start never takes long. */
  private static final int MOST_ROWS = 4000;

  private final DataFolder folder;
  private final String vessel;
  private final Instant after;
  private final Instant until;

  RecentRows(DataFolder folder, String vessel, Instant after, Instant until) {
    this.folder = folder;
    this.vessel = vessel;
    this.after = after;
    this.until = until;
  }

  /** Oldest first, the newest among them. */
  List<LogRow> read() throws IOException {
    List<LogRow> rows = new ArrayList<>();
    LocalDate last = LocalDate.ofInstant(until, ZoneOffset.UTC);
    LocalDate day = LocalDate.ofInstant(after, ZoneOffset.UTC);
    for (; !day.isAfter(last); day = day.plusDays(1)) {
      Path plain = folder.readings(vessel, day);
      for (Path file : List.of(plain.resolveSibling(plain.getFileName() + ".gz"), plain)) {
        if (Files.exists(file) && Files.size(file) > 0) {
          read(file, rows);
        }
      }
    }
    return thinned(rows);
  }

  private void read(Path file, List<LogRow> rows) throws IOException {
    try {
      LogFile log = LogFile.open(file, LogOptions.NONE.forVessel(vessel));
      try (RowSource source = log.open()) {
        for (LogRow row = source.next(); row != null; row = source.next()) {
          if (row.time().isAfter(after) && !row.time().isAfter(until)) {
            rows.add(row);
          }
        }
      }
    } catch (BadLogException notOurs) {
      throw new IOException(notOurs.getMessage(), notOurs);
    }
  }

  private static List<LogRow> thinned(List<LogRow> rows) {
    int step = 1 + rows.size() / MOST_ROWS;
    List<LogRow> kept = new ArrayList<>();
    for (int i = (rows.size() - 1) % step; i < rows.size(); i += step) {
      kept.add(rows.get(i));
    }
    return kept;
  }
}

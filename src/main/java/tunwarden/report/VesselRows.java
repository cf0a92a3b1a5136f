package tunwarden.report;

import java.io.IOException;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import tunwarden.replay.BadLogException;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogReader;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;
import tunwarden.report.story.Chapter;

/** The rows of one vessel out of one or several logs, one after the other in order of time. */
final class VesselRows implements RowSource {
  private final List<LogFile> logs;
  private final String vessel;
  private final boolean hashing;
  private final List<String> notes = new ArrayList<>();
  private final List<Chapter.Input> inputs = new ArrayList<>();
  private LogReader reader;
  private int next;
  private long lastMs = Long.MIN_VALUE;
  private long overlapping;
  private ZoneId zone;

  /**
   * Begins before the first row.
   *
   * @param hashing whether {@link #inputs} is wanted in the end
   */
  VesselRows(List<LogFile> logs, String vessel, boolean hashing) throws IOException {
    this.hashing = hashing;
    this.logs = logs.size() == 1 ? logs : byFirstRow(logs);
    this.vessel = vessel;
  }

  private static List<LogFile> byFirstRow(List<LogFile> logs) throws IOException {
    record Begun(LogFile log, long ms) {}
    List<Begun> begun = new ArrayList<>();
    for (LogFile log : logs) {
      try (LogReader reader = log.open()) {
        LogRow first = reader.next();
        begun.add(new Begun(log, first == null ? Long.MAX_VALUE : first.time().toEpochMilli()));
      }
    }
    begun.sort(Comparator.comparingLong(Begun::ms));
    return begun.stream().map(Begun::log).toList();
  }

  @Override
  public LogRow next() throws IOException {
    while (true) {
      if (reader == null && !openNext()) {
        return null;
      }
      LogRow row = reader.next();
      if (row == null) {
        finishLog();
      } else if (row.vessel().equals(vessel)) {
        zone = zone == null ? reader.offset() : zone;
        if (row.time().toEpochMilli() > lastMs) {
          lastMs = row.time().toEpochMilli();
          return row;
        }
        overlapping++;
      }
    }
  }

  private boolean openNext() throws IOException {
    if (next == logs.size()) {
      return false;
    }
    LogFile log = logs.get(next++);
    reader = hashing ? log.openHashed() : log.open();
    return true;
  }

  private void finishLog() throws IOException {
    String path = logs.get(next - 1).path().toString();
    String prefix = logs.size() > 1 ? path + ": " : "";
    reader.notes().sentences().forEach(sentence -> notes.add(prefix + sentence));
    reader.sha256().ifPresent(hash -> inputs.add(new Chapter.Input(path, hash)));
    close();
  }

  /** The logs with their hashes; complete once all rows were read. */
  List<Chapter.Input> inputs() {
    return inputs;
  }

  /** What was met on the way; complete once all rows were read. */
  List<String> notes() {
    List<String> all = new ArrayList<>(notes);
    if (overlapping > 0) {
      all.add(overlapping + " rows lie before the end of the log before theirs and were left out");
    }
    return all;
  }

  /** The offset of the first row's time. */
  ZoneId zone() {
    return zone;
  }

  /** Refuses a log in which the vessel does not occur. */
  void requireRows(long rows) {
    if (rows == 0) {
      throw new BadLogException(
          logs.get(0).path().toString(), 0, "vessel", "no row speaks of " + vessel);
    }
  }

  @Override
  public void close() throws IOException {
    if (reader != null) {
      reader.close();
      reader = null;
    }
  }
}

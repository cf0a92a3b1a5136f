package tunwarden.journal;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.locks.ReentrantLock;
import tunwarden.journal.disk.Disk;
import tunwarden.journal.disk.LineFile;

/**
 * The open day file of each vessel. Used by the recorder's thread alone; the lock keeps the janitor
 * from compressing a closed day while late rows go into it.
 */
final class DayFiles {
  /** Where a vessel's day is kept. */
  @FunctionalInterface
  interface Place {
    Path of(String vessel, LocalDate day);
  }

  private final Disk disk;
  private final Place place;
  private final String header;
  private final ReentrantLock closedDays;
  private final Map<String, Open> files = new HashMap<>();
  private final Set<Path> paths = ConcurrentHashMap.newKeySet();

  private record Open(LocalDate day, LineFile file) {}

  DayFiles(Disk disk, Place place, String header, ReentrantLock closedDays) {
    this.disk = disk;
    this.place = place;
    this.header = header;
    this.closedDays = closedDays;
  }

  /** Puts a line in the file of its day; opens it if it must be. */
  void add(String vessel, Instant time, String line) throws IOException {
    LocalDate day = LocalDate.ofInstant(time, ZoneOffset.UTC);
    Open open = files.get(vessel);
    if (open == null || !open.day().equals(day)) {
      closedDays.lock();
      try {
        shut(vessel);
        open = new Open(day, LineFile.open(disk, place.of(vessel, day), header));
        files.put(vessel, open);
        paths.add(open.file().path());
      } finally {
        closedDays.unlock();
      }
    }
    open.file().add(line);
  }

  /** Writes and forces everything; tries every file even if one fails. */
  void flush() throws IOException {
    IOException first = null;
    for (Open open : files.values()) {
      try {
        open.file().flush();
      } catch (IOException failed) {
        open.file().takeBack();
        first = first == null ? failed : first;
      }
    }
    if (first != null) {
      throw first;
    }
  }

  /** Whether the file is being written; ask with the lock of closed days held. */
  boolean isOpen(Path file) {
    return paths.contains(file);
  }

  /** Closes the files of days before {@code today}, so that they can be compressed. */
  void closeBefore(LocalDate today) throws IOException {
    for (String vessel : files.keySet().toArray(String[]::new)) {
      if (files.get(vessel).day().isBefore(today)) {
        shut(vessel);
      }
    }
  }

  private void shut(String vessel) throws IOException {
    Open open = files.remove(vessel);
    if (open != null) {
      try {
        open.file().close();
      } finally {
        paths.remove(open.file().path());
      }
    }
  }

  void close() throws IOException {
    IOException first = null;
    for (String vessel : files.keySet().toArray(String[]::new)) {
      try {
        shut(vessel);
      } catch (IOException failed) {
        first = first == null ? failed : first;
      }
    }
    if (first != null) {
      throw first;
    }
  }
}

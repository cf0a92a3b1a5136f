package tunwarden.journal;

import java.io.IOException;
import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.YearMonth;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Predicate;
import tunwarden.journal.disk.Disk;

/** Compresses closed days and deletes what is too old, too much, or in the way on a full disk. */
final class Janitor {
  private static final int DATE_LENGTH = "2026-03-02".length();
  private static final int MONTH_LENGTH = "2026-03".length();

  private final Disk disk;
  private final DataFolder folder;
  private final RecorderSettings.Keep keep;
  private final ReentrantLock closedDays;
  private final Predicate<Path> isOpen;

  /** A compressed day. */
  private record Closed(LocalDate day, Path file, long bytes) {}

  Janitor(
      Disk disk,
      DataFolder folder,
      RecorderSettings.Keep keep,
      ReentrantLock closedDays,
      Predicate<Path> isOpen) {
    this.disk = disk;
    this.folder = folder;
    this.keep = keep;
    this.closedDays = closedDays;
    this.isOpen = isOpen;
  }

  /** Compresses every plain day before {@code today}. */
  void compress(LocalDate today) throws IOException {
    Compressor compressor = new Compressor(disk);
    for (Path file : days(".csv")) {
      if (!day(file).isBefore(today)) {
        continue;
      }
      closedDays.lock();
      try {
        if (!isOpen.test(file)) {
          compressor.compress(file);
        }
      } finally {
        closedDays.unlock();
      }
    }
  }

  /** Deletes what is older than the age kept, then the oldest beyond the size kept. */
  List<Path> retain(LocalDate today) throws IOException {
    List<Path> deleted = new ArrayList<>();
    LocalDate oldest = today.minusDays(keep.days());
    List<Closed> closed = closed();
    long total = closed.stream().mapToLong(Closed::bytes).sum();
    for (Closed one : closed) {
      if (one.day().isBefore(oldest) || total > keep.bytes()) {
        delete(one.file(), deleted);
        total -= one.bytes();
      }
    }
    for (Path month : disk.list(folder.journal())) {
      if (isMonthBefore(month, oldest)) {
        delete(month, deleted);
      }
    }
    return deleted;
  }

  /** Deletes the oldest closed days until there is room enough; says which. */
  List<Path> makeRoom() throws IOException {
    List<Path> deleted = new ArrayList<>();
    for (Closed one : closed()) {
      if (hasRoom()) {
        break;
      }
      delete(one.file(), deleted);
    }
    return deleted;
  }

  boolean hasRoom() throws IOException {
    return disk.usableBytes(folder.root()) >= keep.leastFreeBytes();
  }

  private void delete(Path file, List<Path> deleted) throws IOException {
    disk.delete(file);
    disk.syncDirectory(file.getParent());
    deleted.add(file);
  }

  private List<Closed> closed() throws IOException {
    List<Closed> all = new ArrayList<>();
    for (Path file : days(".csv.gz")) {
      all.add(new Closed(day(file), file, disk.size(file)));
    }
    all.sort(Comparator.comparing(Closed::day).thenComparing(Closed::file));
    return all;
  }

  private List<Path> days(String ending) throws IOException {
    List<Path> found = new ArrayList<>();
    for (Path kind : List.of(folder.readings(), folder.estimates())) {
      for (Path vessel : disk.list(kind)) {
        for (Path file : disk.list(vessel)) {
          if (DataFolder.isDayFile(file, ending)) {
            found.add(file);
          }
        }
      }
    }
    return found;
  }

  private static LocalDate day(Path file) {
    return LocalDate.parse(file.getFileName().toString().substring(0, DATE_LENGTH));
  }

  private static boolean isMonthBefore(Path file, LocalDate oldest) {
    String name = file.getFileName().toString();
    try {
      return name.endsWith(".jsonl")
          && YearMonth.parse(name.substring(0, Math.min(MONTH_LENGTH, name.length())))
              .atEndOfMonth()
              .isBefore(oldest);
    } catch (DateTimeException notOurs) {
      return false;
    }
  }
}

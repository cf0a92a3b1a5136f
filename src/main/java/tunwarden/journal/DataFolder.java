package tunwarden.journal;

import java.io.Closeable;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.YearMonth;
import tunwarden.journal.disk.Disk;
import tunwarden.units.BadInputException;

/**
 * Where everything is kept, and the lock that only one program at a time may hold. Days and months
 * are those of UTC, so that no hour is missing or doubled when clocks change.
 */
public final class DataFolder implements Closeable {
  private final Path root;
  private final FileChannel lockFile;

  private DataFolder(Path root, FileChannel lockFile) {
    this.root = root;
    this.lockFile = lockFile;
  }

  /**
   * Opens the folder, making it where there is none, and takes its lock.
   *
   * @throws BadInputException when another program holds the lock
   */
  public static DataFolder open(Path root, Disk disk) throws IOException {
    disk.createDirectories(root);
    FileChannel channel =
        FileChannel.open(
            root.resolve("lock"),
            StandardOpenOption.CREATE,
            StandardOpenOption.READ,
            StandardOpenOption.WRITE);
    if (!lock(channel)) {
      channel.close();
      throw new BadInputException(
          "The data folder "
              + root
              + " is in use by another tunwarden; stop that one or give --data another folder.");
    }
    String holder = ProcessHandle.current().pid() + "\n";
    channel.truncate(0);
    channel.write(ByteBuffer.wrap(holder.getBytes(StandardCharsets.US_ASCII)), 0);
    return new DataFolder(root, channel);
  }

  private static boolean lock(FileChannel channel) throws IOException {
    try {
      FileLock lock = channel.tryLock(Long.MAX_VALUE - 1, 1, false);
      return lock != null;
    } catch (OverlappingFileLockException held) {
      return false;
    }
  }

  public Path root() {
    return root;
  }

  public Path readings() {
    return root.resolve("readings");
  }

  public Path estimates() {
    return root.resolve("estimates");
  }

  public Path journal() {
    return root.resolve("journal");
  }

  public Path notices() {
    return root.resolve("notices");
  }

  /** Alarms and shelves as last saved. */
  public Path state() {
    return root.resolve("state.json");
  }

  /** What the estimator remembers as last saved. */
  public Path estimatorState() {
    return root.resolve("estimates.state");
  }

  /** Where people leave what they want done, see {@link tunwarden.journal.request}. */
  public Path requests() {
    return root.resolve("requests");
  }

  /** {@code readings/VESSEL/2026-03-02.csv}. */
  public Path readings(String vessel, LocalDate day) {
    return inside(readings(), vessel).resolve(day + ".csv");
  }

  /** {@code estimates/VESSEL/2026-03-02.csv}. */
  public Path estimates(String vessel, LocalDate day) {
    return inside(estimates(), vessel).resolve(day + ".csv");
  }

  /** {@code journal/2026-03.jsonl}. */
  public Path journal(YearMonth month) {
    return journal().resolve(month + ".jsonl");
  }

  /** A vessel's own folder; a name that would lead out of it is refused. */
  private static Path inside(Path parent, String vessel) {
    if (!vessel.matches("[A-Za-z0-9][A-Za-z0-9._-]{0,63}") || vessel.endsWith(".")) {
      throw new IllegalArgumentException(
          "a vessel is called by letters, digits, '.', '_' and '-', at most 64, not by "
              + vessel.replaceAll("\\p{Cntrl}", "?"));
    }
    // Windows keeps some names for devices, whatever follows the dot.
    boolean device = vessel.matches("(?i)(con|prn|aux|nul|com\\d|lpt\\d)(\\..*)?");
    return parent.resolve(device ? "_" + vessel : vessel);
  }

  /** Gives the lock back; the lock file stays. */
  @Override
  public void close() throws IOException {
    lockFile.close();
  }

  /** Whether a file is of the folder's own making, as opposed to something a person put there. */
  static boolean isDayFile(Path file, String ending) {
    String name = file.getFileName().toString();
    if (!name.endsWith(ending)) {
      return false;
    }
    try {
      LocalDate.parse(name.substring(0, name.length() - ending.length()));
      return true;
    } catch (DateTimeException notADay) {
      return false;
    }
  }
}

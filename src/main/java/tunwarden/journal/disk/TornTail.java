package tunwarden.journal.disk;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.Optional;

/**
 * Cuts a file of lines back to its last whole line. A process killed while writing leaves half a
 * line; a power cut can also leave a run of zero bytes where data never reached the disk.
 */
public final class TornTail {
  private static final int CHUNK = 1 << 16;

  private TornTail() {}

  /**
   * What was cut.
   *
   * @param file which file
   * @param kept its length now, bytes
   * @param cut bytes taken off
   */
  public record Repair(Path file, long kept, long cut) {
    /** One sentence for journal and console. */
    public String text() {
      return file.getFileName()
          + " ended in the middle of a line: "
          + cut
          + " bytes cut off, "
          + kept
          + " kept.";
    }
  }

  /** Repairs the file if it must be; says what was done. */
  public static Optional<Repair> repair(Disk disk, Path file) throws IOException {
    long size = disk.size(file);
    long whole = wholeLength(disk, file);
    if (whole == size) {
      return Optional.empty();
    }
    try (Disk.Appending open = disk.append(file)) {
      open.truncate(whole);
      open.force();
    }
    return Optional.of(new Repair(file, whole, size - whole));
  }

  /** Length up to the end of the last line before the first zero byte. */
  private static long wholeLength(Disk disk, Path file) throws IOException {
    long position = 0;
    long whole = 0;
    byte[] chunk = new byte[CHUNK];
    try (InputStream in = disk.read(file)) {
      for (int n = in.read(chunk); n >= 0; n = in.read(chunk)) {
        for (int i = 0; i < n; i++) {
          position++;
          if (chunk[i] == 0) {
            return whole;
          }
          if (chunk[i] == '\n') {
            whole = position;
          }
        }
      }
    }
    return whole;
  }
}

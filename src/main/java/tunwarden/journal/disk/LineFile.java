package tunwarden.journal.disk;

import java.io.Closeable;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/**
 * A file of whole lines. What could not be written whole is taken back, so that a full disk or a
 * failed write never leaves half a line in the middle of a file.
 */
public final class LineFile implements Closeable {
  private final Path path;
  private final Disk.Appending file;
  private final StringBuilder waiting = new StringBuilder();
  private long goodLength;
  private boolean doubtful;
  private boolean dirty;

  private LineFile(Path path, Disk.Appending file, long goodLength) {
    this.path = path;
    this.file = file;
    this.goodLength = goodLength;
  }

  /**
   * Opens or makes a file; a new one gets the header line and its name made durable.
   *
   * @param header first line without its end; empty for none
   */
  public static LineFile open(Disk disk, Path path, String header) throws IOException {
    disk.createDirectories(path.getParent());
    boolean fresh = !disk.exists(path);
    Disk.Appending file = disk.append(path);
    try {
      LineFile lines = new LineFile(path, file, file.size());
      if (fresh) {
        disk.syncDirectory(path.getParent());
      }
      if (lines.goodLength == 0 && !header.isEmpty()) {
        lines.add(header);
      }
      return lines;
    } catch (IOException | RuntimeException failed) {
      file.close();
      throw failed;
    }
  }

  public Path path() {
    return path;
  }

  /** Puts a line, without its end, in line to be written. */
  public void add(String line) {
    waiting.append(line).append('\n');
  }

  /** Characters waiting to be written. */
  public int waiting() {
    return waiting.length();
  }

  /** Gives up what waits: it could not be written. */
  public void dropWaiting() {
    waiting.setLength(0);
  }

  /**
   * Writes what waits and returns once it is on the disk. After a failure everything still waits
   * and the file holds only whole lines, as soon as the disk allows that.
   */
  public void flush() throws IOException {
    if (doubtful) {
      file.truncate(goodLength);
      doubtful = false;
    }
    if (waiting.length() > 0) {
      ByteBuffer bytes = ByteBuffer.wrap(waiting.toString().getBytes(StandardCharsets.UTF_8));
      int length = bytes.remaining();
      doubtful = true;
      while (bytes.hasRemaining()) {
        if (file.write(bytes) <= 0) {
          throw new IOException("nothing more could be written to " + path.getFileName());
        }
      }
      goodLength += length;
      doubtful = false;
      dirty = true;
      waiting.setLength(0);
    }
    if (dirty) {
      file.force();
      dirty = false;
    }
  }

  /** Takes back half-written bytes after a failure; tried again at the next flush if it fails. */
  public void takeBack() {
    if (doubtful) {
      try {
        file.truncate(goodLength);
        doubtful = false;
      } catch (IOException ignored) {
        // The next flush tries again before it writes.
      }
    }
  }

  @Override
  public void close() throws IOException {
    try {
      flush();
    } finally {
      takeBack();
      file.close();
    }
  }
}

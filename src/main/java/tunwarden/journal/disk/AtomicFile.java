package tunwarden.journal.disk;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.file.Path;

/** Replaces a small file whole: after a crash there is the old content or the new, never a mix. */
public final class AtomicFile {
  private AtomicFile() {}

  /**
   * Writes beside, forces, closes, and only then renames; the directory is synced last. A failure
   * on the way leaves the old file in place.
   */
  public static void write(Disk disk, Path target, byte[] content) throws IOException {
    Path beside = target.resolveSibling(target.getFileName() + ".new");
    disk.createDirectories(target.toAbsolutePath().getParent());
    disk.delete(beside);
    try (Disk.Appending file = disk.append(beside)) {
      ByteBuffer bytes = ByteBuffer.wrap(content);
      while (bytes.hasRemaining()) {
        if (file.write(bytes) <= 0) {
          throw new IOException("nothing more could be written to " + beside.getFileName());
        }
      }
      file.force();
    }
    disk.replace(beside, target);
    disk.syncDirectory(target.toAbsolutePath().getParent());
  }
}

package tunwarden.app.headless;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;

/**
 * Notices that the cellar file was changed. A change counts once the file has stayed the same from
 * one look to the next, so that a half-written file is not read.
 */
final class CellarWatch {
  private final Path file;
  private Stamp read;
  private Stamp lastLook;

  private record Stamp(FileTime time, long size) {}

  CellarWatch(Path file) {
    this.file = file;
    this.read = stamp();
    this.lastLook = read;
  }

  boolean hasChanged() {
    Stamp now = stamp();
    boolean settled = now != null && now.equals(lastLook);
    lastLook = now;
    if (settled && !now.equals(read)) {
      read = now;
      return true;
    }
    return false;
  }

  private Stamp stamp() {
    try {
      return new Stamp(Files.getLastModifiedTime(file), Files.size(file));
    } catch (IOException absent) {
      return null;
    }
  }
}

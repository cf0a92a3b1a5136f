package tunwarden.journal.disk;

import java.io.Closeable;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.file.Path;
import java.util.List;

/** What recording needs of a file system. */
public interface Disk {
  /** Opens a file to append to it; makes it where there is none. */
  Appending append(Path file) throws IOException;

  /** Opens a file to read it from its beginning. */
  InputStream read(Path file) throws IOException;

  /** Puts one file in the place of another in one step. */
  void replace(Path from, Path to) throws IOException;

  /** Makes renamed, new and deleted names in a directory survive a power cut. */
  void syncDirectory(Path directory) throws IOException;

  /** Makes a directory and those above it. */
  void createDirectories(Path directory) throws IOException;

  void delete(Path file) throws IOException;

  /** What is in a directory, sorted by name; nothing if it does not exist. */
  List<Path> list(Path directory) throws IOException;

  boolean exists(Path file);

  long size(Path file) throws IOException;

  /** Room left where the file or directory is, bytes. */
  long usableBytes(Path place) throws IOException;

  /** A file open at its end. */
  interface Appending extends Closeable {
    long size() throws IOException;

    /** Writes some of the bytes, perhaps fewer than asked, as the system does. */
    int write(ByteBuffer bytes) throws IOException;

    /** Returns once everything written is on the disk. */
    void force() throws IOException;

    void truncate(long size) throws IOException;
  }
}

package tunwarden.journal.disk;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;

/** The file system of this computer. */
public final class RealDisk implements Disk {
  private static final boolean WINDOWS =
      System.getProperty("os.name", "").toLowerCase(Locale.ROOT).startsWith("windows");

  @Override
  public Appending append(Path file) throws IOException {
    return new Channel(
        FileChannel.open(
            file, StandardOpenOption.CREATE, StandardOpenOption.WRITE, StandardOpenOption.APPEND));
  }

  @Override
  public InputStream read(Path file) throws IOException {
    return Files.newInputStream(file);
  }

  @Override
  public void replace(Path from, Path to) throws IOException {
    Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
  }

  @Override
  public void syncDirectory(Path directory) throws IOException {
    if (WINDOWS) {
      return; // A directory cannot be opened there; the file system journals names by itself.
    }
    try (FileChannel channel = FileChannel.open(directory, StandardOpenOption.READ)) {
      channel.force(true);
    }
  }

  @Override
  public void createDirectories(Path directory) throws IOException {
    if (Files.isDirectory(directory)) {
      return;
    }
    Path parent = directory.toAbsolutePath().getParent();
    if (parent != null) {
      createDirectories(parent);
    }
    Files.createDirectories(directory);
    if (parent != null) {
      syncDirectory(parent);
    }
  }

  @Override
  public void delete(Path file) throws IOException {
    Files.deleteIfExists(file);
  }

  @Override
  public List<Path> list(Path directory) throws IOException {
    if (!Files.isDirectory(directory)) {
      return List.of();
    }
    try (Stream<Path> entries = Files.list(directory)) {
      return entries.sorted().toList();
    }
  }

  @Override
  public boolean exists(Path file) {
    return Files.exists(file);
  }

  @Override
  public long size(Path file) throws IOException {
    return Files.size(file);
  }

  @Override
  public long usableBytes(Path place) throws IOException {
    return Files.getFileStore(place).getUsableSpace();
  }

  private record Channel(FileChannel channel) implements Appending {
    @Override
    public long size() throws IOException {
      return channel.size();
    }

    @Override
    public int write(ByteBuffer bytes) throws IOException {
      return channel.write(bytes);
    }

    @Override
    public void force() throws IOException {
      channel.force(false);
    }

    @Override
    public void truncate(long size) throws IOException {
      channel.truncate(size);
    }

    @Override
    public void close() throws IOException {
      channel.close();
    }
  }
}

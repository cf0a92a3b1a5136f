package tunwarden.journal;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.atomic.AtomicLong;
import tunwarden.journal.disk.Disk;
import tunwarden.journal.disk.RealDisk;

/** A real disk that can be made short of breath: short writes, errors, no room. */
final class FaultyDisk implements Disk {
  private final Disk real = new RealDisk();

  /** Bytes that may still be written before the disk is full. */
  final AtomicLong room = new AtomicLong(Long.MAX_VALUE);

  /** Free bytes the system reports. */
  final AtomicLong usable = new AtomicLong(Long.MAX_VALUE / 2);

  volatile boolean shortWrites;
  volatile boolean forceFails;
  volatile boolean truncateFails;
  volatile boolean renameFails;

  @Override
  public Appending append(Path file) throws IOException {
    return new Wrapped(real.append(file));
  }

  @Override
  public InputStream read(Path file) throws IOException {
    return real.read(file);
  }

  @Override
  public void replace(Path from, Path to) throws IOException {
    if (renameFails) {
      throw new IOException("rename refused");
    }
    real.replace(from, to);
  }

  @Override
  public void syncDirectory(Path directory) throws IOException {
    real.syncDirectory(directory);
  }

  @Override
  public void createDirectories(Path directory) throws IOException {
    real.createDirectories(directory);
  }

  @Override
  public void delete(Path file) throws IOException {
    if (real.exists(file)) {
      usable.addAndGet(real.size(file));
    }
    real.delete(file);
  }

  @Override
  public List<Path> list(Path directory) throws IOException {
    return real.list(directory);
  }

  @Override
  public boolean exists(Path file) {
    return real.exists(file);
  }

  @Override
  public long size(Path file) throws IOException {
    return real.size(file);
  }

  @Override
  public long usableBytes(Path place) {
    return usable.get();
  }

  private final class Wrapped implements Appending {
    private final Appending file;

    Wrapped(Appending file) {
      this.file = file;
    }

    @Override
    public long size() throws IOException {
      return file.size();
    }

    @Override
    public int write(ByteBuffer bytes) throws IOException {
      int most = (int) Math.min(bytes.remaining(), room.get());
      if (shortWrites) {
        most = Math.min(most, 3);
      }
      if (most <= 0) {
        throw new IOException("No space left on device");
      }
      ByteBuffer part = bytes.duplicate();
      part.limit(part.position() + most);
      int written = file.write(part);
      bytes.position(bytes.position() + written);
      room.addAndGet(-written);
      return written;
    }

    @Override
    public void force() throws IOException {
      if (forceFails) {
        throw new IOException("Input/output error");
      }
      file.force();
    }

    @Override
    public void truncate(long size) throws IOException {
      if (truncateFails) {
        throw new IOException("Input/output error");
      }
      file.truncate(size);
    }

    @Override
    public void close() throws IOException {
      file.close();
    }
  }
}

package tunwarden.journal;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.TreeMap;
import tunwarden.journal.disk.Disk;

/**
 * A disk in memory that keeps apart what was asked for and what would survive a power cut: bytes
 * survive for sure once forced, names once their directory was synced. What was not made durable
 * may survive in whole, in part, or as zeros.
 */
final class PowerCutDisk implements Disk {
  private static final class Inode {
    byte[] content = new byte[0];
    byte[] durable = new byte[0];
  }

  private final Map<Path, Inode> names = new TreeMap<>();
  private final Map<Path, Inode> durableNames = new TreeMap<>();
  private long operations;
  private long cutAt = Long.MAX_VALUE;

  /** Lets the power fail at that operation, counted from the first. */
  synchronized void cutAt(long operation) {
    cutAt = operation;
  }

  synchronized long operations() {
    return operations;
  }

  synchronized boolean isCut() {
    return operations >= cutAt;
  }

  /** What is found on the disk when power returns. */
  synchronized PowerCutDisk afterPowerReturns(SplittableRandom random) {
    PowerCutDisk after = new PowerCutDisk();
    Map<Path, Inode> found = new HashMap<>(durableNames);
    for (Map.Entry<Path, Inode> entry : names.entrySet()) {
      if (random.nextBoolean()) {
        found.put(entry.getKey(), entry.getValue());
      }
    }
    for (Path name : durableNames.keySet()) {
      if (!names.containsKey(name) && random.nextBoolean()) {
        found.remove(name);
      }
    }
    found.forEach((name, inode) -> after.put(name, survivor(inode, random)));
    return after;
  }

  private static byte[] survivor(Inode inode, SplittableRandom random) {
    int sure = inode.durable.length;
    if (inode.content.length <= sure) {
      return inode.durable;
    }
    int length = sure + random.nextInt(inode.content.length - sure + 1);
    byte[] content = Arrays.copyOf(inode.content, length);
    if (random.nextInt(3) == 0) {
      Arrays.fill(content, sure + random.nextInt(length - sure + 1), length, (byte) 0);
    }
    return content;
  }

  synchronized void put(Path name, byte[] content) {
    Inode inode = new Inode();
    inode.content = content;
    inode.durable = content;
    names.put(name, inode);
    durableNames.put(name, inode);
  }

  synchronized Map<Path, byte[]> contents() {
    Map<Path, byte[]> all = new TreeMap<>();
    names.forEach((name, inode) -> all.put(name, inode.content));
    return all;
  }

  private void operate() throws IOException {
    if (operations >= cutAt) {
      throw new IOException("no power");
    }
    operations++;
  }

  @Override
  public synchronized Appending append(Path file) throws IOException {
    operate();
    return new Open(names.computeIfAbsent(file, f -> new Inode()));
  }

  @Override
  public synchronized InputStream read(Path file) throws IOException {
    if (!names.containsKey(file)) {
      throw new NoSuchFileException(file.toString());
    }
    return new ByteArrayInputStream(names.get(file).content);
  }

  @Override
  public synchronized void replace(Path from, Path to) throws IOException {
    operate();
    names.put(to, names.remove(from));
  }

  @Override
  public synchronized void syncDirectory(Path directory) throws IOException {
    operate();
    durableNames.keySet().removeIf(name -> name.getParent().equals(directory));
    names.forEach(
        (name, inode) -> {
          if (name.getParent().equals(directory)) {
            durableNames.put(name, inode);
          }
        });
  }

  @Override
  public synchronized void createDirectories(Path directory) throws IOException {
    operate();
  }

  @Override
  public synchronized void delete(Path file) throws IOException {
    operate();
    names.remove(file);
  }

  @Override
  public synchronized List<Path> list(Path directory) {
    return names.keySet().stream()
        .filter(name -> name.startsWith(directory) && !name.equals(directory))
        .map(name -> directory.resolve(name.getName(directory.getNameCount())))
        .distinct()
        .sorted()
        .toList();
  }

  @Override
  public synchronized boolean exists(Path file) {
    return names.containsKey(file);
  }

  @Override
  public synchronized long size(Path file) throws IOException {
    if (!names.containsKey(file)) {
      throw new NoSuchFileException(file.toString());
    }
    return names.get(file).content.length;
  }

  @Override
  public long usableBytes(Path place) {
    return Long.MAX_VALUE;
  }

  private final class Open implements Appending {
    private final Inode inode;

    Open(Inode inode) {
      this.inode = inode;
    }

    @Override
    public long size() {
      synchronized (PowerCutDisk.this) {
        return inode.content.length;
      }
    }

    @Override
    public int write(ByteBuffer bytes) throws IOException {
      synchronized (PowerCutDisk.this) {
        operate();
        int n = Math.min(bytes.remaining(), 61);
        byte[] grown = Arrays.copyOf(inode.content, inode.content.length + n);
        bytes.get(grown, inode.content.length, n);
        inode.content = grown;
        return n;
      }
    }

    @Override
    public void force() throws IOException {
      synchronized (PowerCutDisk.this) {
        operate();
        inode.durable = inode.content;
      }
    }

    @Override
    public void truncate(long size) throws IOException {
      synchronized (PowerCutDisk.this) {
        operate();
        inode.content = Arrays.copyOf(inode.content, (int) size);
      }
    }

    @Override
    public void close() {
      // Closing makes nothing durable.
    }
  }
}

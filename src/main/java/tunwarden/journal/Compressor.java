package tunwarden.journal;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.nio.file.Path;
import java.util.zip.GZIPInputStream;
import java.util.zip.GZIPOutputStream;
import tunwarden.journal.disk.Disk;

/**
 * Compresses a closed day. The compressed file is forced and renamed before the plain one is
 * deleted; a crash in between leaves both, and the next run sees that and deletes the plain one.
 */
final class Compressor {
  private static final int CHUNK = 1 << 16;

  private final Disk disk;

  Compressor(Disk disk) {
    this.disk = disk;
  }

  /** Puts the day into {@code .csv.gz}, after what is already there, and deletes the plain file. */
  void compress(Path plain) throws IOException {
    Path target = plain.resolveSibling(plain.getFileName() + ".gz");
    if (!disk.exists(target) || !endsWith(target, plain)) {
      Path beside = plain.resolveSibling(plain.getFileName() + ".gz.new");
      disk.delete(beside);
      try (Disk.Appending file = disk.append(beside)) {
        write(plain, target, new Forwarding(file));
        file.force();
      }
      disk.replace(beside, target);
      disk.syncDirectory(target.getParent());
    }
    disk.delete(plain);
    disk.syncDirectory(target.getParent());
  }

  private void write(Path plain, Path target, OutputStream out) throws IOException {
    boolean more = disk.exists(target);
    if (more) {
      try (InputStream old = disk.read(target)) {
        old.transferTo(out);
      }
    }
    // A gzip file may hold several members one after the other (RFC 1952, section 2.2).
    GZIPOutputStream zip = new GZIPOutputStream(out, CHUNK);
    try (InputStream in = new BufferedInputStream(disk.read(plain), CHUNK)) {
      if (more) {
        skipLine(in);
      }
      in.transferTo(zip);
    }
    zip.finish();
  }

  /** Whether the compressed file already ends with all rows of the plain one. */
  private boolean endsWith(Path target, Path plain) throws IOException {
    long rows;
    try (InputStream in = new BufferedInputStream(disk.read(plain), CHUNK)) {
      rows = disk.size(plain) - skipLine(in);
    }
    long before = unpackedLength(target) - rows;
    if (before < 0) {
      return false;
    }
    try (InputStream packed = unpack(target);
        InputStream in = new BufferedInputStream(disk.read(plain), CHUNK)) {
      packed.skipNBytes(before);
      skipLine(in);
      int b = in.read();
      while (b >= 0 && b == packed.read()) {
        b = in.read();
      }
      return b < 0;
    }
  }

  private long unpackedLength(Path target) throws IOException {
    try (InputStream packed = unpack(target)) {
      return packed.transferTo(OutputStream.nullOutputStream());
    }
  }

  private InputStream unpack(Path target) throws IOException {
    return new BufferedInputStream(new GZIPInputStream(disk.read(target), CHUNK), CHUNK);
  }

  private static long skipLine(InputStream in) throws IOException {
    long length = 0;
    int b = in.read();
    while (b >= 0) {
      length++;
      if (b == '\n') {
        return length;
      }
      b = in.read();
    }
    return length;
  }

  private static final class Forwarding extends OutputStream {
    private final Disk.Appending file;

    Forwarding(Disk.Appending file) {
      this.file = file;
    }

    @Override
    public void write(int b) throws IOException {
      write(new byte[] {(byte) b}, 0, 1);
    }

    @Override
    public void write(byte[] bytes, int from, int length) throws IOException {
      ByteBuffer buffer = ByteBuffer.wrap(bytes, from, length);
      while (buffer.hasRemaining()) {
        if (file.write(buffer) <= 0) {
          throw new IOException("nothing more could be written while compressing");
        }
      }
    }
  }
}

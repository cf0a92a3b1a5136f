package tunwarden.journal;

import java.io.BufferedInputStream;
import java.io.ByteArrayOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UTFDataFormatException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tunwarden.journal.disk.Disk;

/**
 * What the estimator remembers of each vessel, as it was saved.
 *
 * @param savedAt when
 * @param vessels by name
 */
public record SavedEstimates(Instant savedAt, Map<String, Kept> vessels) {
  private static final int MAGIC = 0x54574d31;
  private static final int MOST_VESSELS = 100_000;
  private static final int LARGEST_STATE = 1 << 20;

  /**
   * Of one vessel.
   *
   * @param seenUntil time of the newest reading in it; empty before the first
   * @param state as {@link tunwarden.estimate.StateCodec} has it, which checks it as well
   */
  public record Kept(Optional<Instant> seenUntil, byte[] state) {}

  /** Keeps its own copy. */
  public SavedEstimates {
    vessels = Map.copyOf(vessels);
  }

  /** As bytes. */
  public byte[] bytes() {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (DataOutputStream out = new DataOutputStream(bytes)) {
      out.writeInt(MAGIC);
      out.writeLong(savedAt.toEpochMilli());
      out.writeInt(vessels.size());
      for (Map.Entry<String, Kept> vessel : new TreeMap<>(vessels).entrySet()) {
        out.writeUTF(vessel.getKey());
        out.writeLong(
            vessel.getValue().seenUntil().map(Instant::toEpochMilli).orElse(Long.MIN_VALUE));
        out.writeInt(vessel.getValue().state().length);
        out.write(vessel.getValue().state());
      }
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
    return bytes.toByteArray();
  }

  /**
   * Reads what was saved.
   *
   * @return empty when nothing was saved
   * @throws IOException when the file cannot be read or is not ours; the message says so plainly
   */
  public static Optional<SavedEstimates> read(Disk disk, Path file) throws IOException {
    if (!disk.exists(file)) {
      return Optional.empty();
    }
    try (InputStream bytes = disk.read(file);
        DataInputStream in = new DataInputStream(new BufferedInputStream(bytes))) {
      if (in.readInt() != MAGIC) {
        throw new IOException(file.getFileName() + " is not of this version");
      }
      Instant savedAt = Instant.ofEpochMilli(in.readLong());
      int count = bounded(in.readInt(), MOST_VESSELS, file);
      Map<String, Kept> vessels = new TreeMap<>();
      for (int i = 0; i < count; i++) {
        String vessel = in.readUTF();
        long until = in.readLong();
        byte[] state = new byte[bounded(in.readInt(), LARGEST_STATE, file)];
        in.readFully(state);
        Optional<Instant> seen =
            until == Long.MIN_VALUE ? Optional.empty() : Optional.of(Instant.ofEpochMilli(until));
        vessels.put(vessel, new Kept(seen, state));
      }
      return Optional.of(new SavedEstimates(savedAt, vessels));
    } catch (EOFException | UTFDataFormatException cut) {
      throw new IOException(file.getFileName() + " cannot be understood", cut);
    }
  }

  private static int bounded(int count, int most, Path file) throws IOException {
    if (count < 0 || count > most) {
      throw new IOException(file.getFileName() + " cannot be understood");
    }
    return count;
  }
}

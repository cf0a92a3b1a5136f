package tunwarden.report.analysis;

import java.io.BufferedInputStream;
import java.io.BufferedOutputStream;
import java.io.Closeable;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.EOFException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import tunwarden.reading.Quality;

/**
 * Rows parked on disk between the pass over the log and the writing of the series, which has to
 * wait for what only the end of the log tells.
 */
public final class RowSpool implements Closeable {
  private static final Quality[] QUALITIES = Quality.values();

  private Path file;
  private DataOutputStream out;

  /** Parks one row; the first opens a file in the folder for temporary files. */
  public void add(ReportRow row) throws IOException {
    if (out == null) {
      file = Files.createTempFile("tunwarden-series", ".rows");
      out = new DataOutputStream(new BufferedOutputStream(Files.newOutputStream(file), 1 << 16));
    }
    out.writeLong(row.time().getEpochSecond());
    out.writeInt(row.time().getNano());
    out.writeDouble(row.paGauge());
    out.writeDouble(row.temperatureK());
    out.writeDouble(row.dissolvedKgPerM3());
    out.writeDouble(row.u95KgPerM3());
    out.writeDouble(row.equilibriumKgPerM3());
    out.writeDouble(row.settled());
    out.writeDouble(row.marginPa());
    out.writeByte(row.quality().ordinal());
  }

  /** What takes the rows back. */
  public interface Taker {
    void take(ReportRow row) throws IOException;
  }

  /** Gives every row back in order. */
  public void replay(Taker taker) throws IOException {
    if (out == null) {
      return;
    }
    out.close();
    try (DataInputStream in =
        new DataInputStream(new BufferedInputStream(Files.newInputStream(file), 1 << 16))) {
      while (true) {
        taker.take(read(in, in.readLong()));
      }
    } catch (EOFException end) {
      // All rows have been given back.
      return;
    }
  }

  private static ReportRow read(DataInputStream in, long second) throws IOException {
    return new ReportRow(
        Instant.ofEpochSecond(second, in.readInt()),
        in.readDouble(),
        in.readDouble(),
        in.readDouble(),
        in.readDouble(),
        in.readDouble(),
        in.readDouble(),
        in.readDouble(),
        QUALITIES[in.readByte()]);
  }

  @Override
  public void close() throws IOException {
    if (out != null) {
      out.close();
      Files.deleteIfExists(file);
    }
  }
}

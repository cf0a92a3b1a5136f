package tunwarden.app;

import java.io.PrintWriter;
import java.util.Locale;
import java.util.function.LongSupplier;

/** A line that says how far a long reading has come, how fast it goes and how long it will take. */
final class Progress {
  private static final long QUIET_NANOS = 2_000_000_000L;
  private static final long BETWEEN_NANOS = 1_000_000_000L;
  private static final int ROWS_BETWEEN_LOOKS = 4096;

  private final PrintWriter out;
  private final long totalBytes;
  private final LongSupplier nanos;
  private final long begun;
  private volatile long bytes; // told by the thread that reads
  private long saidAt;
  private boolean said;

  Progress(PrintWriter out, long totalBytes) {
    this(out, totalBytes, System::nanoTime);
  }

  Progress(PrintWriter out, long totalBytes, LongSupplier nanos) {
    this.out = out;
    this.totalBytes = totalBytes;
    this.nanos = nanos;
    this.begun = nanos.getAsLong();
    this.saidAt = begun + QUIET_NANOS - BETWEEN_NANOS;
  }

  /** Bytes taken in so far. */
  void bytes(long done) {
    bytes = done;
  }

  /** Rows read so far; now and then this writes the line. */
  void rows(long rows) {
    if (rows % ROWS_BETWEEN_LOOKS != 0) {
      return;
    }
    long now = nanos.getAsLong();
    if (now - saidAt < BETWEEN_NANOS) {
      return;
    }
    saidAt = now;
    said = true;
    double seconds = (now - begun) / 1e9;
    double share = totalBytes == 0 ? 1 : Math.min(1, bytes / (double) totalBytes);
    double left = share > 0 ? seconds * (1 - share) / share : 0;
    out.printf(
        Locale.ROOT,
        "\rread %3.0f %%, %,d rows, %,.0f rows/s, %.0f s left   ",
        100 * share,
        rows,
        rows / seconds,
        left);
    out.flush();
  }

  /** Ends the line, if one was begun. */
  void end() {
    if (said) {
      out.println();
    }
  }
}

package tunwarden.replay;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;

/**
 * Reads rows on a thread of its own, a few batches ahead of the one who takes them, so that reading
 * and working out go on at the same time. Memory is bounded. What the source has to tell besides
 * its rows may be asked once {@link #next} has returned null.
 */
public final class ReadAhead implements RowSource {
  private static final int BATCH = 1024;
  private static final int BATCHES = 8;

  /**
   * Some rows in order.
   *
   * @param rows none or more
   * @param last whether nothing follows
   * @param failure what ended the source early; null for nothing
   */
  private record Batch(List<LogRow> rows, boolean last, Throwable failure) {
    static final Batch NONE_YET = new Batch(List.of(), false, null);
  }

  private final RowSource source;
  private final BlockingQueue<Batch> ready = new ArrayBlockingQueue<>(BATCHES);
  private final Thread reader;
  private Batch batch = Batch.NONE_YET;
  private int taken;

  /** Begins to read at once. */
  public ReadAhead(RowSource source) {
    this.source = source;
    this.reader = new Thread(this::readAll, "rows");
    reader.setDaemon(true);
    reader.start();
  }

  private void readAll() {
    try {
      Batch filled;
      do {
        filled = fill();
        ready.put(filled);
      } while (!filled.last());
    } catch (InterruptedException closed) {
      Thread.currentThread().interrupt();
    }
  }

  private Batch fill() {
    List<LogRow> rows = new ArrayList<>(BATCH);
    try {
      while (rows.size() < BATCH) {
        LogRow row = source.next();
        if (row == null) {
          return new Batch(rows, true, null);
        }
        rows.add(row);
      }
      return new Batch(rows, false, null);
    } catch (IOException | RuntimeException | Error failed) {
      return new Batch(rows, true, failed);
    }
  }

  @Override
  public LogRow next() throws IOException {
    while (taken == batch.rows().size()) {
      rethrow(batch.failure());
      if (batch.last()) {
        return null;
      }
      batch = await();
      taken = 0;
    }
    return batch.rows().get(taken++);
  }

  private Batch await() throws IOException {
    try {
      return ready.take();
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      throw new IOException("reading was interrupted", stopped);
    }
  }

  private static void rethrow(Throwable failure) throws IOException {
    if (failure instanceof IOException broken) {
      throw broken;
    }
    if (failure instanceof RuntimeException bad) {
      throw bad;
    }
    if (failure instanceof Error grave) {
      throw grave;
    }
  }

  @Override
  public void close() throws IOException {
    reader.interrupt();
    try {
      reader.join();
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
    }
    source.close();
  }
}

package tunwarden.replay;

import java.io.Closeable;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;

/**
 * Draws from a source on a thread of its own, a few batches ahead of the one who takes, so that
 * reading and working out go on at the same time. Memory is bounded. What the source has to tell
 * besides may be asked once {@link #next} has returned null.
 *
 * @param <T> what is drawn
 */
public final class ReadAhead<T> implements Closeable {
  private static final int BATCH = 1024;
  private static final int BATCHES = 8;

  /**
   * What is drawn from; null when there is no more.
   *
   * @param <T> what it gives
   */
  public interface Source<T> {
    /** The next one. */
    T next() throws IOException;
  }

  /**
   * Some in order.
   *
   * @param items none or more
   * @param last whether nothing follows
   * @param failure what ended the source early; null for nothing
   */
  private record Batch<T>(List<T> items, boolean last, Throwable failure) {}

  private final Source<T> source;
  private final BlockingQueue<Batch<T>> ready = new ArrayBlockingQueue<>(BATCHES);
  private final Thread reader;
  private Batch<T> batch = new Batch<>(List.of(), false, null);
  private int taken;

  /** Begins to read at once. */
  public ReadAhead(Source<T> source) {
    this.source = source;
    this.reader = new Thread(this::readAll, "rows");
    reader.setDaemon(true);
    reader.start();
  }

  private void readAll() {
    try {
      Batch<T> filled;
      do {
        filled = fill();
        ready.put(filled);
      } while (!filled.last());
    } catch (InterruptedException closed) {
      Thread.currentThread().interrupt();
    }
  }

  private Batch<T> fill() {
    List<T> items = new ArrayList<>(BATCH);
    try {
      while (items.size() < BATCH) {
        T item = source.next();
        if (item == null) {
          return new Batch<>(items, true, null);
        }
        items.add(item);
      }
      return new Batch<>(items, false, null);
    } catch (IOException | RuntimeException | Error failed) {
      return new Batch<>(items, true, failed);
    }
  }

  /** The next one, or null when there is no more; what the source throws is thrown here. */
  public T next() throws IOException {
    while (taken == batch.items().size()) {
      rethrow(batch.failure());
      if (batch.last()) {
        return null;
      }
      batch = await();
      taken = 0;
    }
    return batch.items().get(taken++);
  }

  private Batch<T> await() throws IOException {
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

  /** Stops drawing and waits until the thread has let go of the source, which stays open. */
  @Override
  public void close() {
    reader.interrupt();
    try {
      reader.join();
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
    }
  }
}

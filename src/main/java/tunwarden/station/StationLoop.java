package tunwarden.station;

import java.time.Duration;
import java.time.InstantSource;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Consumer;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.reading.Sample;

/**
 * The one thread that may touch the station. Instruments hand samples over without ever waiting;
 * when the inbox is full a sample is dropped and counted. Everything else that must happen on this
 * thread (acknowledging an alarm, saving state) is handed over as a task, which is never dropped
 * silently.
 */
public final class StationLoop implements AutoCloseable {
  private static final Logger LOG = LoggerFactory.getLogger(StationLoop.class);
  private static final int INBOX = 65_536;
  private static final Duration TICK = Duration.ofSeconds(1);
  private static final long JOIN_MS = 2_000;

  private final Station station;
  private final InstantSource clock;
  private final BlockingQueue<Runnable> inbox = new ArrayBlockingQueue<>(INBOX);
  private final AtomicLong dropped = new AtomicLong();
  private final Thread thread;
  private volatile boolean closing;
  private volatile long heartbeatNanos;

  /** A loop that has not been started. */
  public StationLoop(Station station, InstantSource clock) {
    this.station = station;
    this.clock = clock;
    this.heartbeatNanos = System.nanoTime();
    this.thread = new Thread(this::run, "station");
  }

  public void start() {
    thread.start();
  }

  /** Where instruments deliver; never blocks. */
  public Consumer<Sample> inlet() {
    return sample -> {
      if (!inbox.offer(() -> station.accept(sample))) {
        dropped.incrementAndGet();
      }
    };
  }

  /**
   * Runs a task on the station's thread.
   *
   * @return false if the inbox is full or the loop has ended, and the task will not run
   */
  public boolean submit(Runnable task) {
    return !closing && inbox.offer(task);
  }

  /** Samples lost to a full inbox. */
  public long dropped() {
    return dropped.get();
  }

  /** How long ago the loop last came round, whatever the wall clock does; long means a stall. */
  public Duration sinceHeartbeat() {
    return Duration.ofNanos(System.nanoTime() - heartbeatNanos);
  }

  private void run() {
    long nextTickMs = clock.millis();
    while (!closing || !inbox.isEmpty()) {
      try {
        long nowMs = clock.millis();
        heartbeatNanos = System.nanoTime();
        if (nowMs >= nextTickMs || nextTickMs - nowMs > TICK.toMillis()) {
          nextTickMs = nowMs + TICK.toMillis();
          station.tick(clock.instant());
        }
        Runnable task = inbox.poll(Math.max(1, nextTickMs - nowMs), TimeUnit.MILLISECONDS);
        if (task != null) {
          task.run();
        }
      } catch (InterruptedException e) {
        closing = true;
      } catch (RuntimeException e) {
        LOG.error("the station loop goes on after a failure", e);
      }
    }
  }

  /** Whether the thread is over; after {@link #close} it may take longer on a busy machine. */
  public boolean hasEnded() {
    return !thread.isAlive();
  }

  /** Digests what is in the inbox and ends the thread. */
  @Override
  public void close() {
    closing = true;
    inbox.offer(() -> LOG.debug("woken to close"));
    try {
      thread.join(JOIN_MS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}

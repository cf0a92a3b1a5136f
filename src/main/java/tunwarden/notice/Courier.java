package tunwarden.notice;

import java.io.IOException;
import java.time.Duration;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.locks.Condition;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Consumer;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Delivers the messages of one channel in order, on a thread of its own, until each has gone. */
final class Courier {
  private static final Logger LOG = LoggerFactory.getLogger(Courier.class);
  private static final int WORTH_SAYING = 3;
  private static final long IDLE_NANOS = TimeUnit.MINUTES.toNanos(1);

  private final Channel channel;
  private final Outbox outbox;
  private final Pace pace;
  private final Consumer<Optional<String>> trouble;
  private final ReentrantLock lock = new ReentrantLock();
  private final Condition woken = lock.newCondition();
  private final Deque<Handed> handedIn = new ArrayDeque<>();
  private final Thread thread;
  private boolean closing;
  private int failures;

  /**
   * How fast.
   *
   * @param firstPause after the first failure; doubled after each further one
   * @param longestPause at most
   */
  record Pace(Duration firstPause, Duration longestPause) {
    static final Pace USUAL = new Pace(Duration.ofSeconds(10), Duration.ofMinutes(15));

    Duration pause(int failures) {
      Duration pause = firstPause.multipliedBy(1L << Math.min(20, Math.max(0, failures - 1)));
      return pause.compareTo(longestPause) < 0 ? pause : longestPause;
    }
  }

  /**
   * A courier.
   *
   * @param trouble told a sentence when the third attempt in a row has failed, and empty once a
   *     message got through again
   */
  Courier(Channel channel, Outbox outbox, Pace pace, Consumer<Optional<String>> trouble) {
    this.channel = channel;
    this.outbox = outbox;
    this.pace = pace;
    this.trouble = trouble;
    this.thread = new Thread(this::run, "notice " + channel.name());
    this.thread.setDaemon(true);
  }

  /** Name of its channel. */
  String channel() {
    return channel.name();
  }

  void start() {
    thread.start();
  }

  /** A message and what to do once it is on disk. */
  private record Handed(Message message, Runnable stored) {}

  /**
   * Any thread. The message is on disk a moment later, whatever the channel is doing.
   *
   * @param stored run when it is
   */
  void hand(Message message, Runnable stored) {
    lock.lock();
    try {
      handedIn.add(new Handed(message, stored));
      woken.signal();
    } finally {
      lock.unlock();
    }
  }

  private void run() {
    long notBefore = System.nanoTime();
    while (await(notBefore)) {
      boolean delivered = false;
      try {
        delivered = deliverOne();
      } catch (IOException | RuntimeException e) {
        failures++;
        LOG.warn("the outbox of {}: {}", channel.name(), e.toString());
      }
      notBefore = System.nanoTime() + (delivered ? 0 : pace.pause(failures).toNanos());
    }
  }

  /** Keeps what is handed in, and waits until a message may be tried; false at the end. */
  private boolean await(long notBefore) {
    lock.lock();
    try {
      while (true) {
        store();
        if (closing) {
          return false;
        }
        long left = notBefore - System.nanoTime();
        boolean work = hasWork();
        if (work && left <= 0) {
          return true;
        }
        woken.await(work ? left : IDLE_NANOS, TimeUnit.NANOSECONDS);
      }
    } catch (InterruptedException e) {
      return false;
    } finally {
      lock.unlock();
    }
  }

  private boolean hasWork() {
    try {
      return outbox.size() > 0;
    } catch (IOException e) {
      LOG.warn("the outbox of {}: {}", channel.name(), e.toString());
      return false;
    }
  }

  /** What the disk refuses stays in memory and is tried again. */
  private void store() {
    try {
      while (!handedIn.isEmpty()) {
        if (outbox.add(handedIn.getFirst().message())) {
          LOG.warn("an old message for {} was given up", channel.name());
        }
        handedIn.removeFirst().stored().run();
      }
    } catch (IOException e) {
      LOG.warn("a message for {} could not be kept: {}", channel.name(), e.toString());
      sendUnkept();
    }
  }

  /** With a full disk a message is better sent without having been kept than not at all. */
  private void sendUnkept() {
    try {
      channel.send(handedIn.getFirst().message());
      handedIn.removeFirst().stored().run();
    } catch (IOException | RuntimeException failed) {
      LOG.warn("{}: {}", channel.name(), failed.getMessage());
    }
  }

  /** Tries the oldest message; false when it must be tried again. */
  private boolean deliverOne() throws IOException {
    Optional<Outbox.Waiting> oldest = outbox.oldest();
    if (oldest.isEmpty()) {
      return true;
    }
    try {
      channel.send(oldest.get().message());
    } catch (IOException | RuntimeException failed) {
      failures++;
      LOG.warn("{} attempt {}: {}", channel.name(), failures, failed.getMessage());
      if (failures == WORTH_SAYING) {
        trouble.accept(Optional.of(failed.getMessage()));
      }
      return false;
    }
    outbox.remove(oldest.get());
    if (failures >= WORTH_SAYING) {
      trouble.accept(Optional.empty());
    }
    failures = 0;
    return true;
  }

  void close(Duration wait) {
    lock.lock();
    try {
      closing = true;
      woken.signal();
    } finally {
      lock.unlock();
    }
    try {
      thread.join(wait.toMillis());
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}

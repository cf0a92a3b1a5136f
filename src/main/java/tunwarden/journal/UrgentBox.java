package tunwarden.journal;

import java.time.Duration;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.concurrent.locks.Condition;
import java.util.concurrent.locks.ReentrantLock;

/**
 * Journal entries and states on their way to the recorder's thread. What is handed in together is
 * taken out together, so that a state never stands without the entries that led to it.
 */
final class UrgentBox {
  private final ReentrantLock lock = new ReentrantLock();
  private final Condition woken = lock.newCondition();
  private final Condition settled = lock.newCondition();

  /** All guarded by the lock. */
  private final Deque<JournalEntry> entries = new ArrayDeque<>();

  private Recorder.StateMaker state;
  private long handedIn;
  private long dealtWith;
  private boolean hurried;
  private boolean stopping;

  /**
   * What was handed in since the last look.
   *
   * @param state that which follows from the entries; null when there is no new one
   * @param upTo how often something had been handed in
   * @param last whether this is the end
   */
  record Batch(List<JournalEntry> entries, Recorder.StateMaker state, long upTo, boolean last) {}

  /** Any thread; a state may be null, and one without entries is in no hurry. */
  void put(List<JournalEntry> more, Recorder.StateMaker newest) {
    lock.lock();
    try {
      entries.addAll(more);
      state = newest == null ? state : newest;
      handedIn++;
      if (!more.isEmpty()) {
        woken.signal();
      }
    } finally {
      lock.unlock();
    }
  }

  /** Any thread. */
  void stop() {
    lock.lock();
    try {
      stopping = true;
      woken.signal();
    } finally {
      lock.unlock();
    }
  }

  /** The recorder's thread: waits for entries, that moment or the end. */
  Batch take(long untilNanos) {
    lock.lock();
    try {
      long left = untilNanos - System.nanoTime();
      while (entries.isEmpty() && !hurried && !stopping && left > 0) {
        left = woken.awaitNanos(left);
      }
      return batch(stopping);
    } catch (InterruptedException e) {
      return batch(true);
    } finally {
      lock.unlock();
    }
  }

  private Batch batch(boolean last) {
    Batch batch = new Batch(List.copyOf(entries), state, handedIn, last);
    entries.clear();
    state = null;
    hurried = false;
    return batch;
  }

  /** The recorder's thread: that batch is on the disk, or refused. */
  void dealtWith(Batch batch) {
    lock.lock();
    try {
      dealtWith = batch.upTo();
      settled.signalAll();
    } finally {
      lock.unlock();
    }
  }

  /** Any thread: waits until all that was handed in before has been dealt with. */
  boolean settle(Duration patience) throws InterruptedException {
    lock.lock();
    try {
      long mine = handedIn;
      long left = patience.toNanos();
      hurried = true;
      woken.signal();
      while (dealtWith < mine && left > 0) {
        left = settled.awaitNanos(left);
      }
      return dealtWith >= mine;
    } finally {
      lock.unlock();
    }
  }
}

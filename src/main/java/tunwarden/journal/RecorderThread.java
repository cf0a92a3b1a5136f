package tunwarden.journal;

import java.io.IOException;
import java.time.InstantSource;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.locks.Condition;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Supplier;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.journal.disk.Disk;

/** The one thread that writes. Everything private here is used by it alone, unless said. */
final class RecorderThread {
  private static final Logger LOG = LoggerFactory.getLogger(RecorderThread.class);

  private final DataFolder folder;
  private final Disk disk;
  private final RecorderSettings settings;
  private final InstantSource clock;
  private final BlockingQueue<Recorder.Recordable> queue;
  private final JournalFile journal;
  private final RecordFiles files;
  private final Housekeeping housekeeping;
  private final List<Recorder.Listener> listeners = new CopyOnWriteArrayList<>();
  private final StateFiles states;

  private final ReentrantLock lock = new ReentrantLock();
  private final Condition woken = lock.newCondition();

  /** Guarded by {@link #lock}. */
  private final Deque<JournalEntry> urgent = new ArrayDeque<>();

  /** That which follows from {@link #urgent}; guarded by {@link #lock}. */
  private Recorder.StateMaker newestState;

  /** Guarded by {@link #lock}. */
  private boolean stopping;

  private volatile Recorder.DiskWatch diskWatch = (failing, text) -> {};
  private volatile boolean failing;
  private String failure = "";
  private long retryAtNanos;

  RecorderThread(
      DataFolder folder,
      Disk disk,
      RecorderSettings settings,
      InstantSource clock,
      BlockingQueue<Recorder.Recordable> queue)
      throws IOException {
    this.folder = folder;
    this.disk = disk;
    this.settings = settings;
    this.clock = clock;
    this.queue = queue;
    this.journal = new JournalFile(disk, folder);
    this.states = new StateFiles(disk, folder);
    this.files = new RecordFiles(disk, folder);
    this.housekeeping = new Housekeeping(disk, folder, settings.keep(), files, clock);
  }

  DataFolder folder() {
    return folder;
  }

  void listen(Recorder.Listener listener) {
    listeners.add(listener);
  }

  void watchDisk(Recorder.DiskWatch watch) {
    diskWatch = watch;
  }

  /**
   * Entries that an earlier run kept with the state but may not have written.
   *
   * @return how many the journal lacks; they are first in line now
   */
  int writeAgain(List<JournalLines.Numbered> kept) {
    List<JournalEntry> lacking = new ArrayList<>();
    for (JournalLines.Numbered entry : kept) {
      if (entry.number() == journal.next() + lacking.size()) {
        lacking.add(entry.entry());
      }
    }
    urgent(lacking, null);
    return lacking.size();
  }

  /** Any thread; what is handed in together is taken out together. */
  void urgent(List<JournalEntry> entries, Recorder.StateMaker state) {
    lock.lock();
    try {
      urgent.addAll(entries);
      newestState = state == null ? newestState : state;
      if (!entries.isEmpty()) {
        woken.signal();
      }
    } finally {
      lock.unlock();
    }
  }

  /** Any thread. */
  void keepEstimates(Supplier<byte[]> newest) {
    states.keepEstimates(newest);
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

  /** Any thread. */
  boolean isFailing() {
    return failing;
  }

  void run() {
    housekeeping.start();
    long nextFlush = System.nanoTime();
    boolean last = false;
    while (!last) {
      Batch batch = waitFor(nextFlush);
      last = batch.last();
      try {
        commit(batch);
        if (last || System.nanoTime() - nextFlush >= 0) {
          nextFlush = System.nanoTime() + settings.flush().toNanos();
          flush(last);
        }
      } catch (RuntimeException e) {
        LOG.error("recording goes on after a failure", e);
      }
    }
    housekeeping.close();
    // The last flush may have had something to say itself.
    commit(waitFor(System.nanoTime()));
    try {
      files.close();
      journal.close();
    } catch (IOException e) {
      LOG.warn("closing the data folder: {}", e.toString());
    }
  }

  /** What was handed in since the last look, and whether this is the end. */
  private record Batch(List<JournalEntry> entries, Recorder.StateMaker state, boolean last) {}

  /** Waits for entries, the next flush or the end. */
  private Batch waitFor(long nextFlush) {
    lock.lock();
    try {
      long left = nextFlush - System.nanoTime();
      while (urgent.isEmpty() && !stopping && left > 0) {
        left = woken.awaitNanos(left);
      }
      return take(stopping);
    } catch (InterruptedException e) {
      return take(true);
    } finally {
      lock.unlock();
    }
  }

  /** With the lock held. */
  private Batch take(boolean last) {
    Batch batch = new Batch(List.copyOf(urgent), newestState, last);
    urgent.clear();
    newestState = null;
    return batch;
  }

  /**
   * The state goes to disk first, with the entries that led to it; then the entries to the journal;
   * then they are told of. A refused entry is told of all the same.
   */
  private void commit(Batch batch) {
    List<JournalLines.Numbered> numbered = batch.entries().stream().map(journal::add).toList();
    saveState(batch.state());
    if (numbered.isEmpty()) {
      return;
    }
    boolean durable = flushJournal();
    for (Recorder.Listener listener : listeners) {
      try {
        listener.recorded(numbered, durable);
      } catch (RuntimeException e) {
        LOG.error("a listener of the journal failed", e);
      }
    }
  }

  private void saveState(Recorder.StateMaker state) {
    try {
      states.save(state, journal.waiting());
    } catch (IOException e) {
      failed(e);
    }
  }

  private boolean flushJournal() {
    try {
      journal.flush(clock.instant());
      return true;
    } catch (IOException e) {
      failed(e);
      return false;
    }
  }

  private void flush(boolean last) {
    if (failing && !last && System.nanoTime() - retryAtNanos < 0) {
      return;
    }
    try {
      housekeeping.ensureRoom().ifPresent(this::deleted);
      for (Recorder.Recordable next = queue.poll(); next != null; next = queue.poll()) {
        files.add(next);
      }
      files.flush(today());
      states.saveAgain(journal.waiting());
      journal.flush(clock.instant());
      states.saveEstimates();
      worksAgain();
    } catch (IOException e) {
      failed(e);
    }
  }

  private void deleted(String text) {
    urgent(List.of(JournalEntry.station(clock.instant(), "retention", text)), null);
  }

  private void failed(IOException e) {
    retryAtNanos = System.nanoTime() + settings.retry().toNanos();
    String text = "Recording has stopped: " + reason(e) + ". Watching goes on.";
    if (!text.equals(failure)) {
      LOG.warn("{}", text, e);
      failure = text;
      failing = true;
      diskWatch.disk(true, text);
    }
  }

  private static String reason(IOException e) {
    String message = e.getMessage();
    return message == null ? e.getClass().getSimpleName() : message;
  }

  private void worksAgain() {
    if (failing) {
      failing = false;
      failure = "";
      urgent(
          List.of(JournalEntry.station(clock.instant(), "recording", "Recording has resumed.")),
          null);
      diskWatch.disk(false, "Recording has resumed.");
    }
  }

  private LocalDate today() {
    return LocalDate.ofInstant(clock.instant(), ZoneOffset.UTC);
  }
}

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
import java.util.concurrent.atomic.AtomicReference;
import java.util.concurrent.locks.Condition;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Supplier;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.journal.disk.AtomicFile;
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
  private final AtomicReference<Supplier<byte[]>> state = new AtomicReference<>();

  private final ReentrantLock lock = new ReentrantLock();
  private final Condition woken = lock.newCondition();

  /** Guarded by {@link #lock}. */
  private final Deque<JournalEntry> urgent = new ArrayDeque<>();

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

  /** Any thread. */
  void urgent(JournalEntry entry) {
    lock.lock();
    try {
      urgent.add(entry);
      woken.signal();
    } finally {
      lock.unlock();
    }
  }

  /** Any thread. */
  void keepState(Supplier<byte[]> newest) {
    state.set(newest);
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
      List<JournalEntry> entries = new ArrayList<>();
      last = waitFor(nextFlush, entries);
      try {
        commit(entries);
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
    List<JournalEntry> entries = new ArrayList<>();
    waitFor(System.nanoTime(), entries);
    commit(entries);
    try {
      files.close();
      journal.close();
    } catch (IOException e) {
      LOG.warn("closing the data folder: {}", e.toString());
    }
  }

  /** Waits for entries, the next flush or the end. Returns whether this is the end. */
  private boolean waitFor(long nextFlush, List<JournalEntry> entries) {
    lock.lock();
    try {
      long left = nextFlush - System.nanoTime();
      while (urgent.isEmpty() && !stopping && left > 0) {
        left = woken.awaitNanos(left);
      }
      entries.addAll(urgent);
      urgent.clear();
      return stopping;
    } catch (InterruptedException e) {
      return true;
    } finally {
      lock.unlock();
    }
  }

  /** Forces entries to disk, then tells of them; a refused entry is told of all the same. */
  private void commit(List<JournalEntry> entries) {
    if (entries.isEmpty()) {
      return;
    }
    List<JournalLines.Numbered> numbered = new ArrayList<>();
    for (JournalEntry entry : entries) {
      numbered.add(journal.add(entry));
    }
    boolean durable = flushJournal();
    if (durable) {
      saveState();
    }
    for (Recorder.Listener listener : listeners) {
      try {
        listener.recorded(numbered, durable);
      } catch (RuntimeException e) {
        LOG.error("a listener of the journal failed", e);
      }
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
      journal.flush(clock.instant());
      saveState();
      worksAgain();
    } catch (IOException e) {
      failed(e);
    }
  }

  private void saveState() {
    Supplier<byte[]> newest = state.getAndSet(null);
    if (newest == null) {
      return;
    }
    try {
      AtomicFile.write(disk, folder.state(), newest.get());
    } catch (IOException e) {
      state.compareAndSet(null, newest);
      failed(e);
    }
  }

  private void deleted(String text) {
    urgent(JournalEntry.station(clock.instant(), "retention", text));
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
      urgent(JournalEntry.station(clock.instant(), "recording", "Recording has resumed."));
      diskWatch.disk(false, "Recording has resumed.");
    }
  }

  private LocalDate today() {
    return LocalDate.ofInstant(clock.instant(), ZoneOffset.UTC);
  }
}

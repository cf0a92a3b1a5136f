package tunwarden.journal;

import java.io.IOException;
import java.time.Duration;
import java.time.InstantSource;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.CopyOnWriteArrayList;
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

  private final UrgentBox urgent = new UrgentBox();

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

  /** Any thread; what is handed in together goes to disk together. */
  void urgent(List<JournalEntry> entries, Recorder.StateMaker state) {
    urgent.put(entries, state);
  }

  /** Any thread; waits until all that was handed in before is on the disk. */
  boolean settle(Duration patience) throws InterruptedException {
    return urgent.settle(patience) && !failing;
  }

  /** Any thread. */
  void keepEstimates(Supplier<byte[]> newest) {
    states.keepEstimates(newest);
  }

  /** Any thread. */
  void stop() {
    urgent.stop();
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
      UrgentBox.Batch batch = urgent.take(nextFlush);
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
    commit(urgent.take(System.nanoTime()));
    try {
      files.close();
      journal.close();
    } catch (IOException e) {
      LOG.warn("closing the data folder: {}", e.toString());
    }
  }

  /**
   * The state goes to disk first, with the entries that led to it; then the entries to the journal;
   * then they are told of. A refused entry is told of all the same.
   */
  private void commit(UrgentBox.Batch batch) {
    List<JournalLines.Numbered> numbered = batch.entries().stream().map(journal::add).toList();
    saveState(batch.state());
    boolean durable = numbered.isEmpty() || flushJournal();
    urgent.dealtWith(batch);
    if (numbered.isEmpty()) {
      return;
    }
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

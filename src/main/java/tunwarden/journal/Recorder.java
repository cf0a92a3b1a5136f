package tunwarden.journal;

import java.io.Closeable;
import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.time.InstantSource;
import java.util.List;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Supplier;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Event;
import tunwarden.estimate.Step;
import tunwarden.journal.disk.Disk;
import tunwarden.reading.Mark;
import tunwarden.reading.Sample;
import tunwarden.station.Sink;

/**
 * Records what the station sees. Any thread may hand in; one thread of its own writes. Loss rule:
 * readings and estimates wait in a bounded queue and are dropped and counted when it is full;
 * journal entries, alarm transitions among them, are never dropped for lack of time, and listeners
 * hear of an entry only after it was forced to disk (or after the disk refused it).
 *
 * <p>The recorder owns the data folder's lock and gives it back when closed.
 */
public final class Recorder implements Sink, Closeable {
  private static final Logger LOG = LoggerFactory.getLogger(Recorder.class);
  private static final long JOIN_MS = 1500;

  private final BlockingQueue<Recordable> queue;
  private final RecorderThread worker;
  private final Thread thread;
  private final QualityWatch qualities = new QualityWatch();
  private final EstimatePace pace;
  private final AtomicLong accepted = new AtomicLong();
  private final AtomicLong dropped = new AtomicLong();
  private final List<String> repairs;

  /** What waits in the queue. */
  sealed interface Recordable {
    /** A sample for the log. */
    record OfSample(Sample sample) implements Recordable {}

    /** A snapshot whose estimate is recorded. */
    record OfEstimate(Assessment assessment) implements Recordable {}
  }

  /** Hears of entries once they are safe. Called on the recorder's thread. */
  @FunctionalInterface
  public interface Listener {
    /**
     * Entries that were recorded.
     *
     * @param entries with their numbers, in order
     * @param durable whether they are on the disk; if not they will be written when it can be done
     */
    void recorded(List<JournalLines.Numbered> entries, boolean durable);
  }

  /** Turns a state into bytes, on the recorder's thread. */
  @FunctionalInterface
  public interface StateMaker {
    /**
     * The content of the state file.
     *
     * @param unwritten journal entries up to this state that are not known to be on the disk
     */
    byte[] bytes(List<JournalLines.Numbered> unwritten);
  }

  /** Hears when recording stops and resumes. Called on the recorder's thread. */
  @FunctionalInterface
  public interface DiskWatch {
    void disk(boolean failing, String text);
  }

  /**
   * Opens a data folder: takes its lock, repairs it, and gets ready to write.
   *
   * @throws tunwarden.units.BadInputException when another program uses the folder
   */
  public static Recorder open(Path root, Disk disk, RecorderSettings settings, InstantSource clock)
      throws IOException {
    DataFolder folder = DataFolder.open(root, disk);
    try {
      return new Recorder(folder, disk, settings, clock);
    } catch (IOException | RuntimeException failed) {
      folder.close();
      throw failed;
    }
  }

  private Recorder(DataFolder folder, Disk disk, RecorderSettings settings, InstantSource clock)
      throws IOException {
    this.repairs = Repairs.of(disk, folder);
    this.queue = new ArrayBlockingQueue<>(settings.queue());
    this.pace = new EstimatePace(settings.estimateEvery());
    this.worker = new RecorderThread(folder, disk, settings, clock, queue);
    this.thread = new Thread(worker::run, "journal");
    int again = worker.writeAgain(SavedState.unwritten(disk, folder.state()));
    if (again > 0) {
      repairs.add(again + " journal line(s) were kept with the state and are written now.");
    }
    for (String repair : repairs) {
      LOG.warn("{}", repair);
      write(JournalEntry.station(clock.instant(), "repair", repair));
    }
  }

  /** Starts the thread. Listeners must be in place by now. */
  public void start() {
    thread.start();
  }

  /** What was repaired when the folder was opened, one sentence each. */
  public List<String> repairs() {
    return repairs;
  }

  public DataFolder folder() {
    return worker.folder();
  }

  public void listen(Listener listener) {
    worker.listen(listener);
  }

  public void watchDisk(DiskWatch watch) {
    worker.watchDisk(watch);
  }

  /** Puts an entry in the journal as soon as it can be done. Never blocks, never drops. */
  public void write(JournalEntry entry) {
    worker.urgent(List.of(entry), null);
  }

  /**
   * Puts entries in the journal together with the state that they lead to: after a crash both are
   * there or neither is. Never blocks, never drops.
   */
  public void write(List<JournalEntry> entries, StateMaker state) {
    worker.urgent(entries, state);
  }

  /**
   * Gives the newest state to be saved with the next flush; an older one not yet saved is
   * forgotten. All that led to it must have been handed in before.
   */
  public void keepState(StateMaker state) {
    worker.urgent(List.of(), state);
  }

  /**
   * Waits until all entries and states handed in before are on the disk.
   *
   * @return false when they are not, because the disk refuses or the time is up
   */
  public boolean settle(Duration patience) throws InterruptedException {
    return worker.settle(patience);
  }

  /**
   * Gives what the estimator remembers, to be saved with the next flush; made into bytes on the
   * recorder's thread.
   */
  public void keepEstimates(Supplier<byte[]> estimates) {
    worker.keepEstimates(estimates);
  }

  @Override
  public void sampled(Sample sample, Step step) {
    offer(new Recordable.OfSample(sample));
    if (sample instanceof Mark mark) {
      write(Entries.of(mark));
    }
    qualities.change(sample, step).ifPresent(this::write);
  }

  @Override
  public void assessed(Assessment assessment) {
    for (Event event : assessment.events()) {
      write(Entries.of(event));
    }
    if (pace.isDue(assessment)) {
      offer(new Recordable.OfEstimate(assessment));
    }
  }

  private void offer(Recordable recordable) {
    if (queue.offer(recordable)) {
      accepted.incrementAndGet();
    } else {
      dropped.incrementAndGet();
    }
  }

  /** Readings and estimates taken in so far. */
  public long accepted() {
    return accepted.get();
  }

  /** Readings and estimates lost to a full queue. */
  public long dropped() {
    return dropped.get();
  }

  /** Readings and estimates waiting to be written. */
  public int waiting() {
    return queue.size();
  }

  /** Whether recording has stopped because the disk refuses. */
  public boolean isFailing() {
    return worker.isFailing();
  }

  /** Writes everything, saves the state, closes the files and gives back the lock. */
  @Override
  public void close() throws IOException {
    worker.stop();
    try {
      thread.join(JOIN_MS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
    worker.folder().close();
  }
}

package tunwarden.journal;

import java.io.IOException;
import java.util.List;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.Supplier;
import tunwarden.journal.disk.AtomicFile;
import tunwarden.journal.disk.Disk;

/** Writes what survives a restart. Used by the recorder's thread, unless said. */
final class StateFiles {
  private final Disk disk;
  private final DataFolder folder;
  private final AtomicReference<Supplier<byte[]>> estimates = new AtomicReference<>();
  private Recorder.StateMaker refused;

  StateFiles(Disk disk, DataFolder folder) {
    this.disk = disk;
    this.folder = folder;
  }

  /** Any thread. */
  void keepEstimates(Supplier<byte[]> newest) {
    estimates.set(newest);
  }

  /** Saves a state, if there is a new one; one that the disk refuses is kept for another time. */
  void save(Recorder.StateMaker state, List<JournalLines.Numbered> unwritten) throws IOException {
    if (state != null) {
      refused = state;
      AtomicFile.write(disk, folder.state(), state.bytes(unwritten));
      refused = null;
    }
  }

  /** Saves what the disk refused before. */
  void saveAgain(List<JournalLines.Numbered> unwritten) throws IOException {
    save(refused, unwritten);
  }

  void saveEstimates() throws IOException {
    Supplier<byte[]> newest = estimates.getAndSet(null);
    if (newest == null) {
      return;
    }
    try {
      AtomicFile.write(disk, folder.estimatorState(), newest.get());
    } catch (IOException e) {
      estimates.compareAndSet(null, newest);
      throw e;
    }
  }
}

package tunwarden.journal;

import java.io.IOException;
import java.nio.file.Path;
import java.time.InstantSource;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.journal.disk.Disk;

/** Runs the janitor beside the recorder: now and then, and at once when the disk is full. */
final class Housekeeping {
  private static final Logger LOG = LoggerFactory.getLogger(Housekeeping.class);
  private static final long EVERY_MINUTES = 10;

  private final Janitor janitor;
  private final RecorderSettings.Keep keep;
  private final InstantSource clock;
  private final ScheduledExecutorService timer =
      Executors.newSingleThreadScheduledExecutor(
          task -> {
            Thread thread = new Thread(task, "janitor");
            thread.setDaemon(true);
            thread.setPriority(Thread.MIN_PRIORITY);
            return thread;
          });

  Housekeeping(
      Disk disk,
      DataFolder folder,
      RecorderSettings.Keep keep,
      RecordFiles files,
      InstantSource clock) {
    this.janitor = new Janitor(disk, folder, keep, files.closedDays(), files::isOpen);
    this.keep = keep;
    this.clock = clock;
  }

  void start() {
    timer.scheduleWithFixedDelay(this::tidy, 0, EVERY_MINUTES, TimeUnit.MINUTES);
  }

  private void tidy() {
    try {
      LocalDate today = LocalDate.ofInstant(clock.instant(), ZoneOffset.UTC);
      janitor.compress(today);
      for (Path file : janitor.retain(today)) {
        LOG.info("{} is older or more than is kept and was deleted", file.getFileName());
      }
    } catch (IOException | RuntimeException e) {
      LOG.warn("tidying the data folder failed and is tried again later: {}", e.toString());
    }
  }

  /**
   * Makes sure that the disk has room to spare.
   *
   * @return what was deleted for it, in words
   * @throws IOException when there is not enough
   */
  Optional<String> ensureRoom() throws IOException {
    if (janitor.hasRoom()) {
      return Optional.empty();
    }
    List<Path> deleted = keep.mayDeleteForRoom() ? janitor.makeRoom() : List.of();
    if (!janitor.hasRoom()) {
      throw new IOException("the disk has less than " + (keep.leastFreeBytes() >> 20) + " MB free");
    }
    return Optional.of(
        "The disk was nearly full: " + deleted.size() + " of the oldest closed days were deleted.");
  }

  void close() {
    timer.shutdown();
  }
}

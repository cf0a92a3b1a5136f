package tunwarden.app.board;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.function.Consumer;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.estimate.Estimators;
import tunwarden.replay.BadLogException;
import tunwarden.replay.LogFile;
import tunwarden.report.Reporter;
import tunwarden.report.story.Chapter;
import tunwarden.screen.model.Progress;
import tunwarden.vessel.Vessel;

/**
 * Writes the report of a vessel while its log is on the screen, on a thread of its own, as a page
 * in the working folder; one at a time.
 */
final class ReplayReport {
  private static final Logger LOG = LoggerFactory.getLogger(ReplayReport.class);

  private final LogFile log;
  private final List<Vessel> vessels;
  private final String command;
  private final AtomicBoolean busy = new AtomicBoolean();
  private final long size;
  private volatile long begunNanos;
  private volatile long bytesRead;
  private volatile boolean stopped;

  ReplayReport(LogFile log, List<Vessel> vessels, String command) throws IOException {
    this.log = log.reportingTo(bytes -> bytesRead = bytes);
    this.size = Math.max(1, log.size());
    this.vessels = vessels;
    this.command = command;
  }

  /**
   * Begins the report of that vessel; returns one sentence for the person.
   *
   * @param told hears, on another thread, how it ended
   */
  String write(String id, Consumer<String> told) {
    Optional<Vessel> vessel = vessels.stream().filter(v -> v.id().equals(id)).findFirst();
    if (vessel.isEmpty()) {
      return "choose a vessel first";
    }
    if (!busy.compareAndSet(false, true)) {
      return "still writing; ask again in a moment";
    }
    Path page = Path.of("report-" + safe(log.path().getFileName() + "-" + id) + ".html");
    begunNanos = System.nanoTime();
    stopped = false;
    Thread thread = new Thread(() -> told.accept(written(vessel.get(), page)), "report");
    thread.setDaemon(true);
    thread.start();
    return "writing " + page + "; the journal will say when it is done";
  }

  /** How far the report has come; empty when none is being written or it has only just begun. */
  Optional<Progress> progress() {
    return busy.get()
        ? Progress.after(
            Duration.ofNanos(System.nanoTime() - begunNanos),
            "writing the report",
            (double) bytesRead / size)
        : Optional.empty();
  }

  /** Stops writing; says whether there was anything to stop. */
  boolean stop() {
    stopped = true;
    return busy.get();
  }

  private static final class Stopped extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }

  private void goOn() {
    if (stopped) {
      throw new Stopped();
    }
  }

  private static String safe(String name) {
    return name.replaceAll("[^A-Za-z0-9._-]", "_");
  }

  private String written(Vessel vessel, Path page) {
    try {
      Reporter.Settings settings =
          new Reporter.Settings(
              false, Duration.ZERO, Optional.empty(), Optional.empty(), command, "tunwarden", true);
      Reporter.Source source = new Reporter.Source(vessel.id(), vessel, List.of(log));
      Chapter chapter =
          new Reporter(Estimators.wordless(), settings)
              .read(source, Optional.empty(), rows -> goOn());
      Files.writeString(page, Reporter.html(List.of(chapter)));
      return "Written to " + page.toAbsolutePath() + ".";
    } catch (Stopped onRequest) {
      return "Stopped; nothing was written.";
    } catch (IOException | BadLogException e) {
      LOG.warn("the report could not be written", e);
      return "Failed: " + e.getMessage();
    } finally {
      busy.set(false);
    }
  }
}

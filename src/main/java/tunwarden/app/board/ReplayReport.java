package tunwarden.app.board;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicBoolean;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.estimate.Estimators;
import tunwarden.replay.BadLogException;
import tunwarden.replay.LogFile;
import tunwarden.report.Reporter;
import tunwarden.report.story.Chapter;
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
  private volatile String said = "";

  ReplayReport(LogFile log, List<Vessel> vessels, String command) {
    this.log = log;
    this.vessels = vessels;
    this.command = command;
  }

  /** Begins the report of that vessel; returns one sentence for the person. */
  String write(String id) {
    Optional<Vessel> vessel = vessels.stream().filter(v -> v.id().equals(id)).findFirst();
    if (vessel.isEmpty()) {
      return "choose a vessel first";
    }
    if (!busy.compareAndSet(false, true)) {
      return "still writing; ask again in a moment";
    }
    String before = said;
    Path page = Path.of("report-" + safe(log.path().getFileName() + "-" + id) + ".html");
    Thread thread = new Thread(() -> write(vessel.get(), page), "report");
    thread.setDaemon(true);
    thread.start();
    return before + "writing " + page;
  }

  private static String safe(String name) {
    return name.replaceAll("[^A-Za-z0-9._-]", "_");
  }

  private void write(Vessel vessel, Path page) {
    try {
      Reporter.Settings settings =
          new Reporter.Settings(
              false, Duration.ZERO, Optional.empty(), Optional.empty(), command, "tunwarden", true);
      Reporter.Source source = new Reporter.Source(vessel.id(), vessel, List.of(log));
      Chapter chapter =
          new Reporter(Estimators.wordless(), settings).read(source, Optional.empty(), rows -> {});
      Files.writeString(page, Reporter.html(List.of(chapter)));
      said = "";
    } catch (IOException | BadLogException e) {
      LOG.warn("the report could not be written", e);
      said = "the last report failed: " + e.getMessage() + "; ";
    } finally {
      busy.set(false);
    }
  }
}

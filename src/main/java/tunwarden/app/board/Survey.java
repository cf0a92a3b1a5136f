package tunwarden.app.board;

import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.Event;
import tunwarden.forecast.Outlook;
import tunwarden.reading.Sample;
import tunwarden.replay.BadLogException;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;
import tunwarden.screen.model.Progress;
import tunwarden.screen.model.ReplayStatus.TimeMark;
import tunwarden.station.Sink;
import tunwarden.station.Station;
import tunwarden.station.StationSettings;
import tunwarden.vessel.Vessel;

/**
 * Reads a log once from end to end behind the dashboard, to learn where it ends and when something
 * happened, so that a person can go from event to event. Runs on a thread of its own; can be
 * stopped.
 */
final class Survey implements AutoCloseable {
  private static final Logger LOG = LoggerFactory.getLogger(Survey.class);

  private static final long PUBLISH_EVERY_NANOS = 250_000_000L;

  private final LogFile log;
  private final Station station;
  private final long size;
  private final List<TimeMark> marks = new ArrayList<>();
  private final Thread thread = new Thread(this::read, "survey");
  private volatile long startedNanos = System.nanoTime();
  private boolean unpublished;
  private long publishedNanos;
  private volatile long bytesRead;
  private volatile boolean stopped;
  private volatile boolean ended;
  private volatile List<TimeMark> shown = List.of();
  private volatile Instant last;

  Survey(LogFile log, List<Vessel> vessels, Instant first) throws IOException {
    this.log = log.reportingTo(bytes -> bytesRead = bytes);
    this.size = Math.max(1, log.size());
    this.last = first;
    this.station =
        new Station(
            vessels,
            Estimators.standard(),
            (vessel, state, rise) -> Outlook.NONE,
            StationSettings.USUAL,
            List.of(new Marker()));
    thread.setDaemon(true);
  }

  void start() {
    startedNanos = System.nanoTime();
    thread.start();
  }

  /** The last time seen so far. */
  Instant last() {
    return last;
  }

  /** Events found so far, in order of time. */
  List<TimeMark> marks() {
    return shown;
  }

  /** How far it has come; empty when it is done or has only just begun. */
  Optional<Progress> progress() {
    if (ended || stopped) {
      return Optional.empty();
    }
    Duration spent = Duration.ofNanos(System.nanoTime() - startedNanos);
    double share = (double) bytesRead / size;
    return Progress.after(spent, "looking for events in " + log.path().getFileName(), share);
  }

  /** Stops reading; what was found so far stays. */
  @Override
  public void close() {
    stopped = true;
  }

  private void read() {
    try (RowSource rows = log.open()) {
      for (LogRow row = rows.next(); row != null && !stopped; row = rows.next()) {
        for (Sample sample : row.samples()) {
          station.accept(sample);
        }
        last = row.time();
        if (unpublished && System.nanoTime() - publishedNanos > PUBLISH_EVERY_NANOS) {
          publish();
        }
      }
    } catch (IOException | BadLogException e) {
      LOG.warn("the survey of {} ended early", log.path(), e);
    }
    publish();
    ended = true;
  }

  /** Events are found when they end, so that one may belong before others already known. */
  private void insert(TimeMark mark) {
    int at = marks.size();
    while (at > 0 && marks.get(at - 1).time().isAfter(mark.time())) {
      at--;
    }
    marks.add(at, mark);
    unpublished = true;
  }

  private void publish() {
    shown = List.copyOf(marks);
    unpublished = false;
    publishedNanos = System.nanoTime();
  }

  private final class Marker implements Sink {
    @Override
    public void assessed(Assessment assessment) {
      for (Event event : assessment.events()) {
        if (event.open()) {
          continue;
        }
        insert(new TimeMark(event.time(), event.vessel(), event.kind().word()));
      }
    }
  }
}

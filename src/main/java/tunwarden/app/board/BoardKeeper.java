package tunwarden.app.board;

import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import tunwarden.alarm.AlarmBook;
import tunwarden.assess.Assessment;
import tunwarden.assess.Assessor;
import tunwarden.assess.History;
import tunwarden.assess.Observed;
import tunwarden.estimate.Event;
import tunwarden.estimate.Step;
import tunwarden.forecast.Outlook;
import tunwarden.reading.Sample;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.JournalEntry;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Progress;
import tunwarden.screen.model.ReplayStatus;
import tunwarden.screen.model.VesselBoard;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Sink;
import tunwarden.vessel.Vessel;

/**
 * Keeps what the dashboard shows. Written on the station's thread, read from the drawing thread,
 * which asks for the latest board and never waits for the station.
 */
public final class BoardKeeper implements Sink {
  /**
   * What the board says beside the readings.
   *
   * @param origin where they come from
   * @param zone for times of day
   * @param staleAfter age of staleness
   * @param now data time
   * @param replay where a replay stands
   * @param progress long work under way
   */
  public record Frame(
      Origin origin,
      ZoneId zone,
      Duration staleAfter,
      Supplier<Instant> now,
      Supplier<Optional<ReplayStatus>> replay,
      Supplier<Optional<Progress>> progress) {}

  private final Frame frame;
  private final List<Vessel> vessels;
  private final AlarmKeeper alarms;
  private final SignalTally signals;
  private final JournalPages journal;
  private final Map<String, Assessment> latest = new ConcurrentHashMap<>();
  private final GoingOn goingOn = new GoingOn();
  private final Map<String, History> histories = new ConcurrentHashMap<>();

  /** A board on which nothing has been seen yet. */
  BoardKeeper(
      List<Vessel> vessels,
      Frame frame,
      AlarmKeeper alarms,
      JournalPages journal,
      SignalTally signals) {
    this.vessels = List.copyOf(vessels);
    this.frame = frame;
    this.alarms = alarms;
    this.journal = journal;
    this.signals = signals;
    for (Vessel vessel : vessels) {
      histories.put(vessel.id(), new History());
      latest.put(vessel.id(), unread(vessel));
    }
  }

  /** So that every vessel is on the list from the first frame on. */
  private static Assessment unread(Vessel vessel) {
    return Assessor.assess(
        new Assessor.Evidence(
            vessel,
            Instant.EPOCH,
            Observed.NEVER,
            Observed.NEVER,
            Optional.empty(),
            Outlook.NONE,
            List.of()));
  }

  @Override
  public void sampled(Sample sample, Step step) {
    signals.sampled(sample, step);
  }

  @Override
  public void assessed(Assessment assessment) {
    String id = assessment.vessel().id();
    histories.get(id).add(assessment);
    latest.put(id, assessment);
    goingOn.assessed(assessment);
    journal.assessed(assessment);
  }

  /** Adds a line to the journal page. */
  public void write(JournalEntry entry) {
    journal.add(entry);
  }

  /** What is going on, to be given back with {@link #backTo}. */
  Map<String, List<Event>> goingOn() {
    return goingOn.kept();
  }

  /** Forgets what came after a time, as when a replay goes back. */
  void backTo(Instant time, Map<String, List<Event>> goingOnThen) {
    goingOn.restore(goingOnThen);
    histories.values().forEach(history -> history.forgetAfter(time));
    journal.forgetAfter(time);
  }

  /** The newest board; cheap and safe from any thread. */
  public Board latest() {
    AlarmBook book = alarms.book();
    List<VesselBoard> boards = new ArrayList<>();
    for (Vessel vessel : vessels) {
      Assessment assessment = latest.get(vessel.id());
      if (assessment != null) {
        boards.add(
            new VesselBoard(
                assessment,
                book.alarms(vessel.id()),
                histories.get(vessel.id()),
                goingOn.of(vessel.id())));
      }
    }
    return new Board(
        frame.origin(),
        frame.now().get(),
        frame.zone(),
        frame.staleAfter(),
        boards,
        book.alarms(AlarmBook.STATION),
        signals.rows(),
        frame.replay().get(),
        journal.shown(),
        frame.progress().get());
  }
}

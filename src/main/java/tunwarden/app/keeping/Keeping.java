package tunwarden.app.keeping;

import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import java.time.InstantSource;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import tunwarden.alarm.AlarmBook;
import tunwarden.assess.Assessment;
import tunwarden.config.Cellar;
import tunwarden.estimate.State;
import tunwarden.estimate.StateCodec;
import tunwarden.journal.Entries;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.Recorder;
import tunwarden.journal.SavedEstimates;
import tunwarden.journal.SavedState;
import tunwarden.journal.disk.Disk;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Sink;
import tunwarden.station.Station;
import tunwarden.vessel.Vessel;

/**
 * Keeps alarms and estimates of a running station in the recorder's folder, and brings them back at
 * the next start. The alarm book goes to disk with every transition, the estimates now and then:
 * what they lack is taken in from the recorded readings. Used on the station's thread, or while
 * there is none.
 */
public final class Keeping implements Sink, AlarmKeeper.Listener {
  private static final Duration BOOK_EVERY = Duration.ofMinutes(1);
  private static final Duration ESTIMATES_EVERY = Duration.ofMinutes(5);

  private final Recorder recorder;
  private final Disk disk;
  private final InstantSource clock;
  private final Consumer<String> console;
  private Map<String, String> descriptions = Map.of();
  private Optional<SavedState> saved = Optional.empty();
  private Station station;
  private AlarmKeeper alarms;
  private Instant bookKept = Instant.MIN;
  private Instant estimatesKept = Instant.MIN;

  /**
   * Keeps nothing before {@link #resume}.
   *
   * @param recorder writes; need not be running yet
   * @param console told of what a person at the start should know, one sentence each
   */
  public Keeping(Recorder recorder, Disk disk, InstantSource clock, Consumer<String> console) {
    this.recorder = recorder;
    this.disk = disk;
    this.clock = clock;
    this.console = console;
  }

  /** The alarms of the last run, of those vessels that are still described. */
  public AlarmBook book(Cellar cellar) {
    try {
      saved = SavedState.read(disk, recorder.folder().state(), cellar.alarms());
    } catch (IOException unreadable) {
      say("start", "Alarms and shelves of the last run are lost: " + unreadable.getMessage() + ".");
    }
    return saved
        .map(SavedState::book)
        .orElseGet(() -> AlarmBook.empty(cellar.alarms()))
        .retain(ids(cellar));
  }

  /** Lets a station that has seen nothing go on where the last run ended, and says so. */
  public void resume(Cellar cellar, Station fresh, AlarmKeeper keeper) {
    Instant now = clock.instant();
    Resumption resumption =
        new Resumption(recorder.folder(), cellar.recording().resumeWithin(), now);
    resumption.run(cellar.vessels(), estimates(), saved.map(SavedState::descriptions));
    fresh.restore(resumption.checkpoint());
    watch(cellar, fresh, keeper);
    for (Vessel vessel : cellar.vessels()) {
      if (!resumption.resumed().contains(vessel.id())) {
        alarms.change(book -> book.eventsLost(vessel.id(), now));
      }
    }
    resumption.words().forEach(text -> say("start", text));
    keep();
  }

  private Optional<SavedEstimates> estimates() {
    try {
      return SavedEstimates.read(disk, recorder.folder().estimatorState());
    } catch (IOException unreadable) {
      say("start", "The saved estimates cannot be used: " + unreadable.getMessage() + ".");
      return Optional.empty();
    }
  }

  /**
   * Goes over to the station of a changed cellar file. What the estimator knew of a vessel goes
   * over as well, unless it is described otherwise in what the estimate rests on; that is said.
   */
  public void goOver(Cellar before, Station old, Cellar next, Station fresh) {
    Set<String> unchanged = new HashSet<>();
    Set<Vessel> same = new HashSet<>(before.vessels());
    Map<String, State> known = old.checkpoint().states();
    for (Vessel vessel : next.vessels()) {
      if (same.contains(vessel)) {
        unchanged.add(vessel.id());
      } else if (known.containsKey(vessel.id())) {
        goOver(vessel, known.get(vessel.id()), fresh);
      }
    }
    fresh.restore(old.checkpoint().only(unchanged));
    alarms.restore(alarms.book().withSettings(next.alarms()).retain(ids(next)));
    watch(next, fresh, alarms);
    keep();
  }

  private void goOver(Vessel vessel, State state, Station fresh) {
    try {
      fresh.resume(vessel.id(), StateCodec.decode(vessel, StateCodec.encode(state)));
    } catch (IllegalArgumentException otherwise) {
      alarms.change(book -> book.eventsLost(vessel.id(), clock.instant()));
      say("reload", vessel.id() + ": the estimate starts afresh; its description has changed.");
    }
  }

  private void watch(Cellar cellar, Station watched, AlarmKeeper keeper) {
    station = watched;
    alarms = keeper;
    Map<String, String> texts = new HashMap<>();
    cellar.vessels().forEach(vessel -> texts.put(vessel.id(), vessel.toString()));
    descriptions = Map.copyOf(texts);
  }

  @Override
  public void changed(AlarmBook.Folded folded) {
    List<JournalEntry> entries = folded.transitions().stream().map(Entries::of).toList();
    recorder.write(entries, state(folded.book()));
  }

  @Override
  public void assessed(Assessment assessment) {
    Instant now = clock.instant();
    if (isDue(bookKept, BOOK_EVERY, now)) {
      bookKept = now;
      recorder.keepState(state(alarms.book()));
    }
    if (isDue(estimatesKept, ESTIMATES_EVERY, now)) {
      keepEstimates(now);
    }
  }

  /** A clock that stepped back must not put off saving until it has caught up. */
  private static boolean isDue(Instant last, Duration every, Instant now) {
    return now.isBefore(last) || Duration.between(last, now).compareTo(every) >= 0;
  }

  /**
   * Keeps everything as it is now; at the latest with the recorder's next flush. Before {@link
   * #resume} there is nothing to keep.
   */
  public void keep() {
    if (station == null) {
      return;
    }
    bookKept = clock.instant();
    recorder.keepState(state(alarms.book()));
    keepEstimates(bookKept);
  }

  private Recorder.StateMaker state(AlarmBook book) {
    SavedState state = new SavedState(clock.instant(), book, descriptions);
    return state::bytes;
  }

  private void keepEstimates(Instant now) {
    estimatesKept = now;
    Station.Checkpoint moment = station.checkpoint();
    recorder.keepEstimates(() -> bytes(moment, now));
  }

  /** On the recorder's thread; what is in the moment never changes. */
  private static byte[] bytes(Station.Checkpoint moment, Instant now) {
    Map<String, SavedEstimates.Kept> kept = new HashMap<>();
    moment
        .states()
        .forEach(
            (vessel, state) ->
                kept.put(
                    vessel,
                    new SavedEstimates.Kept(moment.seenUntil(vessel), StateCodec.encode(state))));
    return new SavedEstimates(now, kept).bytes();
  }

  private void say(String kind, String text) {
    console.accept(text);
    recorder.write(JournalEntry.station(clock.instant(), kind, text));
  }

  private static Set<String> ids(Cellar cellar) {
    Set<String> ids = new HashSet<>();
    cellar.vessels().forEach(vessel -> ids.add(vessel.id()));
    return ids;
  }
}

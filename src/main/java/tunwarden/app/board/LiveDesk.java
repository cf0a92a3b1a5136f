package tunwarden.app.board;

import java.time.Instant;
import java.time.InstantSource;
import java.util.function.Consumer;
import java.util.function.Function;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmBook;
import tunwarden.reading.Mark;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.screen.model.Desk;
import tunwarden.screen.model.JournalEntry;
import tunwarden.screen.model.Look;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Station;
import tunwarden.station.StationLoop;

/**
 * Carries out what a person asks for while instruments or a rehearsal are running. Everything that
 * changes alarms or readings is handed to the station's thread.
 */
public class LiveDesk implements Desk {
  private static final String BUSY = "the station is too busy; try again";

  /**
   * What the desk works on.
   *
   * @param station takes samples
   * @param loop the station's thread
   * @param alarms the alarm book
   * @param board the journal page
   * @param looks keeps the chosen look for the next start
   */
  public record Hands(
      Station station,
      StationLoop loop,
      AlarmKeeper alarms,
      BoardKeeper board,
      Consumer<Look> looks) {}

  private final Hands hands;
  private final InstantSource clock;

  /** A desk on a running station. */
  public LiveDesk(Hands hands, InstantSource clock) {
    this.hands = hands;
    this.clock = clock;
  }

  @Override
  public String acknowledge(Alarm alarm, String word) {
    Instant now = clock.instant();
    return alarms(book -> book.acknowledge(alarm.kind(), alarm.vessel(), word, now));
  }

  @Override
  public String shelve(Alarm alarm, String reason, Instant until) {
    Instant now = clock.instant();
    return alarms(book -> book.shelve(alarm.kind(), alarm.vessel(), reason, until, now));
  }

  @Override
  public String unshelve(Alarm alarm) {
    Instant now = clock.instant();
    return alarms(book -> book.unshelve(alarm.kind(), alarm.vessel(), now));
  }

  @Override
  public String note(String vessel, String text) {
    Instant now = clock.instant();
    hands.board().write(new JournalEntry(now, vessel, "note", text));
    return vessel.isEmpty() ? "" : submit(() -> accept(new Mark(now, vessel, text)));
  }

  @Override
  public String labValue(String vessel, double dissolvedKgPerM3, double u95KgPerM3) {
    Instant now = clock.instant();
    Reading reading =
        new Reading(now, vessel, Quantity.DISSOLVED, dissolvedKgPerM3, u95KgPerM3, Quality.GOOD);
    return submit(() -> accept(reading));
  }

  @Override
  public String report(String vessel) {
    return "a report is made from a log; record one, then run report on it";
  }

  @Override
  public String stopWork() {
    return "nothing is under way";
  }

  @Override
  public void remember(Look look) {
    hands.looks().accept(look);
  }

  @Override
  public String pause(boolean paused) {
    return onlyReplay();
  }

  @Override
  public String pace(double pace) {
    return onlyReplay();
  }

  @Override
  public String seek(Instant time) {
    return onlyReplay();
  }

  @Override
  public String step() {
    return onlyReplay();
  }

  @Override
  public String mark(String text) {
    return onlyReplay();
  }

  private static String onlyReplay() {
    return "only a replay can do that";
  }

  private void accept(tunwarden.reading.Sample sample) {
    hands.station().accept(sample);
  }

  private String alarms(Function<AlarmBook, AlarmBook.Folded> deed) {
    return submit(
        () -> {
          try {
            hands.alarms().change(deed);
          } catch (IllegalArgumentException e) {
            hands.board().write(new JournalEntry(clock.instant(), "", "refused", e.getMessage()));
          }
        });
  }

  private String submit(Runnable task) {
    return hands.loop().submit(task) ? "" : BUSY;
  }
}

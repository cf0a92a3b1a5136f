package tunwarden.app.board;

import java.time.Instant;
import java.util.function.Consumer;
import java.util.function.Function;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmBook;
import tunwarden.reading.Mark;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.ReplayDriver;
import tunwarden.screen.model.Desk;
import tunwarden.screen.model.JournalEntry;
import tunwarden.screen.model.Look;

/** Carries out what a person asks for while a log or a rehearsal is played. */
final class PlaybackDesk implements Desk {
  private final Assembly assembly;
  private final StationTarget target;
  private final ReplayDriver driver;
  private final Playback.Helpers helpers;
  private final Consumer<Look> looks;

  PlaybackDesk(
      Assembly assembly,
      StationTarget target,
      ReplayDriver driver,
      Playback.Helpers helpers,
      Consumer<Look> looks) {
    this.assembly = assembly;
    this.target = target;
    this.driver = driver;
    this.helpers = helpers;
    this.looks = looks;
  }

  @Override
  public String acknowledge(Alarm alarm, String word) {
    return alarms(book -> book.acknowledge(alarm.kind(), alarm.vessel(), word, now()));
  }

  @Override
  public String shelve(Alarm alarm, String reason, Instant until) {
    return alarms(book -> book.shelve(alarm.kind(), alarm.vessel(), reason, until, now()));
  }

  @Override
  public String unshelve(Alarm alarm) {
    return alarms(book -> book.unshelve(alarm.kind(), alarm.vessel(), now()));
  }

  @Override
  public String note(String vessel, String text) {
    assembly.board().write(new JournalEntry(now(), vessel, "note", text));
    return vessel.isEmpty() ? "" : accept(new Mark(now(), vessel, text));
  }

  @Override
  public String labValue(String vessel, double dissolvedKgPerM3, double u95KgPerM3) {
    return accept(
        new Reading(now(), vessel, Quantity.DISSOLVED, dissolvedKgPerM3, u95KgPerM3, Quality.GOOD));
  }

  @Override
  public String report(String vessel) {
    return helpers
        .report()
        .apply(
            vessel,
            words -> assembly.board().write(new JournalEntry(now(), vessel, "report", words)));
  }

  @Override
  public String stopWork() {
    if (driver.status().seek().isPresent()) {
      driver.stopSeeking();
    } else {
      helpers.stopWork().run();
    }
    return "";
  }

  @Override
  public void remember(Look look) {
    looks.accept(look);
  }

  @Override
  public String pause(boolean paused) {
    driver.pause(paused);
    return "";
  }

  @Override
  public String pace(double pace) {
    driver.pace(pace);
    return "";
  }

  @Override
  public String seek(Instant time) {
    driver.seek(time);
    return "";
  }

  @Override
  public String step() {
    driver.step();
    return "";
  }

  @Override
  public String mark(String text) {
    assembly.board().write(new JournalEntry(now(), "", "mark", text));
    return "";
  }

  private Instant now() {
    return driver.status().at();
  }

  private String accept(Sample sample) {
    target.run(() -> assembly.station().accept(sample));
    return "";
  }

  private String alarms(Function<AlarmBook, AlarmBook.Folded> deed) {
    try {
      target.run(() -> assembly.alarms().change(deed));
      return "";
    } catch (IllegalArgumentException refused) {
      return refused.getMessage();
    }
  }
}

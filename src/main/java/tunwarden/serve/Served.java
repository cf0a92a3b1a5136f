package tunwarden.serve;

import java.time.InstantSource;
import java.util.List;
import java.util.function.Supplier;
import tunwarden.alarm.AlarmBook;

/**
 * What the pages are made of. Every supplier must answer at once, from any thread.
 *
 * @param state the newest assessments
 * @param book the alarms
 * @param events the journal
 * @param ailments reasons why the program is not well; none when it is
 * @param recorder what the recorder says of itself
 * @param clock for ages and stamps
 */
public record Served(
    LatestState state,
    Supplier<AlarmBook> book,
    EventFeed events,
    Supplier<List<String>> ailments,
    Supplier<RecorderFigures> recorder,
    InstantSource clock) {

  /**
   * The recorder's own counts.
   *
   * @param accepted readings and estimates taken in
   * @param dropped those lost to a full queue
   * @param waiting those waiting
   * @param failing whether recording has stopped
   */
  public record RecorderFigures(long accepted, long dropped, long waiting, boolean failing) {
    /** Of a program that does not record. */
    public static final RecorderFigures NONE = new RecorderFigures(0, 0, 0, false);
  }
}

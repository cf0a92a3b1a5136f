package tunwarden.screen.model;

import java.time.Instant;
import tunwarden.alarm.Alarm;

/**
 * What a person at the dashboard can ask for. Called on the key thread, so nothing here may take
 * long: begin the work and say so. Each method returns one sentence for the person, or an empty
 * text when the next board will show the result.
 */
public interface Desk {
  /** Acknowledges one alarm; {@code word} is what the person typed, empty where none was asked. */
  String acknowledge(Alarm alarm, String word);

  /** Shelves one alarm until a data time, for a reason. */
  String shelve(Alarm alarm, String reason, Instant until);

  /** Brings a shelved alarm back at once. */
  String unshelve(Alarm alarm);

  /** Writes a note into the journal; {@code vessel} may be empty. */
  String note(String vessel, String text);

  /** A laboratory value of dissolved CO2 at the present data time, with its 95 % half-width. */
  String labValue(String vessel, double dissolvedKgPerM3, double u95KgPerM3);

  /** Writes an incident report of the vessel so far. */
  String report(String vessel);

  /** Stops the long work shown as progress. */
  String stopWork();

  /** Keeps the units, theme and glyphs for the next start. */
  void remember(Look look);

  /** Replay: stands still or goes on. */
  String pause(boolean paused);

  /** Replay: data seconds per real second, 1 to 10,000. */
  String pace(double pace);

  /** Replay: goes to a data time, also backwards. */
  String seek(Instant time);

  /** Replay: pauses and plays one more row. */
  String step();

  /** Replay: remembers the present time under a word. */
  String mark(String text);
}

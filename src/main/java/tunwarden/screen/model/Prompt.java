package tunwarden.screen.model;

import java.util.Optional;
import tunwarden.alarm.Alarm;

/**
 * A question waiting for an answer on the bottom line.
 *
 * @param purpose what the answer is for
 * @param question what is asked
 * @param text what has been typed so far
 * @param trouble why the last answer would not do; empty at first
 * @param subject the alarm it is about, if any
 * @param carried an earlier answer this one completes; may be empty
 */
public record Prompt(
    Purpose purpose,
    String question,
    String text,
    String trouble,
    Optional<Alarm> subject,
    String carried) {
  /** What an answer is for. */
  public enum Purpose {
    FIND,
    FILTER_JOURNAL,
    NOTE,
    LAB_VALUE,
    ACKNOWLEDGE,
    SHELVE_REASON,
    SHELVE_UNTIL,
    VENT_TARGET,
    VENT_ORIFICE,
    SEEK,
    MARK,
    REPORT,
    STOP_WORK,
    QUIT;

    /** Whether one key, yes or no, answers. */
    public boolean isYesOrNo() {
      return this == REPORT || this == STOP_WORK || this == QUIT;
    }
  }

  /** Longest answer taken. */
  static final int MOST_TYPED = 200;

  static Prompt of(Purpose purpose, String question) {
    return new Prompt(purpose, question, "", "", Optional.empty(), "");
  }

  static Prompt about(Alarm alarm, Purpose purpose, String question) {
    return new Prompt(purpose, question, "", "", Optional.of(alarm), "");
  }

  Prompt typing(String more) {
    return new Prompt(purpose, question, more, "", subject, carried);
  }

  Prompt troubled(String why) {
    return new Prompt(purpose, question, text, why, subject, carried);
  }

  Prompt carrying(String earlier) {
    return new Prompt(purpose, question, text, trouble, subject, earlier);
  }
}

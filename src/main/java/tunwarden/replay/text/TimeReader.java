package tunwarden.replay.text;

import java.time.ZoneOffset;

/** Reads the time of successive rows of one log; may remember the row before. */
public interface TimeReader {
  /** What {@link #read} returns for something that is not a time. */
  long UNREADABLE = Long.MIN_VALUE;

  /** Microseconds since 1970-01-01T00:00Z, or {@link #UNREADABLE}. */
  long read(char[] chars, int from, int to);

  /** The zone offset the newest time was written in. */
  ZoneOffset offset();

  /** How many times fell into an hour that the zone's clocks skip. */
  default long skippedHours() {
    return 0;
  }
}

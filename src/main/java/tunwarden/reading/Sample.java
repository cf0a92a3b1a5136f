package tunwarden.reading;

import java.time.Instant;

/** What comes off an instrument or a log row: a value, a fault in its place, or a remark. */
public sealed interface Sample permits Reading, Fault, Mark {
  Instant time();

  /** Identity of the vessel, as in the cellar file. */
  String vessel();
}

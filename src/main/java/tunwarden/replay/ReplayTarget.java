package tunwarden.replay;

import java.time.Instant;
import tunwarden.reading.Sample;

/**
 * What a replay feeds. Called from one thread at a time. A checkpoint is whatever lets the target
 * return to where it stood; with immutable states it is only a few references.
 */
public interface ReplayTarget {
  /** Takes one sample, in order of data time. */
  void accept(Sample sample);

  /** Data time has reached {@code now} and nothing has arrived for a tick. */
  void tick(Instant now);

  /** How many vessels a checkpoint holds: the more, the fewer are kept. */
  default int vessels() {
    return 1;
  }

  /** Where the target stands now. */
  Object checkpoint();

  /** Returns to a place given by {@link #checkpoint}. */
  void restore(Object checkpoint);
}

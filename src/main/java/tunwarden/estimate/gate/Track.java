package tunwarden.estimate.gate;

/**
 * What the gates remember about one quantity. Times are milliseconds since the epoch.
 *
 * @param seen whether anything was accepted yet
 * @param timeMs time of the newest accepted reading
 * @param value its value
 * @param earlier the value before it
 * @param restless share of readings that turned back on the one before to a new value, learnt while
 *     it moved; a coarse signal that flickers between two steps or only drifts stays at zero
 * @param sameRun readings in a row without any change
 * @param sameSinceMs when that run began
 * @param strayMs time of the newest reading refused for its time or rate; 0 for none
 * @param strayValue its value
 * @param strays how many such readings agreed with each other in a row
 */
public record Track(
    boolean seen,
    long timeMs,
    double value,
    double earlier,
    double restless,
    int sameRun,
    long sameSinceMs,
    long strayMs,
    double strayValue,
    int strays) {
  /** Nothing seen yet. */
  public static final Track EMPTY = new Track(false, 0, 0, 0, 0, 0, 0, 0, 0, 0);

  private static final double LEARNING = 0.02;

  /** After an accepted reading. */
  Track accept(long newTimeMs, double newValue) {
    if (!seen) {
      return new Track(true, newTimeMs, newValue, newValue, 0, 0, newTimeMs, 0, 0, 0);
    }
    boolean same = newValue == value;
    boolean turns = (newValue - value) * (value - earlier) < 0 && newValue != earlier;
    double learnt = restless + LEARNING * ((turns ? 1 : 0) - restless);
    return new Track(
        true,
        newTimeMs,
        newValue,
        value,
        same && sameRun > 0 ? restless : learnt,
        same ? sameRun + 1 : 0,
        same ? sameSinceMs : newTimeMs,
        0,
        0,
        0);
  }

  /** After a reading that was refused, but may be the first of a new order of things. */
  Track stray(long newTimeMs, double newValue, boolean agrees) {
    return new Track(
        seen,
        timeMs,
        value,
        earlier,
        restless,
        sameRun,
        sameSinceMs,
        newTimeMs,
        newValue,
        agrees ? strays + 1 : 1);
  }
}

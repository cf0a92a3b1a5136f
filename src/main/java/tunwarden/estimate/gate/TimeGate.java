package tunwarden.estimate.gate;

/** Order in time: backwards and duplicate times are refused until a new clock proves itself. */
final class TimeGate {
  /** Readings in a row, in order among themselves, that prove that a clock was set back. */
  static final int PROOF = 5;

  private TimeGate() {}

  /** The reason against the time, or empty. */
  static String against(Track track, long timeMs) {
    if (!track.seen() || timeMs > track.timeMs()) {
      return "";
    }
    return timeMs == track.timeMs()
        ? "has the same time as the reading before it"
        : "is older than the reading before it";
  }

  /** Whether this reading continues a run of readings on another clock. */
  static boolean agrees(Track track, long timeMs) {
    return track.strays() > 0 && timeMs > track.strayMs();
  }
}

package tunwarden.estimate.gate;

/**
 * A signal that used to move at most readings and now repeats itself. The chance of the present run
 * under the restlessness learnt before must fall below one in a million, and the run must last; so
 * a coarse, quiet instrument is not accused.
 */
final class StuckGate {
  private static final double LN_CHANCE = -14;
  private static final int LEAST_RUN = 12;
  private static final long LEAST_MS = 60_000;

  private StuckGate() {}

  static boolean accepts(Track track) {
    double lnChance = track.sameRun() * Math.log1p(-Math.min(track.restless(), 0.999));
    long lasted = track.timeMs() - track.sameSinceMs();
    return track.sameRun() < LEAST_RUN || lasted < LEAST_MS || lnChance >= LN_CHANCE;
  }
}

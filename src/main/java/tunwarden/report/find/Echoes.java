package tunwarden.report.find;

import java.util.ArrayList;
import java.util.List;

/**
 * Tells a movement from the echo of the one before: after gas has left, the rest warms up and the
 * liquid gives off more, so the pressure comes back part of the way; after gas has come in, it
 * cools and the liquid takes some up. Neither passes the level before.
 */
final class Echoes {
  private static final long WITHIN_MS = 60 * 60_000;

  private Echoes() {}

  /** The movements that are not echoes, in order of time. */
  static List<Movement> without(List<Movement> movements) {
    List<Movement> kept = new ArrayList<>();
    Movement cause = null;
    for (Movement movement : movements) {
      if (cause != null && isEcho(movement, cause)) {
        continue;
      }
      kept.add(movement);
      cause = movement;
    }
    return kept;
  }

  private static boolean isEcho(Movement movement, Movement cause) {
    boolean soon = movement.fromMs() - cause.untilMs() < WITHIN_MS;
    boolean back = movement.changePa() * cause.changePa() < 0;
    boolean partWay = Math.abs(movement.toPa() - cause.toPa()) <= Math.abs(cause.changePa());
    return soon && back && partWay;
  }
}

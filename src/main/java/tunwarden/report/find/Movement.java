package tunwarden.report.find;

/**
 * A change of pressure too quick for a shut vessel.
 *
 * @param fromMs when it began, milliseconds since 1970
 * @param untilMs when it ended
 * @param fromPa pressure before, Pa gauge
 * @param toPa pressure at its end, Pa gauge
 * @param kelvin liquid temperature, K
 * @param sharpness how many times larger it was than what the signal does by itself
 */
record Movement(
    long fromMs, long untilMs, double fromPa, double toPa, double kelvin, double sharpness) {
  private static final long NEAR_MS = 60_000;

  double changePa() {
    return toPa - fromPa;
  }

  /** The same with another begin, milliseconds since 1970, and the pressure there. */
  Movement beginning(long ms, double pa) {
    return new Movement(ms, untilMs, pa, toPa, kelvin, sharpness);
  }

  /** Whether both were under way at some time, or nearly. */
  boolean meets(Movement other) {
    return fromMs <= other.untilMs + NEAR_MS && other.fromMs <= untilMs + NEAR_MS;
  }
}

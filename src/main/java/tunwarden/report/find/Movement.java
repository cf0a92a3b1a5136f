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
  double changePa() {
    return toPa - fromPa;
  }
}

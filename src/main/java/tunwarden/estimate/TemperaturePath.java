package tunwarden.estimate;

import java.util.OptionalDouble;

/**
 * Where the liquid temperature goes if it goes on as it has: it nears a rest at the present rate,
 * as a body does by Newton's law of cooling. Where the surroundings were stated and it moves
 * towards them, they are that rest; otherwise nobody knows how long the warming or cooling goes on,
 * and the path is one of several that bound it.
 *
 * @param startK now, K
 * @param gapK how far it still goes, K; its sign is that of the rate
 * @param timeS how long it takes to cover 63 % of that, s
 */
record TemperaturePath(double startK, double gapK, double timeS) {
  /** Below this the thermometer's noise looks like a rate: 0.1 K in an hour. */
  private static final double LEAST_RATE = 0.1 / 3600;

  /** How well an hour of readings tells the rate, relative; judgement. */
  private static final double RATE_U95 = 0.3;

  private static final double HOUR_S = 3600;
  private static final double SHORT_S = 2 * HOUR_S;
  private static final double MIDDLE_S = 8 * HOUR_S;
  private static final double LONG_S = 24 * HOUR_S;
  private static final double LEAST_GAP_K = 0.5;

  /** Judgement: an unstated rest is not further away than this. */
  private static final double FURTHEST_K = 25;

  /** Staying as it is. */
  static TemperaturePath still(double kelvin) {
    return new TemperaturePath(kelvin, 0, 1);
  }

  /**
   * The coldest, the likely and the warmest path.
   *
   * @param kelvin now, K
   * @param rateKPerS present rate, K/s
   * @param ambientK what the vessel would come to, K, if stated
   */
  static TemperaturePath[] all(double kelvin, double rateKPerS, OptionalDouble ambientK) {
    if (!(Math.abs(rateKPerS) > LEAST_RATE)) {
      TemperaturePath still = still(kelvin);
      return new TemperaturePath[] {still, still, still};
    }
    double toAmbient = ambientK.orElse(kelvin) - kelvin;
    boolean towards = toAmbient * rateKPerS > 0 && Math.abs(toAmbient) > LEAST_GAP_K;
    double fast = rateKPerS * (1 + RATE_U95);
    TemperaturePath ends = lasting(kelvin, rateKPerS * (1 - RATE_U95), SHORT_S);
    TemperaturePath likely =
        towards
            ? new TemperaturePath(kelvin, toAmbient, toAmbient / rateKPerS)
            : lasting(kelvin, rateKPerS, MIDDLE_S);
    TemperaturePath goesOn =
        towards
            ? new TemperaturePath(kelvin, toAmbient, toAmbient / fast)
            : lasting(kelvin, fast, LONG_S);
    boolean warming = rateKPerS > 0;
    return warming
        ? new TemperaturePath[] {ends, likely, goesOn}
        : new TemperaturePath[] {goesOn, likely, ends};
  }

  private static TemperaturePath lasting(double kelvin, double rateKPerS, double seconds) {
    double gap = Math.copySign(Math.min(Math.abs(rateKPerS * seconds), FURTHEST_K), rateKPerS);
    return new TemperaturePath(kelvin, gap, gap / rateKPerS);
  }

  boolean isStill() {
    return gapK == 0;
  }

  /** Temperature after some seconds, K. */
  double at(double seconds) {
    return startK - gapK * Math.expm1(-seconds / timeS);
  }
}

package tunwarden.estimate;

import tunwarden.estimate.bank.Noise;
import tunwarden.estimate.gate.Track;

/**
 * What is remembered about the instruments; immutable.
 *
 * @param pressure gate memory of the gauge
 * @param temperature gate memory of the thermometer
 * @param barometer gate memory of the barometer
 * @param smoothK liquid temperature, smoothed over a minute, K
 * @param smoothS when it was last smoothed, seconds since the epoch
 * @param slowK the same smoothed over an hour; how far it lags tells how fast the liquid warms
 * @param noise scatter and step of the gauge
 */
record Senses(
    Track pressure,
    Track temperature,
    Track barometer,
    double smoothK,
    double smoothS,
    double slowK,
    Noise noise) {
  private static final double SMOOTHING_S = 60;
  private static final double SLOW_S = 3600;
  private static final double SNAP_K = 2;

  static Senses fresh(double gaugeU95Pa) {
    return new Senses(Track.EMPTY, Track.EMPTY, Track.EMPTY, 0, 0, 0, Noise.expected(gaugeU95Pa));
  }

  Senses withPressure(Track track) {
    return new Senses(track, temperature, barometer, smoothK, smoothS, slowK, noise);
  }

  Senses withNoise(Noise other) {
    return new Senses(pressure, temperature, barometer, smoothK, smoothS, slowK, other);
  }

  Senses withBarometer(Track track) {
    return new Senses(pressure, temperature, track, smoothK, smoothS, slowK, noise);
  }

  Senses refused(Track track) {
    return new Senses(pressure, track, barometer, smoothK, smoothS, slowK, noise);
  }

  /** After an accepted temperature. */
  Senses withTemperature(Track track, double atS, double kelvin) {
    double smooth = kelvin;
    double slow = kelvin;
    if (temperature.seen() && Math.abs(kelvin - smoothK) < SNAP_K) {
      double gap = Math.max(atS - smoothS, 0);
      smooth = smoothK - Math.expm1(-gap / SMOOTHING_S) * (kelvin - smoothK);
      slow = slowK - Math.expm1(-gap / SLOW_S) * (kelvin - slowK);
    }
    return new Senses(pressure, track, barometer, smooth, atS, slow, noise);
  }

  /**
   * How fast the liquid warms, K/s: a steady ramp runs ahead of its smoothed self by the smoothing
   * time. In the first hour it reads low.
   */
  double warmingKPerS() {
    return (smoothK - slowK) / (SLOW_S - SMOOTHING_S);
  }
}

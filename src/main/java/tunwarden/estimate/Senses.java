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
 * @param noise scatter and step of the gauge
 */
record Senses(
    Track pressure,
    Track temperature,
    Track barometer,
    double smoothK,
    double smoothS,
    Noise noise) {
  private static final double SMOOTHING_S = 60;
  private static final double SNAP_K = 2;

  static Senses fresh(double gaugeU95Pa) {
    return new Senses(Track.EMPTY, Track.EMPTY, Track.EMPTY, 0, 0, Noise.expected(gaugeU95Pa));
  }

  Senses withPressure(Track track) {
    return new Senses(track, temperature, barometer, smoothK, smoothS, noise);
  }

  Senses withNoise(Noise other) {
    return new Senses(pressure, temperature, barometer, smoothK, smoothS, other);
  }

  Senses withBarometer(Track track) {
    return new Senses(pressure, temperature, track, smoothK, smoothS, noise);
  }

  Senses refused(Track track) {
    return new Senses(pressure, track, barometer, smoothK, smoothS, noise);
  }

  /** After an accepted temperature. */
  Senses withTemperature(Track track, double atS, double kelvin) {
    double smooth = kelvin;
    if (temperature.seen() && Math.abs(kelvin - smoothK) < SNAP_K) {
      double fresh = 1 - Math.exp(-Math.max(atS - smoothS, 0) / SMOOTHING_S);
      smooth = smoothK + fresh * (kelvin - smoothK);
    }
    return new Senses(pressure, track, barometer, smooth, atS, noise);
  }
}

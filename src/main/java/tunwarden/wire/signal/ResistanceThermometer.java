package tunwarden.wire.signal;

import java.util.Locale;
import tunwarden.reading.Quality;
import tunwarden.units.Constants;

/**
 * A platinum resistance thermometer by IEC 60751: R = R0 (1 + A t + B t² + C (t − 100) t³), the
 * last term below 0 °C only; valid from −200 to 850 °C. A wire break or a short circuit lies
 * outside.
 *
 * @param zeroOhm resistance at 0 °C, Ω: 100 for a Pt100
 */
public record ResistanceThermometer(double zeroOhm) implements Conversion {
  private static final double A = 3.9083e-3;
  private static final double B = -5.775e-7;
  private static final double C = -4.183e-12;
  private static final double LEAST_CELSIUS = -200;
  private static final double MOST_CELSIUS = 850;
  private static final int NEWTON_STEPS = 8;

  @Override
  public Decoded toSi(double ohm) {
    double ratio = ohm / zeroOhm;
    if (!(ratio >= ratioAt(LEAST_CELSIUS) && ratio <= ratioAt(MOST_CELSIUS))) {
      String seen = String.format(Locale.ROOT, "%.2f ohm, broken wire or short circuit", ohm);
      return Decoded.bad(Quality.LOOP_FAULT, seen);
    }
    return Decoded.good(celsius(ratio) + Constants.ZERO_CELSIUS_K);
  }

  @Override
  public double fromSi(double kelvin) {
    return zeroOhm * ratioAt(kelvin - Constants.ZERO_CELSIUS_K);
  }

  private static double ratioAt(double t) {
    double cold = t < 0 ? C * (t - 100) * t * t * t : 0;
    return 1 + A * t + B * t * t + cold;
  }

  /**
   * The quadratic inverts exactly above 0 °C; below, Newton steps from it take in the last term.
   */
  private static double celsius(double ratio) {
    double t = (-A + Math.sqrt(A * A - 4 * B * (1 - ratio))) / (2 * B);
    if (ratio >= 1) {
      return t;
    }
    for (int i = 0; i < NEWTON_STEPS; i++) {
      double slope = A + 2 * B * t + C * (4 * t * t * t - 300 * t * t);
      t -= (ratioAt(t) - ratio) / slope;
    }
    return t;
  }
}

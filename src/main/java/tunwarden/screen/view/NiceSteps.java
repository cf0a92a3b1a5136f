package tunwarden.screen.view;

import tunwarden.units.Display;

/** Round numbers for scales. */
final class NiceSteps {
  private static final double[] MANTISSAS = {1, 2, 5, 10};

  private NiceSteps() {}

  /** The least of 1, 2, 5 times a power of ten that divides the span into at most so many parts. */
  static double step(double span, int parts) {
    double raw = Math.max(span, 1e-9) / Math.max(1, parts);
    double decade = Math.pow(10, Math.floor(Math.log10(raw)));
    for (double mantissa : MANTISSAS) {
      if (mantissa * decade >= raw * (1 - 1e-9)) {
        return mantissa * decade;
      }
    }
    return 10 * decade;
  }

  /** A multiple of the step with the decimals the step needs. */
  static String text(double value, double step) {
    int decimals = (int) Math.max(0, Math.min(6, -Math.floor(Math.log10(step) + 1e-9)));
    return Display.number(value, decimals);
  }
}

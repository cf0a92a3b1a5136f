package tunwarden.replay.text;

/** Prints numbers with a fixed ceiling of decimals, trailing zeros dropped, locale never used. */
public final class Decimals {
  private static final long[] POWER = {1, 10, 100, 1_000, 10_000, 100_000, 1_000_000};

  private Decimals() {}

  /**
   * Appends {@code value} rounded to at most {@code decimals} places (0..6).
   *
   * @throws IllegalArgumentException when the value is not finite
   */
  public static void append(StringBuilder out, double value, int decimals) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(value + " cannot be written as a number");
    }
    long scaled = Math.round(Math.abs(value) * POWER[decimals]);
    if (value < 0 && scaled != 0) {
      out.append('-');
    }
    out.append(scaled / POWER[decimals]);
    long rest = scaled % POWER[decimals];
    if (rest == 0) {
      return;
    }
    out.append('.');
    for (int place = decimals - 1; rest != 0; place--) {
      out.append((char) ('0' + rest / POWER[place]));
      rest %= POWER[place];
    }
  }
}

package tunwarden.forecast;

/**
 * A value that is not exactly known.
 *
 * @param value the value
 * @param u95 its 95 % half-width, in the same unit
 */
public record Uncertain(double value, double u95) {
  /** Taken as it stands. */
  public static Uncertain exactly(double value) {
    return new Uncertain(value, 0);
  }
}

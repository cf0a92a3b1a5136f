package tunwarden.vessel;

/**
 * How good the instruments and the description are, as 95 % expanded uncertainties.
 *
 * @param pressureU95Pa pressure gauge, Pa
 * @param temperatureU95K thermometer, K
 * @param fillU95M3 stated fill, m³
 */
public record Accuracy(double pressureU95Pa, double temperatureU95K, double fillU95M3) {
  private static final double FILL_SHARE = 0.02;

  /** What an ordinary transmitter and a dipped level give: common practice, no source. */
  public static Accuracy usual(double volumeM3) {
    return new Accuracy(1000, 0.3, FILL_SHARE * volumeM3);
  }
}

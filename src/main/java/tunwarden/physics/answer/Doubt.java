package tunwarden.physics.answer;

/**
 * How well the inputs are known, as standard uncertainties (one sigma). The relation's own comes
 * from the liquid.
 *
 * @param gaugePa pressure gauge, Pa
 * @param temperatureK thermometer, K
 * @param ambientPa local atmosphere, Pa; zero where the gauge itself is absolute
 * @param airPa left-over air, Pa
 * @param fillM3 liquid volume, m³
 */
public record Doubt(
    double gaugePa, double temperatureK, double ambientPa, double airPa, double fillM3) {
  /** Nothing but the relation is in doubt. */
  public static final Doubt NONE = new Doubt(0, 0, 0, 0, 0);

  private static final double COVERAGE_95 = 1.96;

  /** From 95 % expanded uncertainties in the same order. */
  public static Doubt ofU95(
      double gaugePa, double temperatureK, double ambientPa, double airPa, double fillM3) {
    return new Doubt(
        gaugePa / COVERAGE_95,
        temperatureK / COVERAGE_95,
        ambientPa / COVERAGE_95,
        airPa / COVERAGE_95,
        fillM3 / COVERAGE_95);
  }
}

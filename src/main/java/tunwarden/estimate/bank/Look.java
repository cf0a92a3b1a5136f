package tunwarden.estimate.bank;

/**
 * One reading as the bank sees it.
 *
 * @param seconds since the bank was last moved
 * @param kelvin liquid temperature
 * @param swingK how far the liquid has warmed or cooled meanwhile, noise left out
 * @param paAbsolute total pressure by gauge and nominal ambient, Pa absolute
 * @param variance of the reading, Pa squared
 * @param stage what the gas in the headspace is about
 */
public record Look(
    double seconds, double kelvin, double swingK, double paAbsolute, double variance, Stage stage) {

  /** What the gas in the headspace is about. */
  public enum Stage {
    /** Nothing but what the liquid gives or takes. */
    CALM,
    /** A valve passes gas. */
    FLOWING,
    /** A valve has shut, and the gas left behind is not yet at the liquid's temperature. */
    RECOVERING
  }

  boolean flowing() {
    return stage == Stage.FLOWING;
  }

  boolean recovering() {
    return stage == Stage.RECOVERING;
  }
}

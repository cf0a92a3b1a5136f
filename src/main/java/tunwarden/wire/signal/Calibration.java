package tunwarden.wire.signal;

/**
 * A two-point calibration: what the instrument showed against what was true, at two places. All
 * four in the SI unit of the quantity; pressures as the instrument counts them, gauge or absolute.
 *
 * @param shownLow shown at the first point
 * @param trueLow true at the first point
 * @param shownHigh shown at the second point
 * @param trueHigh true at the second point
 */
public record Calibration(double shownLow, double trueLow, double shownHigh, double trueHigh) {
  /** Changes nothing. */
  public static final Calibration NONE = new Calibration(0, 0, 1, 1);

  /**
   * Refuses two points in one place.
   *
   * @throws IllegalArgumentException with a sentence for the user
   */
  public Calibration {
    double gain = (trueHigh - trueLow) / (shownHigh - shownLow);
    if (!Double.isFinite(gain) || gain <= 0) {
      throw new IllegalArgumentException(
          "a calibration needs two points that differ and rise together");
    }
  }

  /** The true value for a shown one. */
  public double apply(double shown) {
    return trueLow + (shown - shownLow) * (trueHigh - trueLow) / (shownHigh - shownLow);
  }

  /** What the instrument would show for a true value. */
  public double undo(double truth) {
    return shownLow + (truth - trueLow) * (shownHigh - shownLow) / (trueHigh - trueLow);
  }
}

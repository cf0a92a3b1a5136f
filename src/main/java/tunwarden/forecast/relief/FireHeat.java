package tunwarden.forecast.relief;

/**
 * Heat taken up by a vessel in an external pool fire: API Std 521, Q = C·F·A^0.82, with A the
 * wetted surface up to 7.6 m above the fire. The constants in SI are computed from 21,000 and
 * 34,500 Btu/h and ft².
 */
public final class FireHeat {
  private static final double DRAINED_W = 43.2e3;
  private static final double UNDRAINED_W = 70.9e3;
  private static final double EXPONENT = 0.82;

  private FireHeat() {}

  /**
   * Heat input of a bare vessel (F = 1), W.
   *
   * @param wettedM2 wetted outer surface, m²
   * @param drained whether spilled liquid drains away and firemen are at hand
   */
  public static double watts(double wettedM2, boolean drained) {
    return (drained ? DRAINED_W : UNDRAINED_W) * Math.pow(wettedM2, EXPONENT);
  }
}

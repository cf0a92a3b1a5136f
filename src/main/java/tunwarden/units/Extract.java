package tunwarden.units;

/**
 * Degrees Plato and specific gravity 20/20 °C, by the cubic used throughout the trade (recalled
 * from memory; agrees with the sucrose tables in the validation tests to 0.01 °P up to 20 °P).
 */
public final class Extract {
  private static final double GRAVITY_STEP = 1e-9;

  private Extract() {}

  /** Extract in degrees Plato (g per 100 g) from specific gravity 20/20 °C. */
  public static double platoFromGravity(double gravity) {
    return -616.868 + gravity * (1111.14 + gravity * (-630.272 + gravity * 135.997));
  }

  /** Specific gravity 20/20 °C from extract in degrees Plato; the inverse of the cubic. */
  public static double gravityFromPlato(double plato) {
    double gravity = 1 + plato / (258.6 - 0.8796 * plato);
    for (int i = 0; i < 8; i++) {
      double slope = 1111.14 + gravity * (-2 * 630.272 + gravity * 3 * 135.997);
      double step = (platoFromGravity(gravity) - plato) / slope;
      gravity -= step;
      if (Math.abs(step) < GRAVITY_STEP) {
        break;
      }
    }
    return gravity;
  }
}

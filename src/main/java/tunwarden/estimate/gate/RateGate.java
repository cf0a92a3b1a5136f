package tunwarden.estimate.gate;

import tunwarden.reading.Quantity;

/** Changes no vessel can make; a second reading that agrees with the first overrules the gate. */
final class RateGate {
  private static final double PRESSURE_PA = 5e4;
  private static final double PRESSURE_PA_PER_S = 3e5;
  private static final double TEMPERATURE_K = 3;
  private static final double TEMPERATURE_K_PER_S = 0.5;

  private RateGate() {}

  static boolean accepts(Quantity quantity, double change, double seconds) {
    double size = Math.abs(change);
    return switch (quantity) {
      case PRESSURE -> size <= PRESSURE_PA + PRESSURE_PA_PER_S * seconds;
      case TEMPERATURE, HEADSPACE_TEMPERATURE ->
          size <= TEMPERATURE_K + TEMPERATURE_K_PER_S * seconds;
      default -> true;
    };
  }
}

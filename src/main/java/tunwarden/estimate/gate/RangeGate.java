package tunwarden.estimate.gate;

import tunwarden.reading.Quantity;

/** What no vessel and no usual instrument can show. */
final class RangeGate {
  private static final double ABSOLUTE_VACUUM_PA_GAUGE = -1.1e5;

  private RangeGate() {}

  static boolean accepts(Quantity quantity, double value) {
    return switch (quantity) {
      case PRESSURE -> value >= ABSOLUTE_VACUUM_PA_GAUGE && value <= 40e5;
      case TEMPERATURE, HEADSPACE_TEMPERATURE -> value >= 233.15 && value <= 403.15;
      case LEVEL -> value >= 0 && value <= 1e5;
      case BAROMETER -> value >= 4e4 && value <= 1.2e5;
      case GRAVITY -> value >= -10 && value <= 80;
      case DISSOLVED -> value >= 0 && value <= 60;
    };
  }
}

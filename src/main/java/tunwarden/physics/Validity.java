package tunwarden.physics;

import java.util.Locale;
import java.util.Optional;
import tunwarden.units.Constants;

/**
 * Where a correlation holds.
 *
 * @param leastK lowest temperature, K
 * @param mostK highest temperature, K
 * @param leastPaAbsolute lowest pressure, Pa absolute
 * @param mostPaAbsolute highest pressure, Pa absolute
 */
public record Validity(double leastK, double mostK, double leastPaAbsolute, double mostPaAbsolute) {
  private static final double SLACK_K = 1e-6;
  private static final double SLACK_SHARE = 1e-9;
  private static final double PA_PER_BAR = 1e5;

  /** Limits in °C and bar absolute, the way they are printed. */
  public static Validity ofCelsiusAndBar(double leastC, double mostC, double least, double most) {
    return new Validity(
        leastC + Constants.ZERO_CELSIUS_K,
        mostC + Constants.ZERO_CELSIUS_K,
        least * PA_PER_BAR,
        most * PA_PER_BAR);
  }

  /** What is outside, in words; empty when nothing is. */
  public Optional<String> breach(double temperatureK, double pressurePaAbsolute) {
    if (!holdsTemperature(temperatureK)) {
      return Optional.of(
          String.format(
              Locale.ROOT,
              "%.1f C, where it holds from %.1f to %.1f C",
              temperatureK - Constants.ZERO_CELSIUS_K,
              leastK - Constants.ZERO_CELSIUS_K,
              mostK - Constants.ZERO_CELSIUS_K));
    }
    if (!holdsPressure(pressurePaAbsolute)) {
      return Optional.of(
          String.format(
              Locale.ROOT,
              "%.2f bar absolute, where it holds from %.2f to %.2f",
              pressurePaAbsolute / PA_PER_BAR,
              leastPaAbsolute / PA_PER_BAR,
              mostPaAbsolute / PA_PER_BAR));
    }
    return Optional.empty();
  }

  private boolean holdsTemperature(double kelvin) {
    return kelvin >= leastK - SLACK_K && kelvin <= mostK + SLACK_K;
  }

  private boolean holdsPressure(double pa) {
    return pa >= leastPaAbsolute * (1 - SLACK_SHARE) && pa <= mostPaAbsolute * (1 + SLACK_SHARE);
  }
}

package tunwarden.physics.answer;

import java.util.Optional;

/**
 * What the instruments say of a headspace.
 *
 * @param paGauge pressure, Pa gauge
 * @param temperatureK temperature, K
 * @param ambientPaAbsolute the atmosphere the gauge is counted from, Pa absolute
 * @param airPaAbsolute partial pressure of air left in the headspace, Pa
 */
public record GaugeState(
    double paGauge, double temperatureK, double ambientPaAbsolute, double airPaAbsolute) {
  /** Total pressure, Pa absolute. */
  public double paAbsolute() {
    return paGauge + ambientPaAbsolute;
  }

  /** Why nothing can be computed from this; empty when something can. */
  Optional<String> unusable() {
    if (!Double.isFinite(paGauge) || !Double.isFinite(ambientPaAbsolute)) {
      return Optional.of("the pressure is not a number");
    }
    if (!Double.isFinite(temperatureK) || temperatureK <= 0) {
      return Optional.of("the temperature is not a number above absolute zero");
    }
    if (!(airPaAbsolute >= 0)) {
      return Optional.of("the left-over air is not a number from zero up");
    }
    return paAbsolute() > 0
        ? Optional.empty()
        : Optional.of("the pressure lies below a perfect vacuum");
  }
}

package tunwarden.forecast;

import java.util.Optional;

/**
 * Where the pressure goes in one scenario.
 *
 * @param scenario which future
 * @param words what it assumes, short enough for a rung: "warmed to 24 °C"
 * @param paGauge pressure reached, Pa gauge
 * @param lowPaGauge lower end of its 95 % range
 * @param highPaGauge upper end
 * @param when how long it takes, where that is known
 */
public record Projection(
    Scenario scenario,
    String words,
    double paGauge,
    double lowPaGauge,
    double highPaGauge,
    Optional<TimeRange> when) {}

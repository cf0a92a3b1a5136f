package tunwarden.forecast;

import java.time.Instant;

/**
 * One point of the estimator's forward run.
 *
 * @param at time
 * @param paGauge median pressure, Pa gauge
 * @param lowPaGauge lower end of the 95 % band
 * @param highPaGauge upper end
 */
public record TrendPoint(Instant at, double paGauge, double lowPaGauge, double highPaGauge) {}

package tunwarden.estimate;

import java.time.Duration;

/**
 * One point of the forward run.
 *
 * @param after time from the newest reading
 * @param paGauge median pressure, Pa gauge
 * @param lowPaGauge lower end of the 95 % band
 * @param highPaGauge upper end
 */
public record ForwardPoint(Duration after, double paGauge, double lowPaGauge, double highPaGauge) {}

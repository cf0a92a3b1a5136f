package tunwarden.report.find;

/**
 * One row as the search sees it.
 *
 * @param ms milliseconds since 1970
 * @param paGauge pressure, Pa gauge
 * @param kelvin newest liquid temperature, K
 */
public record Point(long ms, double paGauge, double kelvin) {}

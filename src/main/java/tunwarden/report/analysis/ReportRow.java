package tunwarden.report.analysis;

import java.time.Instant;
import tunwarden.reading.Quality;

/**
 * What is known after one row of the log. NaN stands for "not known".
 *
 * @param time data time
 * @param paGauge pressure as read, Pa gauge
 * @param temperatureK liquid temperature as read, K
 * @param dissolvedKgPerM3 dissolved CO2, kg/m³
 * @param u95KgPerM3 its 95 % half-width
 * @param equilibriumKgPerM3 what the liquid would hold at rest
 * @param settled share of the way to rest, 0..1
 * @param marginPa relief margin, Pa
 * @param quality of the pressure reading
 */
public record ReportRow(
    Instant time,
    double paGauge,
    double temperatureK,
    double dissolvedKgPerM3,
    double u95KgPerM3,
    double equilibriumKgPerM3,
    double settled,
    double marginPa,
    Quality quality) {

  /** The same with another belief about the liquid. */
  public ReportRow withDissolved(double kgPerM3, double u95) {
    return new ReportRow(
        time, paGauge, temperatureK, kgPerM3, u95, equilibriumKgPerM3, settled, marginPa, quality);
  }
}

package tunwarden.report.analysis;

import java.time.Instant;
import java.util.List;
import tunwarden.reading.Quality;
import tunwarden.reading.Reading;

/**
 * A row that has passed the gates, with what the estimator is to see after it. NaN stands for "not
 * known".
 *
 * @param time data time
 * @param paGauge pressure as read, Pa gauge
 * @param kelvin newest liquid temperature as read, K
 * @param quality of the pressure
 * @param belated readings from before the silence that this row ends
 * @param news readings up to this row
 */
public record Sifted(
    Instant time,
    double paGauge,
    double kelvin,
    Quality quality,
    List<Reading> belated,
    List<Reading> news) {}

package tunwarden.replay;

import java.time.Instant;
import java.util.List;
import tunwarden.reading.Sample;

/**
 * One row of a log.
 *
 * @param line where it stands in the file, counted from 1; 0 for a row that came from no file
 * @param time data time of the row
 * @param vessel identity of the vessel
 * @param samples what it says; pressure last, since the estimator steps on it
 */
public record LogRow(long line, Instant time, String vessel, List<Sample> samples) {}

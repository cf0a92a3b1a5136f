package tunwarden.report.story;

import java.util.List;
import java.util.TreeMap;
import tunwarden.vessel.Limits;

/**
 * A pressure over time that did not happen.
 *
 * @param words what was changed, for a person
 * @param points Pa gauge by milliseconds since 1970
 * @param limits the limits it is drawn with
 * @param sentences what it comes to
 */
public record Course(
    String words, TreeMap<Long, Double> points, Limits limits, List<String> sentences) {
  /** Where it begins, milliseconds since 1970. */
  public long fromMs() {
    return points.firstKey();
  }

  /** Pressure at a time, Pa gauge; NaN before it begins. */
  public double paGaugeAt(long ms) {
    var before = points.floorEntry(ms);
    return before == null ? Double.NaN : before.getValue();
  }
}

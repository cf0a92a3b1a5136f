package tunwarden.station;

import java.time.Duration;
import java.time.Instant;
import tunwarden.forecast.Outlook;

/**
 * The futures as last computed, and when they are worth computing again. The rule looks at data
 * time and at the reading only, so that a replay computes them at the same moments.
 */
record PacedOutlook(Instant computedAt, double computedPaGauge, Outlook outlook) {
  static final PacedOutlook NEVER = new PacedOutlook(Instant.MIN, Double.NaN, Outlook.NONE);

  boolean isDue(Instant now, double paGauge, double noticeablePa, StationSettings settings) {
    if (computedAt.equals(Instant.MIN) || now.isBefore(computedAt)) {
      return true;
    }
    boolean still = Math.abs(paGauge - computedPaGauge) <= noticeablePa;
    Duration wait = still ? settings.outlookAtLeast() : settings.outlookAtMost();
    return Duration.between(computedAt, now).compareTo(wait) >= 0;
  }
}

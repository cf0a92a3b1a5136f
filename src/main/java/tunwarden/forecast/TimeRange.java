package tunwarden.forecast;

import java.time.Duration;
import java.util.Optional;

/**
 * A forecast time with its 95 % range.
 *
 * @param middle median
 * @param low earliest
 * @param high latest; empty when it may never happen within the horizon
 */
public record TimeRange(Duration middle, Duration low, Optional<Duration> high) {}

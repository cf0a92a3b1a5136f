package tunwarden.assess;

/**
 * One pressure that matters, on the ladder.
 *
 * @param kind what it is
 * @param paGauge where it stands, Pa gauge
 * @param label words beside it, without the number
 */
public record Rung(Kind kind, double paGauge, String label) {
  /** Kinds of rung; limits are drawn differently from forecasts. */
  public enum Kind {
    VESSEL_LIMIT,
    ACCUMULATION,
    RELIEF_SET,
    EARLIEST_LIFT,
    OPERATING_CEILING,
    RESEAT,
    FORECAST,
    NOW,
    ATMOSPHERE,
    VACUUM_LIMIT;

    /** Whether the rung is a fixed limit, not something computed from the readings. */
    public boolean isLimit() {
      return this != FORECAST && this != NOW;
    }
  }
}

package tunwarden.forecast;

/** The futures that are computed for every vessel. */
public enum Scenario {
  /** The estimator run forward, everything staying as it is. */
  TREND,
  /** Cooling lost: at rest at the ambient temperature. */
  WARM,
  /** Cooled down, sealed. */
  CHILL,
  /** Closed now with fermentable extract left. */
  SEAL,
  /** Vented and closed again, at rest. */
  REBOUND,
  /** The supply regulator fails open. */
  SUPPLY_FAILURE,
  /** Where the holding pressure should be for the target carbonation. */
  HOLD
}

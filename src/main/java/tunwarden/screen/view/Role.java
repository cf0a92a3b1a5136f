package tunwarden.screen.view;

/**
 * What a cell means. Colour follows IEC 60073: red for danger, yellow for the abnormal, blue for
 * what a person is asked to do; everything normal is grey. No role stands without a word or sign.
 */
public enum Role {
  NORMAL,
  /** Rules, scales, units and other supporting matter. */
  DIM,
  /** The values themselves. */
  STRONG,
  /** Header and footer lines. */
  BAR,
  BAR_STRONG,
  /** The row a person is on. */
  CHOSEN,
  /** The word that says this is not live. */
  ORIGIN,
  /** Abnormal: look soon. */
  CAUTION,
  CAUTION_BAR,
  /** Danger: act now. */
  DANGER,
  DANGER_BAR,
  /** A question waiting for an answer. */
  ASK,
  /** Measured line in a chart. */
  TRACE,
  /** Second measured line. */
  TRACE_SECOND,
  /** Forecast. */
  FORECAST,
  /** The moment being read out. */
  CURSOR
}

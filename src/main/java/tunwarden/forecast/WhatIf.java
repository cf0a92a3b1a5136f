package tunwarden.forecast;

import java.util.List;
import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;

/**
 * One thing that may happen to a vessel, or be done to it, worked out beforehand.
 *
 * @param kind which
 * @param words what happens, short: "warmed to 24 °C"
 * @param paGauge pressure it comes to with its 95 % range, Pa gauge; empty where it is not about a
 *     pressure
 * @param toLift time until the valve's earliest opening; empty: not reached, or not known
 * @param detail further numbers, metric; may be empty
 * @param assumes what the numbers rest on, one sentence without its full stop
 * @param cautions what to mind before it is done
 */
public record WhatIf(
    Kind kind,
    String words,
    Optional<Spread> paGauge,
    Optional<TimeRange> toLift,
    String detail,
    String assumes,
    List<Caution> cautions) {
  /** Keeps its own copy. */
  public WhatIf {
    cautions = List.copyOf(cautions);
  }

  /** The kinds, those of most weight for the decision first. */
  public enum Kind {
    /** Cooling lost. */
    WARM("warm"),
    /** The supply regulator fails open. */
    SUPPLY("supply"),
    /** Closed with fermentable extract left. */
    SEAL("seal"),
    /** The level to hold for the carbonation wanted. */
    HOLD("hold"),
    /** What the relief valve passes against what may press on it. */
    RELIEF("relief"),
    /** Vented and shut again. */
    REBOUND("vent"),
    /** Cooled shut. */
    CHILL("chill"),
    /** Liquid drawn off with no gas let in. */
    DRAW("draw"),
    /** Caustic has bound the headspace's CO2. */
    CAUSTIC("caustic"),
    /** No headspace left. */
    FULL("full");

    private final String word;

    Kind(String word) {
      this.word = word;
    }

    /** Its name for programs. */
    public String word() {
      return word;
    }
  }
}

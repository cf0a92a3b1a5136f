package tunwarden.forecast.relief;

/**
 * What one source asks of the relief valve.
 *
 * @param source which
 * @param kgPerS flow to be let out, kg/s
 * @param capacityKgPerS what the valve passes of that gas, kg/s
 * @param words how the demand was found
 */
public record Demand(Source source, double kgPerS, double capacityKgPerS, String words) {
  /** Credible sources of gas. */
  public enum Source {
    FERMENTATION("fermentation"),
    WARMING("warming"),
    SUPPLY("supply"),
    FIRE("fire");

    private final String word;

    Source(String word) {
      this.word = word;
    }

    /** Its key and its name. */
    public String word() {
      return word;
    }
  }

  /** Share of the valve's capacity that is used, 1 being all of it. */
  public double share() {
    return kgPerS / capacityKgPerS;
  }

  /** Whether the valve passes it. */
  public boolean isMet() {
    return kgPerS <= capacityKgPerS;
  }
}

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
  /** Credible sources of gas, each with the relative 95 % uncertainty of its size, by judgement. */
  public enum Source {
    FERMENTATION("fermentation", 0.2),
    WARMING("warming", 0.1),
    SUPPLY("supply", 0.1),
    FIRE("fire", 0.2);

    private final String word;
    private final double relativeU95;

    Source(String word, double relativeU95) {
      this.word = word;
      this.relativeU95 = relativeU95;
    }

    /** How well its size is known, 95 %, relative. */
    public double relativeU95() {
      return relativeU95;
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

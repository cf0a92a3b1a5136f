package tunwarden.vessel;

/** Where the tolerance of a relief setting comes from. */
public enum ReliefRule {
  /** The user stated it. */
  STATED("tolerance as stated"),
  /** ISO 4126-1:2013/Amd 1:2016. */
  ISO_4126("ISO 4126-1 tolerance"),
  /** ASME BPVC VIII-1 UG-134(d)(1), since 2021 in ASME XIII. */
  ASME("ASME VIII-1 tolerance");

  private final String words;

  ReliefRule(String words) {
    this.words = words;
  }

  /** For a label: "ISO 4126-1 tolerance". */
  public String words() {
    return words;
  }
}

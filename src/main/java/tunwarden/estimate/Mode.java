package tunwarden.estimate;

/** How the headspace behaves, told by the cellar file or inferred from the readings. */
public enum Mode {
  /** Nothing goes in or out. */
  SEALED("sealed"),
  /** Pinned from outside: a supply, a back-pressure device, an open vent. */
  HELD("held"),
  /** Gas is moving in or out right now. */
  FLOWING("gas moving"),
  /** Too little seen to tell. */
  UNKNOWN("not yet known");

  private final String word;

  Mode(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }
}

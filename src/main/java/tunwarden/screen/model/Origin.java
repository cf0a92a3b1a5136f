package tunwarden.screen.model;

/** Where the readings come from; never left unsaid, so that nobody mistakes one for another. */
public enum Origin {
  LIVE("LIVE"),
  REPLAY("REPLAY"),
  REHEARSAL("REHEARSAL");

  private final String word;

  Origin(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }
}

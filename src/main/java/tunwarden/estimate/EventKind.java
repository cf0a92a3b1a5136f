package tunwarden.estimate;

/** What can happen to a vessel or to its signals. The words are those of the report. */
public enum EventKind {
  VENT("vent"),
  LIFT("lift"),
  CHARGE("charge"),
  LEAK("leak"),
  GAP("gap"),
  FROZEN("frozen"),
  SPIKE("spike"),
  DRIFT("drift"),
  OVER_RELIEF("over-relief"),
  UNEXPLAINED("unexplained"),
  WARMING("warming"),
  COOLING_FAILURE("cooling-failure"),
  MARK("mark");

  private final String word;

  EventKind(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }
}

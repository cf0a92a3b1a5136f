package tunwarden.alarm;

/** How soon a person must act. */
public enum Priority {
  ADVICE("advice"),
  CAUTION("caution"),
  WARNING("warning"),
  HIGH("high");

  private final String word;

  Priority(String word) {
    this.word = word;
  }

  public String word() {
    return word;
  }
}

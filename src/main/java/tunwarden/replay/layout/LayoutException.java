package tunwarden.replay.layout;

/** Why no layout could be made; the file is named by whoever catches it. */
public final class LayoutException extends Exception {
  private final long line;
  private final String field;

  /**
   * Says what is wrong.
   *
   * @param line counted from 1; 0 when the whole file is meant
   * @param field column or option; empty for none
   * @param problem what is wrong and what would be right
   */
  public LayoutException(long line, String field, String problem) {
    super(problem);
    this.line = line;
    this.field = field;
  }

  public long line() {
    return line;
  }

  public String field() {
    return field;
  }
}

package tunwarden.replay.layout;

/**
 * A line from the head of a log, kept to look at before reading.
 *
 * @param number counted from 1
 * @param text without its line end
 */
public record SampledLine(long number, String text) {
  /** Nothing but blanks. */
  public boolean isBlank() {
    return text.isBlank();
  }

  /** Starts with {@code #}. */
  public boolean isComment() {
    return text.startsWith("#");
  }
}

package tunwarden.replay;

import tunwarden.units.BadInputException;

/** A log that cannot be used; the message is one sentence that names file, line and field. */
public final class BadLogException extends BadInputException {
  private static final long serialVersionUID = 1;

  private final String file;
  private final long line;
  private final String field;

  /**
   * Builds the sentence.
   *
   * @param file name as the user gave it
   * @param line counted from 1; 0 when the whole file is meant
   * @param field column or option concerned; empty for none
   * @param problem what is wrong and what would be right
   */
  public BadLogException(String file, long line, String field, String problem) {
    super(
        file
            + (line > 0 ? ", line " + line : "")
            + (field.isEmpty() ? "" : ", " + field)
            + ": "
            + problem);
    this.file = file;
    this.line = line;
    this.field = field;
  }

  public String file() {
    return file;
  }

  /** Counted from 1; 0 when the whole file is meant. */
  public long line() {
    return line;
  }

  /** Column or option concerned; empty for none. */
  public String field() {
    return field;
  }
}

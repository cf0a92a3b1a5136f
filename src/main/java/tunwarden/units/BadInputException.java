package tunwarden.units;

/**
 * Something a person gave cannot be used: a wrong value, file, line or option. The message is one
 * plain sentence that names it and says what would be right; the program prints it and exits with
 * code 2.
 */
public class BadInputException extends IllegalArgumentException {
  private static final long serialVersionUID = 1;

  public BadInputException(String sentence) {
    super(sentence);
  }

  public BadInputException(String sentence, Throwable cause) {
    super(sentence, cause);
  }
}

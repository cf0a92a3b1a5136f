package tunwarden.units;

/** A text that is not the quantity asked for; the message is one sentence fit for the user. */
public final class BadQuantityException extends BadInputException {
  private static final long serialVersionUID = 1;

  public BadQuantityException(String message) {
    super(message);
  }
}

package tunwarden.screen.terminal;

/** There is nothing to draw on; the message is one sentence fit for the user. */
public final class NoTerminalException extends RuntimeException {
  public NoTerminalException(String message) {
    super(message);
  }
}

package tunwarden.serial;

import java.io.IOException;

/** A serial port that cannot be used; the message is one sentence fit for the user. */
public final class PortException extends IOException {
  private static final long serialVersionUID = 1L;

  private final Reason reason;

  /** Why a port cannot be used. */
  public enum Reason {
    /** There is no such port now. */
    ABSENT("port missing"),
    /** The user may not open it. */
    DENIED("no permission"),
    /** Another program holds it. */
    BUSY("port busy"),
    /** It was there and has gone. */
    GONE("port gone"),
    /** It is no serial port, or refuses these settings. */
    REFUSED("port refused");

    private final String words;

    Reason(String words) {
      this.words = words;
    }

    /** Two words for the screen. */
    public String words() {
      return words;
    }
  }

  /** A reason with its sentence. */
  public PortException(Reason reason, String message) {
    super(message);
    this.reason = reason;
  }

  public Reason reason() {
    return reason;
  }
}

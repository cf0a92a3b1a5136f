package tunwarden.serial;

/** How a serial line is doing, in words for a screen. */
public enum LinkState {
  STARTING("starting"),
  OPEN("open"),
  SILENT("open, but silent"),
  GARBLED("open, but unreadable: wrong baud rate, parity or wiring?"),
  FOREIGN("open, but no line holds what the profile describes"),
  ENDLESS("open, but no line end comes: wrong line end in the profile?"),
  MISSING("port missing, waiting for it"),
  LOST("port lost, re-opening"),
  DENIED("no permission to open the port"),
  BUSY("port held by another program"),
  REFUSED("port cannot be used"),
  CLOSED("closed");

  private final String words;

  LinkState(String words) {
    this.words = words;
  }

  public String words() {
    return words;
  }

  /** Whether bytes can come in. */
  public boolean isOpen() {
    return this == OPEN || this == SILENT || this == GARBLED || this == FOREIGN || this == ENDLESS;
  }

  static LinkState of(PortException.Reason reason) {
    return switch (reason) {
      case ABSENT -> MISSING;
      case DENIED -> DENIED;
      case BUSY -> BUSY;
      case GONE -> LOST;
      case REFUSED -> REFUSED;
    };
  }
}

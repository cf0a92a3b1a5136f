package tunwarden.serial;

import tunwarden.wire.profile.LineSettings;

/** Opens serial lines. */
@FunctionalInterface
public interface ByteLinkFactory {
  /** What the reader is going to do, which decides how it best waits. */
  enum Use {
    /** Listen to what comes unasked. */
    LISTEN,
    /** Ask, and wait for short answers. */
    ASK
  }

  /**
   * Opens a port, always through a fresh object of the serial library.
   *
   * @throws PortException when it cannot be opened, with a sentence for the user
   */
  ByteLink open(String port, LineSettings settings, Use use) throws PortException;

  /**
   * What the port's name leads to at this moment: another answer than at opening means that the
   * port was unplugged or came back as something else, even where the open line does not say so.
   */
  default String behind(String port) {
    return port;
  }
}

package tunwarden.serve;

import java.net.InetAddress;
import java.net.InetSocketAddress;
import java.net.UnknownHostException;
import tunwarden.units.BadInputException;

/** Reads {@code 127.0.0.1:9470}, {@code [::1]:9470}, {@code localhost:9470}. */
public final class ServeAddress {
  /** Where the program listens when nothing is said. */
  public static final String USUAL = "127.0.0.1:9470";

  private ServeAddress() {}

  /**
   * The address and port in a text.
   *
   * @throws BadInputException when it is not one
   */
  public static InetSocketAddress parse(String text) {
    int colon = text.lastIndexOf(':');
    String host = colon < 0 ? "" : text.substring(0, colon);
    if (host.startsWith("[") && host.endsWith("]")) {
      host = host.substring(1, host.length() - 1);
    }
    try {
      int port = Integer.parseInt(text.substring(colon + 1));
      if (host.isEmpty() || port < 0 || port > 65_535) {
        throw bad(text);
      }
      return new InetSocketAddress(InetAddress.getByName(host), port);
    } catch (NumberFormatException | UnknownHostException notOne) {
      throw bad(text);
    }
  }

  private static BadInputException bad(String text) {
    return new BadInputException(
        "'" + text + "' is not an address to serve on; write for example " + USUAL);
  }
}

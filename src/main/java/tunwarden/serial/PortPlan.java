package tunwarden.serial;

import java.util.List;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.LineSettings;
import tunwarden.wire.profile.Speaks;

/**
 * What is to be read over one serial port.
 *
 * @param port name of the port as the operating system knows it; on Linux preferably the link under
 *     {@code /dev/serial/by-id}, which survives a change of socket
 * @param bindings at least one; all speak alike and use the same line settings
 */
public record PortPlan(String port, List<Binding> bindings) {
  /**
   * Refuses a line on which instruments would not understand each other.
   *
   * @throws IllegalArgumentException with a sentence for the user
   */
  public PortPlan {
    bindings = List.copyOf(bindings);
    if (bindings.isEmpty()) {
      throw new IllegalArgumentException("nothing is to be read over " + port);
    }
    Binding first = bindings.get(0);
    for (Binding other : bindings) {
      if (other.profile().speaks() != first.profile().speaks()
          || !other.profile().line().equals(first.profile().line())) {
        throw new IllegalArgumentException(
            "instruments on "
                + port
                + " must speak alike at the same line settings, but "
                + first.profile().name()
                + " and "
                + other.profile().name()
                + " differ");
      }
    }
  }

  public Speaks speaks() {
    return bindings.get(0).profile().speaks();
  }

  public LineSettings line() {
    return bindings.get(0).profile().line();
  }
}

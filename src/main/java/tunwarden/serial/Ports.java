package tunwarden.serial;

import com.fazecast.jSerialComm.SerialPort;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** The serial ports of this machine. Enumerated on demand only, never in a loop. */
public final class Ports {
  private Ports() {}

  /**
   * One port.
   *
   * @param name what to write into the cellar file
   * @param description what the system says is behind it
   * @param serialNumber of a USB adapter; empty where the system does not tell
   */
  public record Port(String name, String description, String serialNumber) {}

  /** All ports there are now, by name. */
  public static List<Port> list() {
    List<Port> ports = new ArrayList<>();
    for (SerialPort port : SerialPort.getCommPorts()) {
      ports.add(
          new Port(
              port.getSystemPortPath().replace("\\\\.\\", ""),
              port.getPortDescription(),
              known(port.getSerialNumber())));
    }
    ports.sort(Comparator.comparing(Port::name));
    return ports;
  }

  private static String known(String text) {
    return text == null || text.equalsIgnoreCase("unknown") ? "" : text;
  }
}

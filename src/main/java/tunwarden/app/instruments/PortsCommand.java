package tunwarden.app.instruments;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import tunwarden.serial.Ports;

/** Lists the serial ports of this machine. */
@Command(
    name = "ports",
    description = "Lists the serial ports of this machine, with what the system knows of each.",
    mixinStandardHelpOptions = true,
    footerHeading = "%nExample:%n",
    footer = "  tunwarden instruments ports")
final class PortsCommand implements Runnable {
  @Spec private CommandSpec spec;

  @Override
  public void run() {
    PrintWriter out = spec.commandLine().getOut();
    List<Ports.Port> ports = Ports.list();
    if (ports.isEmpty()) {
      out.println("No serial port was found; plug the adapter in and look again.");
    }
    for (Ports.Port port : ports) {
      String serial = port.serialNumber().isEmpty() ? "" : "  serial number " + port.serialNumber();
      out.printf(Locale.ROOT, "%-22s %s%s%n", port.name(), port.description(), serial);
    }
  }
}

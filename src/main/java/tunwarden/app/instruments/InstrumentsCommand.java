package tunwarden.app.instruments;

import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import tunwarden.app.options.Entry;
import tunwarden.app.options.Group;

/** Everything about instruments that needs no cellar file. */
@Command(
    name = "instruments",
    description = "Device profiles, serial ports, and what a line says.",
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden instruments ports",
      "  tunwarden instruments listen /dev/ttyUSB0",
      "  tunwarden instruments listen /dev/ttyUSB0 --guess > devices/my-gauge.json",
      "  tunwarden instruments check devices/my-gauge.json"
    })
public final class InstrumentsCommand implements Runnable, Group {
  @Spec private CommandSpec spec;

  @Override
  public List<Entry> members() {
    return List.of(
        Entry.of("list", ListCommand.class),
        Entry.of("ports", PortsCommand.class),
        Entry.of("check", CheckCommand.class),
        Entry.of("listen", ListenCommand.class),
        Entry.of("probe", ProbeCommand.class));
  }

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }
}

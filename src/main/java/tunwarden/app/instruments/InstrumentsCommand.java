package tunwarden.app.instruments;

import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** Everything about instruments that needs no cellar file. */
@Command(
    name = "instruments",
    description = "Device profiles, serial ports, and what a line says.",
    mixinStandardHelpOptions = true,
    subcommands = {
      ListCommand.class,
      PortsCommand.class,
      CheckCommand.class,
      ListenCommand.class,
      ProbeCommand.class
    },
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden instruments ports",
      "  tunwarden instruments listen /dev/ttyUSB0",
      "  tunwarden instruments listen /dev/ttyUSB0 --guess > devices/my-gauge.json",
      "  tunwarden instruments check devices/my-gauge.json"
    })
public final class InstrumentsCommand implements Runnable {
  @Spec private CommandSpec spec;

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }
}

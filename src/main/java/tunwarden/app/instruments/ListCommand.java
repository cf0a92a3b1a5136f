package tunwarden.app.instruments;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Locale;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tunwarden.config.profile.Profiles;
import tunwarden.units.BadInputException;
import tunwarden.wire.profile.Profile;

/** Lists the device profiles, or prints one to start one's own from. */
@Command(
    name = "list",
    description = "Lists the device profiles there are: those in ./devices, and those shipped.",
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden instruments list",
      "  tunwarden instruments list --print modbus-rtu-float > devices/my-gauge.json"
    })
final class ListCommand implements Runnable {
  @Option(
      names = "--print",
      paramLabel = "NAME",
      description = "Print a shipped profile, to start your own from.")
  private String print;

  @Parameters(
      arity = "0..1",
      paramLabel = "FOLDER",
      defaultValue = "",
      description = "Where your cellar file is. Default: the working directory.")
  private Path folder;

  @Spec private CommandSpec spec;

  @Override
  public void run() {
    PrintWriter out = spec.commandLine().getOut();
    if (print == null) {
      Profiles.all(folder).values().forEach(profile -> row(profile, out));
      return;
    }
    if (!Profiles.SHIPPED.contains(print)) {
      String known = String.join(", ", Profiles.SHIPPED);
      throw new BadInputException("no profile '" + print + "' is shipped; there are " + known);
    }
    out.print(Profiles.shippedText(print));
  }

  private static void row(Profile profile, PrintWriter out) {
    String fields = String.join(" ", profile.fields().keySet());
    String speaks = profile.speaks().word();
    String line = profile.line().words();
    out.printf(Locale.ROOT, "%-22s %-11s %-10s %s%n", profile.name(), speaks, line, fields);
    out.println("    " + profile.title());
  }
}

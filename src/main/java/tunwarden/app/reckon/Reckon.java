package tunwarden.app.reckon;

import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import tunwarden.app.options.Entry;
import tunwarden.app.options.Group;

/** Heading of the kinds of answer. */
@Command(
    name = "reckon",
    description = {
      "One answer without instruments: dissolved gas, holding pressure, warming, venting.",
      "Every answer names its model, its 95 %% uncertainty and what to mind."
    },
    mixinStandardHelpOptions = true,
    synopsisSubcommandLabel = "KIND",
    commandListHeading = "%nKinds:%n",
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden reckon dissolved --pressure '1.0 bar' --temperature '4 C' --liquid beer",
      "  tunwarden reckon hold --help"
    })
public final class Reckon implements Runnable, Group {
  private static final List<Entry> KINDS =
      List.of(
          Entry.of("dissolved", Dissolved.class),
          Entry.of("hold", Hold.class),
          Entry.of("warm", Warm.class),
          Entry.of("chill", Chill.class),
          Entry.of("vent", VentTrial.class),
          Entry.of("seal", Sealing.class),
          Entry.of("supply", SupplyTrial.class),
          Entry.of("relief", ReliefCheck.class),
          Entry.of("vacuum", VacuumCheck.class),
          Entry.of("solubility", Solubility.class),
          Entry.of("flow", Flow.class));

  @Spec private CommandSpec spec;

  @Override
  public List<Entry> members() {
    return KINDS;
  }

  @Override
  public void run() {
    throw new ParameterException(
        spec.commandLine(),
        "Name what to reckon: " + String.join(", ", spec.subcommands().keySet()));
  }
}

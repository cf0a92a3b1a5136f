package tunwarden.app.cellar;

import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import tunwarden.app.options.Entry;
import tunwarden.app.options.Group;

/** Heading of what can be done with a cellar file. */
@Command(
    name = "cellar",
    description = "Writes a cellar file by asking, or checks one.",
    mixinStandardHelpOptions = true,
    synopsisSubcommandLabel = "new|check",
    commandListHeading = "%nCommands:%n",
    footerHeading = "%nExamples:%n",
    footer = {"  tunwarden cellar new", "  tunwarden cellar check cellar.toml"})
public final class CellarCommand implements Runnable, Group {
  @Spec private CommandSpec spec;

  @Override
  public List<Entry> members() {
    return List.of(Entry.of("new", CellarNew.class), Entry.of("check", CellarCheck.class));
  }

  @Override
  public void run() {
    throw new ParameterException(spec.commandLine(), "Say what to do: cellar new or cellar check");
  }
}

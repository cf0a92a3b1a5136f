package tunwarden.app.alarms;

import java.io.IOException;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;
import tunwarden.journal.request.Request.Deed;

/** {@code alarms note}: a remark. */
@Command(
    name = "note",
    description = "Writes a remark into the journal and the record.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {"  tunwarden alarms note 'new gauge fitted' --vessel FV2 --data data"})
public final class WriteNote implements Callable<Integer> {
  @Parameters(paramLabel = "TEXT", description = "What to remember.")
  private String text;

  @Mixin private Asking asking = new Asking();

  @Override
  public Integer call() throws IOException {
    return asking.ask(Deed.NOTE, Optional.empty(), text, Optional.empty());
  }
}

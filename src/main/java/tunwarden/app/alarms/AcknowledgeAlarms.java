package tunwarden.app.alarms;

import java.io.IOException;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tunwarden.journal.request.Request.Deed;

/** {@code alarms acknowledge}: somebody has seen it. */
@Command(
    name = "acknowledge",
    description = "Says that somebody has seen an alarm, or all that wait.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden alarms acknowledge --data data --word 'seen, on my way'",
      "  tunwarden alarms acknowledge margin-low --vessel FV2 --data data"
    })
public final class AcknowledgeAlarms implements Callable<Integer> {
  @Parameters(
      paramLabel = "ALARM",
      arity = "0..1",
      description = "Which, by its name in the list; without it all.")
  private String alarm;

  @Option(names = "--word", paramLabel = "TEXT", description = "What to say about it.")
  private String word = "";

  @Mixin private Asking asking = new Asking();

  @Override
  public Integer call() throws IOException {
    return asking.ask(
        Deed.ACKNOWLEDGE, Optional.ofNullable(alarm).map(Asking::alarm), word, Optional.empty());
  }
}

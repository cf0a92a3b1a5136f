package tunwarden.app.alarms;

import java.io.IOException;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tunwarden.journal.request.Request.Deed;

/** {@code alarms shelve}: away for a while. */
@Command(
    name = "shelve",
    description = "Puts an alarm away for a while, with a reason; it comes back by itself.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden alarms shelve leak --vessel FV2 --for '2 h' --word 'seal on order' --data data"
    })
public final class ShelveAlarm implements Callable<Integer> {
  @Parameters(paramLabel = "ALARM", description = "Which, by its name in the list.")
  private String alarm;

  @Option(
      names = "--for",
      paramLabel = "TIME",
      required = true,
      description = "How long, such as '2 h'; as a rule at most 24 h.")
  private String length;

  @Option(
      names = "--word",
      paramLabel = "TEXT",
      required = true,
      description = "Why, for the next person.")
  private String word;

  @Mixin private Asking asking = new Asking();

  @Override
  public Integer call() throws IOException {
    return asking.ask(
        Deed.SHELVE, Optional.of(Asking.alarm(alarm)), word, Optional.of(Asking.span(length)));
  }
}

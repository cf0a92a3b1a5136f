package tunwarden.app.alarms;

import java.io.IOException;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tunwarden.journal.request.Request.Deed;

/** {@code alarms out-of-service}: silent until put back. */
@Command(
    name = "out-of-service",
    description = "Takes an alarm out of service until it is put back, with a reason.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden alarms out-of-service vacuum --vessel FV2 --word 'open for cleaning' --data data"
    })
public final class AlarmOutOfService implements Callable<Integer> {
  @Parameters(paramLabel = "ALARM", description = "Which, by its name in the list.")
  private String alarm;

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
        Deed.OUT_OF_SERVICE, Optional.of(Asking.alarm(alarm)), word, Optional.empty());
  }
}

package tunwarden.app.alarms;

import java.io.IOException;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;
import tunwarden.journal.request.Request.Deed;

/** {@code alarms in-service}: back in service. */
@Command(
    name = "in-service",
    description = "Puts an alarm back in service.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {"  tunwarden alarms in-service vacuum --vessel FV2 --data data"})
public final class AlarmInService implements Callable<Integer> {
  @Parameters(paramLabel = "ALARM", description = "Which, by its name in the list.")
  private String alarm;

  @Mixin private Asking asking = new Asking();

  @Override
  public Integer call() throws IOException {
    return asking.ask(Deed.IN_SERVICE, Optional.of(Asking.alarm(alarm)), "", Optional.empty());
  }
}

package tunwarden.app.alarms;

import java.io.IOException;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;
import tunwarden.journal.request.Request.Deed;

/** {@code alarms unshelve}: back from the shelf. */
@Command(
    name = "unshelve",
    description = "Takes an alarm off the shelf before its time.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {"  tunwarden alarms unshelve leak --vessel FV2 --data data"})
public final class UnshelveAlarm implements Callable<Integer> {
  @Parameters(paramLabel = "ALARM", description = "Which, by its name in the list.")
  private String alarm;

  @Mixin private Asking asking = new Asking();

  @Override
  public Integer call() throws IOException {
    return asking.ask(Deed.UNSHELVE, Optional.of(Asking.alarm(alarm)), "", Optional.empty());
  }
}

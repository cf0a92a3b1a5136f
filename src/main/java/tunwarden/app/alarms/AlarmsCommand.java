package tunwarden.app.alarms;

import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import tunwarden.app.options.Group;

/** {@code alarms}: the alarms of a running {@code headless}, from another terminal. */
@Command(
    name = "alarms",
    description = {
      "Lists, acknowledges and shelves the alarms of a running headless program, by way of its",
      "data folder: who may write there may do it."
    },
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden alarms list --data data",
      "  tunwarden alarms acknowledge --data data --word 'seen, on my way'",
      "  tunwarden alarms shelve leak --vessel FV2 --for '2 h' --word 'seal on order' --data data",
      "  tunwarden alarms note 'new gauge fitted' --vessel FV2 --data data"
    })
public final class AlarmsCommand implements Runnable, Group {
  @Spec private CommandSpec spec;

  @Override
  public List<Class<?>> members() {
    return List.of(
        ListAlarms.class,
        AcknowledgeAlarms.class,
        ShelveAlarm.class,
        UnshelveAlarm.class,
        AlarmOutOfService.class,
        AlarmInService.class,
        WriteNote.class);
  }

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }
}

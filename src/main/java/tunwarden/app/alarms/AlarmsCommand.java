package tunwarden.app.alarms;

import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import tunwarden.app.options.Entry;
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
  public List<Entry> members() {
    return List.of(
        Entry.of("list", ListAlarms.class),
        Entry.of("acknowledge", AcknowledgeAlarms.class),
        Entry.of("shelve", ShelveAlarm.class),
        Entry.of("unshelve", UnshelveAlarm.class),
        Entry.of("out-of-service", AlarmOutOfService.class),
        Entry.of("in-service", AlarmInService.class),
        Entry.of("note", WriteNote.class));
  }

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }
}

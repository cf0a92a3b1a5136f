package tunwarden.app.alarms;

import java.io.IOException;
import java.io.PrintWriter;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmSettings;
import tunwarden.journal.SavedState;
import tunwarden.journal.disk.RealDisk;

/** {@code alarms list}: all that are not normal, as last saved, whether the program runs or not. */
@Command(
    name = "list",
    description = "Lists the alarms that are not normal, as the program saved them last.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden alarms list --data data",
      "  tunwarden alarms list --vessel FV2 --data data"
    })
public final class ListAlarms implements Callable<Integer> {
  @Spec private CommandSpec spec;

  @Mixin private Asking asking = new Asking();

  @Override
  public Integer call() throws IOException {
    PrintWriter out = spec.commandLine().getOut();
    Optional<SavedState> saved =
        SavedState.read(new RealDisk(), asking.data().resolve("state.json"), AlarmSettings.DEFAULT);
    List<Alarm> alarms = saved.map(state -> state.book().alarms()).orElse(List.of());
    int shown = 0;
    for (Alarm alarm : alarms) {
      if (asking.vessel().isEmpty() || asking.vessel().equals(alarm.vessel())) {
        print(alarm, out);
        shown++;
      }
    }
    String when = saved.map(state -> ", as saved at " + state.savedAt()).orElse("");
    out.println(shown == 0 ? "No alarms" + when + "." : shown + " alarm(s)" + when + ".");
    return 0;
  }

  private static void print(Alarm alarm, PrintWriter out) {
    out.println((alarm.vessel() + " " + alarm.kind().id()).strip() + ": " + alarm.state().word());
    String until = alarm.shelvedUntil().map(end -> ", shelved until " + end).orElse("");
    out.println("  " + alarm.priority().word() + ", since " + alarm.since() + until);
    out.println("  " + alarm.text());
    out.println("  " + alarm.action());
    if (!alarm.remark().isEmpty()) {
      out.println("  Said: " + alarm.remark());
    }
  }
}

package tunwarden.app.alarms;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.Arrays;
import java.util.Optional;
import java.util.stream.Collectors;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import picocli.CommandLine.Spec.Target;
import tunwarden.alarm.AlarmKind;
import tunwarden.journal.disk.RealDisk;
import tunwarden.journal.request.Reply;
import tunwarden.journal.request.Request;
import tunwarden.journal.request.RequestBox;
import tunwarden.units.BadInputException;
import tunwarden.units.Kind;
import tunwarden.units.Quantities;

/** What every such command needs: the folder, the vessel, and asking. */
final class Asking {
  private static final Duration PATIENCE = Duration.ofSeconds(10);
  private static final int REFUSED = 1;

  @Spec(Target.MIXEE)
  private CommandSpec spec;

  @Option(
      names = "--data",
      paramLabel = "DIR",
      required = true,
      description = "Data folder of the running program.")
  private Path data;

  @Option(
      names = "--vessel",
      paramLabel = "ID",
      defaultValue = "",
      description = "Which vessel; without it the station itself.")
  private String vessel;

  String vessel() {
    return vessel;
  }

  /**
   * The data folder.
   *
   * @throws BadInputException when there is none
   */
  Path data() {
    if (!Files.isDirectory(data)) {
      throw new BadInputException(
          data + " is no data folder; give with --data the one headless was started with.");
    }
    return data;
  }

  /**
   * The alarm of that name.
   *
   * @throws BadInputException naming those there are
   */
  static AlarmKind alarm(String id) {
    return AlarmKind.ofId(id)
        .orElseThrow(
            () ->
                new BadInputException(
                    "There is no alarm '"
                        + id
                        + "'; there are "
                        + Arrays.stream(AlarmKind.values())
                            .map(AlarmKind::id)
                            .collect(Collectors.joining(", "))
                        + "."));
  }

  /**
   * A time such as {@code 2 h}.
   *
   * @throws BadInputException when it is none
   */
  static Duration span(String text) {
    return Duration.ofMillis(Math.round(Quantities.parse(text, Kind.DURATION) * 1000));
  }

  /** Asks, prints what came of it, and returns the exit code. */
  int ask(Request.Deed deed, Optional<AlarmKind> alarm, String word, Optional<Duration> length)
      throws IOException {
    RequestBox box = new RequestBox(new RealDisk(), data().resolve("requests"));
    Request request = new Request(deed, vessel, alarm, word, length, Instant.now());
    Optional<Reply> reply = box.ask(request, PATIENCE);
    if (reply.isEmpty()) {
      spec.commandLine()
          .getErr()
          .println("Nobody answers in " + data + "; is headless running with this folder?");
      return REFUSED;
    }
    if (!reply.get().done()) {
      spec.commandLine().getErr().println("Refused: " + reply.get().text() + ".");
      return REFUSED;
    }
    spec.commandLine().getOut().println(reply.get().text());
    return 0;
  }
}

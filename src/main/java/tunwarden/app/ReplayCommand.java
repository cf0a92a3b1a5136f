package tunwarden.app;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tunwarden.app.board.LogDashboard;
import tunwarden.app.options.ScreenOptions;
import tunwarden.app.options.VesselOptions;
import tunwarden.units.BadInputException;

/** {@code replay}: the dashboard over a recorded or foreign log. */
@Command(
    name = "replay",
    description = "Plays a recorded log, also another logger's CSV, through the dashboard.",
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden replay replay-logs/cooling-lost.csv --pace 60 --volume 2000L --fill 1800L \\",
      "      --liquid beer --relief '1.5 bar'",
      "  tunwarden replay monday.csv --cellar cellar.toml --vessel FV2"
    })
public final class ReplayCommand implements Callable<Integer> {
  private static final Set<String> NOT_FOR_REPORTS =
      Set.of("replay", "--ascii", "--window", "--bell");

  @Spec private CommandSpec spec;

  @Parameters(paramLabel = "LOG", description = "The log, CSV, plain or .gz.")
  private Path log;

  @Option(
      names = "--pace",
      paramLabel = "N",
      description = "Times real time, above 0 to 10000 (default: ${DEFAULT-VALUE}).",
      defaultValue = "60")
  private double pace;

  @Mixin private LogChoice choice = new LogChoice();
  @Mixin private VesselOptions vesselOptions = new VesselOptions();
  @Mixin private ScreenOptions screen = new ScreenOptions();

  @Override
  public Integer call() throws IOException {
    if (!(pace > 0) || !(pace <= 10_000)) {
      throw new BadInputException("--pace: write a number above 0 and up to 10000");
    }
    LogChoice.Played played = choice.played(log, vesselOptions);
    LogDashboard.run(
        played.log(), played.vessels(), played.alarms(), pace, reportCommand(), Fronts.of(screen));
    return 0;
  }

  /** The command that makes a report of what is being replayed. */
  private String reportCommand() {
    List<String> words = new ArrayList<>(List.of(Main.NAME, "report"));
    Iterator<String> given =
        spec.commandLine().getParent().getParseResult().originalArgs().iterator();
    while (given.hasNext()) {
      String word = given.next();
      if (word.equals("--pace") || word.equals("--theme") || word.equals("--glyphs")) {
        given.next();
      } else if (!NOT_FOR_REPORTS.contains(word) && !word.startsWith("--pace=")) {
        words.add(word);
      }
    }
    return String.join(" ", words);
  }
}

package tunwarden.app;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Help;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Mixin;
import tunwarden.app.alarms.AlarmsCommand;
import tunwarden.app.board.HeadStart;
import tunwarden.app.board.RehearsalDashboard;
import tunwarden.app.cellar.CellarCommand;
import tunwarden.app.instruments.InstrumentsCommand;
import tunwarden.app.options.Commands;
import tunwarden.app.options.Entry;
import tunwarden.app.options.ScreenOptions;
import tunwarden.app.reckon.Reckon;
import tunwarden.config.CellarFile;

/**
 * The program's entry. It only finds the command that was asked for, runs it, and turns what went
 * wrong into one sentence and an exit code: 0 success, 1 the answer is "no" or the work failed, 2 a
 * usage or input error.
 */
@Command(
    name = Main.NAME,
    description = {
      "Watches drink kept under pressure: how much gas it holds, where the pressure is heading,",
      "what comes out if it is vented, how far it is from the relief setting.",
      "Advice beside the instruments, never a safety function."
    },
    mixinStandardHelpOptions = true,
    versionProvider = Main.Version.class,
    sortOptions = false,
    commandListHeading = "%nCommands:%n",
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden reckon dissolved --pressure '1.0 bar' --temperature '4 C' --liquid beer",
      "  tunwarden reckon warm --help",
      "  tunwarden cellar check cellar.toml",
      "",
      "Exit codes: 0 done, 1 the answer is no or the work failed, 2 wrong usage or input."
    })
public final class Main implements Callable<Integer> {
  static final String NAME = "tunwarden";

  /** Every command, in the order the help lists them; add a class here to add a command. */
  private static final List<Entry> COMMANDS =
      List.of(
          Entry.of("watch", WatchCommand.class),
          Entry.of("replay", ReplayCommand.class),
          Entry.of("report", ReportCommand.class),
          Entry.of("headless", HeadlessCommand.class),
          Entry.of("alarms", AlarmsCommand.class),
          Entry.of("reckon", Reckon.class),
          Entry.of("rehearse", RehearseCommand.class),
          Entry.of("instruments", InstrumentsCommand.class),
          Entry.of("cellar", CellarCommand.class),
          Entry.of("completion", CompletionCommand.class),
          Entry.of("manual", ManualCommand.class));

  private static final Set<String> DASHBOARDS = Set.of("", "watch", "replay");
  private static final int HELP_WIDTH = 90;

  @Mixin private ScreenOptions screen = new ScreenOptions();

  /** Runs the program and ends the process with its exit code. */
  public static void main(String[] args) {
    String first = args.length == 0 ? "" : args[0];
    if (DASHBOARDS.contains(first)) {
      HeadStart.begin(first.equals("watch"));
    }
    int code;
    try (PrintWriter out = Streams.standardOut();
        PrintWriter err = Streams.standardErr()) {
      code = run(out, err, args);
    }
    System.exit(code);
  }

  /** Runs the program in process, writing to the given streams; returns the exit code. */
  public static int run(PrintWriter out, PrintWriter err, String... args) {
    int code = args.length == 0 ? alone(out, err) : commandLine(out, err, args).execute(args);
    out.flush();
    err.flush();
    return code;
  }

  /** Without arguments there is nothing to parse, and the dashboard is up a fifth sooner. */
  private static int alone(PrintWriter out, PrintWriter err) {
    try {
      return new Main().call();
    } catch (IOException | RuntimeException fault) {
      return Faults.execution(fault, commandLine(out, err), null);
    }
  }

  private static CommandLine commandLine(PrintWriter out, PrintWriter err, String... args) {
    return commandLine(args).setOut(out).setErr(err);
  }

  /** The parser with every command, as completion and manual page need it. */
  public static CommandLine commandLine() {
    return commandLine(new String[0]);
  }

  private static CommandLine commandLine(String... args) {
    CommandLine line = new CommandLine(new Main());
    Commands.add(line, COMMANDS, args, 0);
    return line.setColorScheme(Help.defaultColorScheme(Help.Ansi.OFF))
        .setUsageHelpWidth(HELP_WIDTH)
        .setExpandAtFiles(false)
        .setParameterExceptionHandler(Faults::usage)
        .setExecutionExceptionHandler(Faults::execution);
  }

  /**
   * Without a command: the cellar file's instruments, or a rehearsal where there is no such file.
   */
  @Override
  public Integer call() throws IOException {
    Path cellarFile = Path.of(CellarFile.USUAL_NAME);
    if (Files.exists(cellarFile)) {
      WatchCommand.watch(cellarFile, Optional.empty(), screen);
    } else {
      RehearsalDashboard.run(Fronts.of(screen));
    }
    return 0;
  }

  /** The version that the build wrote into the jar. */
  static final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() {
      String version = Main.class.getPackage().getImplementationVersion();
      return new String[] {NAME + " " + (version == null ? "(not packaged)" : version)};
    }
  }
}

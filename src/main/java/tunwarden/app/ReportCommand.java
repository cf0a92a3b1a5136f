package tunwarden.app;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.Duration;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tunwarden.app.options.VesselOptions;
import tunwarden.estimate.Estimators;
import tunwarden.report.Reporter;
import tunwarden.report.otherwise.WhatIf;
import tunwarden.report.story.Chapter;
import tunwarden.units.BadInputException;
import tunwarden.units.Kind;
import tunwarden.units.Quantities;

/** Tells what happened in a log. */
@Command(
    name = "report",
    description = {
      "Tells what happened in a log: whether the relief valve lifted, what left the vessel, whether",
      "the sensors can be believed, how close it came and what would have come next."
    },
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden report replay-logs/cooling-lost.csv --volume '2000 L' --fill '1800 L' \\",
      "      --liquid beer --relief '1.5 bar' --html day.html",
      "  tunwarden report logger.csv --cellar cellar.toml --vessel FV2 --zone Europe/Vienna \\",
      "      --columns time=Zeit,pressure=Druck/mbar,temperature=T/C --json -",
      "  tunwarden report day.csv ... --what-if relief=1.2bar,vent=08:30@0.3bar --html try.html",
      "  tunwarden report one.csv two.csv --compare ... --html both.html",
      "  tunwarden report tunwarden-data/readings --cellar cellar.toml --html pages"
    })
final class ReportCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;

  @Parameters(
      arity = "1..*",
      paramLabel = "LOG",
      description = {
        "Logs of one vessel, in any order; .gz is read too. Or one folder: every log in it, and",
        "the logs of every folder in it, are a vessel; then a table is printed."
      })
  private List<Path> logs;

  @Option(
      names = "--json",
      paramLabel = "FILE",
      description = "Report as JSON; - is standard output. For a folder: a folder.")
  private String json;

  @Option(
      names = "--series",
      paramLabel = "FILE",
      description = "Estimate row by row as CSV; - is standard output. For a folder: a folder.")
  private String series;

  @Option(
      names = "--html",
      paramLabel = "FILE",
      description = "Report to print or send. For a folder: a folder.")
  private String html;

  @Option(names = "--every", paramLabel = "TIME", description = "Thin the series, as 60s or 5min.")
  private String every;

  @Option(
      names = "--causal",
      description = "Let the estimate know only what came before, not what came later.")
  private boolean causal;

  @Option(
      names = "--what-if",
      paramLabel = "CHANGES",
      description = "Rerun with relief=PRESSURE or vent=TIME@PRESSURE, or both with a comma.")
  private String whatIf;

  @Option(
      names = "--compare",
      description = "Put the logs, or the vessels named by --vessel, side by side on one page.")
  private boolean compare;

  @Mixin private LogChoice choice = new LogChoice();
  @Mixin private VesselOptions described = new VesselOptions();

  @Override
  public Integer call() throws IOException {
    if (logs.size() == 1 && Files.isDirectory(logs.get(0))) {
      return fleet(logs.get(0));
    }
    List<Reporter.Source> sources = choice.sources(logs, described, compare);
    double ambientPa = sources.get(0).vessel().site().ambientPaAbsolute();
    Reporter.Settings settings =
        settings(Optional.ofNullable(whatIf).map(text -> WhatIf.parse(text, ambientPa)));
    if (series != null && sources.size() > 1) {
      throw new BadInputException("--series: it holds one vessel; leave out --compare");
    }
    Reporter reporter = new Reporter(Estimators.wordless(), settings);
    PrintWriter err = spec.commandLine().getErr();
    List<Chapter> chapters = new ArrayList<>();
    for (Reporter.Source source : sources) {
      Progress progress = new Progress(err, choice.bytes(source));
      choice.reportBytesTo(progress);
      chapters.add(read(reporter, source, progress));
      progress.end();
    }
    chapters.forEach(chapter -> chapter.notes().forEach(note -> err.println("note: " + note)));
    write(chapters);
    return 0;
  }

  private Reporter.Settings settings(Optional<WhatIf> tried) {
    String program = new Main.Version().getVersion()[0];
    return new Reporter.Settings(
        causal, everyOrZero(), tried, choice.zone(), command(), program, html != null);
  }

  private int fleet(Path folder) throws IOException {
    if (compare || whatIf != null) {
      throw new BadInputException(
          (compare ? "--compare" : "--what-if") + ": name logs, not a folder of them");
    }
    Fleet.Outputs outputs =
        new Fleet.Outputs(
            folderOf("--json", json), folderOf("--html", html), folderOf("--series", series));
    PrintWriter err = spec.commandLine().getErr();
    Reporter reporter = new Reporter(Estimators.wordless(), settings(Optional.empty()));
    List<FleetLine> lines =
        new Fleet(reporter, outputs, err).read(choice.members(folder, described));
    spec.commandLine().getOut().print(FleetLine.table(lines));
    return lines.stream().allMatch(line -> line.analysis().isPresent()) ? 0 : 1;
  }

  private static Optional<Path> folderOf(String option, String text) {
    if (text != null && (text.equals("-") || Files.isRegularFile(Path.of(text)))) {
      throw new BadInputException(option + ": for a folder of logs name a folder for the results");
    }
    return Optional.ofNullable(text).map(Path::of);
  }

  private Chapter read(Reporter reporter, Reporter.Source source, Progress progress)
      throws IOException {
    if (series == null) {
      return reporter.read(source, Optional.empty(), progress::rows);
    }
    if (series.equals("-")) {
      PrintWriter out = spec.commandLine().getOut();
      Chapter chapter = reporter.read(source, Optional.of(out), progress::rows);
      out.flush();
      return chapter;
    }
    try (Writer file = Files.newBufferedWriter(Path.of(series))) {
      return reporter.read(source, Optional.of(file), progress::rows);
    }
  }

  private void write(List<Chapter> chapters) throws IOException {
    if (json != null) {
      put(json, Reporter.json(chapters));
    }
    if (html != null) {
      put(html, Reporter.html(chapters));
    }
    if (json == null && html == null && series == null) {
      PrintWriter out = spec.commandLine().getOut();
      for (Chapter chapter : chapters) {
        if (chapters.size() > 1) {
          out.println(chapter.title());
        }
        chapter.story().summary().forEach(out::println);
        chapter.story().cautions().forEach(caution -> out.println("! " + caution));
      }
    }
  }

  private void put(String where, String text) throws IOException {
    if (where.equals("-")) {
      spec.commandLine().getOut().print(text);
    } else {
      Files.writeString(Path.of(where), text);
    }
  }

  private Duration everyOrZero() {
    if (every == null) {
      return Duration.ZERO;
    }
    double seconds = Quantities.parse(every, Kind.DURATION);
    if (!(seconds > 0)) {
      throw new BadInputException("--every: write a time above zero, such as 60s");
    }
    return Duration.ofMillis(Math.round(1000 * seconds));
  }

  /** The command line again, quoted where a shell needs it. */
  private String command() {
    StringBuilder text = new StringBuilder(Main.NAME);
    for (String argument : spec.commandLine().getParent().getParseResult().originalArgs()) {
      boolean plain = argument.matches("[\\w@%+=:,./-]+");
      text.append(' ').append(plain ? argument : "'" + argument.replace("'", "'\\''") + "'");
    }
    return text.toString();
  }

  /** A zone by its name or offset. */
  static ZoneId zone(String text) {
    try {
      return ZoneId.of(text);
    } catch (DateTimeException unknown) {
      throw new BadInputException(
          "--zone: '" + text + "' is not a zone; write Europe/Vienna, +01:00 or UTC", unknown);
    }
  }
}

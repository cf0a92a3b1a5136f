package tunwarden.app;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tunwarden.rehearse.RehearsalLog;
import tunwarden.rehearse.Scenario;
import tunwarden.units.BadInputException;

/** Plays a simulated vessel into a log. */
@Command(
    name = "rehearse",
    description = {
      "Plays a simulated vessel, to practise on or to try an alarm: into a log file, marked as",
      "simulated, or on a serial port, in the language of a device profile. Without a scenario it",
      "lists them."
    },
    mixinStandardHelpOptions = true,
    sortOptions = false,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden rehearse",
      "  tunwarden rehearse cooling-lost --log day.csv",
      "  tunwarden rehearse settled --port /dev/ttyUSB1 --device modbus-rtu-float --address 3",
      "  tunwarden rehearse slow-leak --seed 7 --log leak.csv"
    })
final class RehearseCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;

  @Parameters(arity = "0..1", paramLabel = "SCENARIO", description = "What is to happen.")
  private String word;

  @Option(
      names = "--log",
      paramLabel = "FILE",
      description = "Write the whole log at once; - is standard output.")
  private String log;

  @Option(
      names = "--seed",
      paramLabel = "N",
      description = "The same seed gives the same log. Default: ${DEFAULT-VALUE}.")
  private long seed = 1;

  @Option(
      names = "--port",
      paramLabel = "PORT",
      description = "Play it on this serial port, until Ctrl-C.")
  private String port;

  @Option(
      names = "--device",
      paramLabel = "PROFILE",
      description = "With --port: how to speak. Default: ${DEFAULT-VALUE}.")
  private String device = "text-line";

  @Option(
      names = "--address",
      paramLabel = "N",
      description = "With --port: address on the line. Default: ${DEFAULT-VALUE}.")
  private int address = 1;

  @Option(
      names = "--pace",
      paramLabel = "N",
      description = "With --port: seconds of the vessel in each second. Default: 1.")
  private double pace = 1;

  @Override
  public Integer call() throws IOException {
    PrintWriter out = spec.commandLine().getOut();
    if (word == null) {
      list(out);
      return 0;
    }
    Scenario scenario = scenario();
    if (port != null) {
      return new PortStage(port, device, address, pace).play(scenario, seed, out);
    }
    if (log == null) {
      throw new BadInputException(
          "rehearse: say where the readings are to go with --log FILE or --port PORT");
    }
    if (log.equals("-")) {
      RehearsalLog.write(scenario, seed, out);
      return 0;
    }
    try (Writer file = Files.newBufferedWriter(Path.of(log))) {
      RehearsalLog.write(scenario, seed, file);
    }
    return 0;
  }

  private Scenario scenario() {
    return Scenario.ofWord(word)
        .orElseThrow(
            () ->
                new BadInputException(
                    "rehearse: there is no scenario '"
                        + word
                        + "'; write one of "
                        + Scenario.allWords()));
  }

  private static void list(PrintWriter out) {
    for (Scenario scenario : Scenario.values()) {
      out.printf("%-18s %s%n", scenario.word(), scenario.words());
    }
  }
}

package tunwarden.app.cellar;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tunwarden.config.BadCellarException;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.config.PortPlans;
import tunwarden.units.Display;
import tunwarden.vessel.Vessel;

/** Reads a cellar file and tells everything that is wrong with it, or what it says. */
@Command(
    name = "check",
    description = "Checks a cellar file: every fault with its line and key, or what it describes.",
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {"  tunwarden cellar check", "  tunwarden cellar check lower-cellar.toml"})
final class CellarCheck implements Callable<Integer> {
  private static final int WRONG_INPUT = 2;

  @Parameters(
      arity = "0..1",
      paramLabel = "FILE",
      defaultValue = CellarFile.USUAL_NAME,
      description = "Cellar file. Default: ${DEFAULT-VALUE}.")
  private Path file;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() throws IOException {
    Cellar cellar;
    try {
      cellar = CellarFile.read(file);
      PortPlans.of(cellar);
    } catch (BadCellarException wrong) {
      PrintWriter err = spec.commandLine().getErr();
      wrong.problems().forEach(err::println);
      return WRONG_INPUT;
    }
    describe(cellar, spec.commandLine().getOut());
    return 0;
  }

  private static void describe(Cellar cellar, PrintWriter out) {
    Display display = cellar.alarms().display();
    out.println(cellar.file() + " is sound.");
    for (Vessel vessel : cellar.vessels()) {
      out.println(
          vessel.id()
              + ": "
              + Display.number(100 * vessel.fillM3() / vessel.volumeM3(), 1)
              + " % full of "
              + vessel.liquid().kind().word()
              + vessel
                  .limits()
                  .relief()
                  .map(
                      relief ->
                          ", relief set at "
                              + display.gauge(relief.setPaGauge())
                              + ", may lift from "
                              + display.gauge(relief.earliestLiftPaGauge())
                              + " ("
                              + relief.rule().words()
                              + ")")
                  .orElse(""));
    }
    cellar
        .instruments()
        .forEach(
            instrument ->
                out.println(
                    instrument.vessel()
                        + " "
                        + instrument.quantity().word()
                        + ": "
                        + instrument.device()
                        + " on "
                        + instrument.port()
                        + ", field "
                        + instrument.field()));
  }
}

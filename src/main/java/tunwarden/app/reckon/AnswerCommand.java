package tunwarden.app.reckon;

import java.io.PrintWriter;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tunwarden.app.options.Convert;
import tunwarden.units.Display;

/** What all kinds of answer share: how they are printed. */
@Command(
    mixinStandardHelpOptions = true,
    sortOptions = false,
    abbreviateSynopsis = true,
    requiredOptionMarker = '*',
    optionListHeading = "%nOptions, * required:%n")
abstract class AnswerCommand implements Callable<Integer> {
  private static final int NO = 1;

  @Option(names = "--json", description = "Print one JSON object; keys end in their unit.")
  private boolean json;

  @Option(
      names = "--units",
      paramLabel = "SET",
      converter = Convert.ToDisplay.class,
      description = "Units of the text: metric, us or si. Default: metric.")
  private Display display = Display.METRIC;

  @Spec private CommandSpec spec;

  @Override
  public final Integer call() {
    AnswerSheet sheet = new AnswerSheet(display);
    fill(sheet);
    PrintWriter out = spec.commandLine().getOut();
    if (json) {
      sheet.printJson(out);
    } else {
      sheet.printText(out);
    }
    return sheet.isNo() ? NO : 0;
  }

  /**
   * Works out the answer.
   *
   * @throws tunwarden.units.BadInputException when the input allows none
   */
  abstract void fill(AnswerSheet sheet);
}

package tunwarden.app.options;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.stream.Collectors;
import picocli.CommandLine.Help;

/**
 * The worked examples at the end of a command's help: a text file for each command, with the
 * command after a dollar sign and what it prints under it. They are read only when help is asked
 * for, and a test runs every one of them.
 */
public final class WorkedExamples {
  private static final String FOLDER = "/tunwarden/app/examples/";

  private WorkedExamples() {}

  /**
   * The examples of a command.
   *
   * @param command its whole name, as {@code tunwarden reckon hold}
   */
  public static Optional<String> of(String command) {
    String file = command.substring(command.indexOf(' ') + 1).replace(' ', '-') + ".txt";
    try (InputStream in = WorkedExamples.class.getResourceAsStream(FOLDER + file)) {
      return in == null
          ? Optional.empty()
          : Optional.of(new String(in.readAllBytes(), StandardCharsets.UTF_8));
    } catch (IOException fault) {
      throw new UncheckedIOException(fault);
    }
  }

  /** The footer of a help page: the examples, then what the command itself says. */
  static String footer(Help help) {
    String stated = help.footerHeading();
    String heading = stated.isEmpty() ? String.format("%nExamples:%n%n") : stated;
    String own = of(help.commandSpec().qualifiedName()).map(WorkedExamples::indented).orElse("");
    String all = own + help.footer();
    return all.isEmpty() ? "" : heading + all;
  }

  private static String indented(String text) {
    return text.lines()
        .map(line -> line.isEmpty() ? line : "  " + line)
        .collect(Collectors.joining(System.lineSeparator(), "", System.lineSeparator()));
  }
}

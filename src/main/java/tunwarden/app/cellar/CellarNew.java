package tunwarden.app.cellar;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tunwarden.config.CellarFile;
import tunwarden.config.CellarTemplate;
import tunwarden.units.BadInputException;

/** Writes a commented cellar file from the answers to a few questions. */
@Command(
    name = "new",
    description = {
      "Writes a commented cellar file by asking. What you leave out stays in the file as a",
      "comment that shows how it would be written. An existing file is never touched."
    },
    mixinStandardHelpOptions = true,
    footerHeading = "%nExamples:%n",
    footer = {
      "  tunwarden cellar new",
      "  tunwarden cellar new lower-cellar.toml",
      "  tunwarden cellar new --example"
    })
final class CellarNew implements Callable<Integer> {
  @Parameters(
      arity = "0..1",
      paramLabel = "FILE",
      defaultValue = CellarFile.USUAL_NAME,
      description = "File to write. Default: ${DEFAULT-VALUE}.")
  private Path file;

  @Option(
      names = "--example",
      description = "Print an example with every key filled in, and ask nothing.")
  private boolean example;

  @Spec private CommandSpec spec;

  @Override
  public Integer call() throws IOException {
    PrintWriter out = spec.commandLine().getOut();
    if (example) {
      out.print(CellarTemplate.example());
      return 0;
    }
    refuseExisting();
    BufferedReader in =
        new BufferedReader(new InputStreamReader(System.in, Charset.defaultCharset()));
    String text = new Interview(in, out, file).ask();
    write(text);
    out.println("Wrote " + file + "; see what the instruments say with: tunwarden watch");
    return 0;
  }

  private void refuseExisting() {
    if (Files.exists(file)) {
      throw new BadInputException(
          file + " is there already; name another file, or move it away first");
    }
  }

  /** Whole or not at all: written beside, then given its name, which must still be free. */
  private void write(String text) throws IOException {
    Path folder = file.toAbsolutePath().getParent();
    Path draft = Files.createTempFile(folder, ".cellar", ".toml");
    try {
      Files.writeString(draft, text, StandardCharsets.UTF_8);
      Files.move(draft, file);
    } catch (FileAlreadyExistsException late) {
      refuseExisting();
    } finally {
      Files.deleteIfExists(draft);
    }
  }
}

package tunwarden.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.NoSuchFileException;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import tunwarden.units.BadInputException;

class MainTest {
  @Command(name = "failing")
  private static final class Failing implements Runnable {
    private final RuntimeException fault;

    Failing(RuntimeException fault) {
      this.fault = fault;
    }

    @Override
    public void run() {
      throw fault;
    }
  }

  private static Ran failing(RuntimeException fault) {
    StringWriter err = new StringWriter();
    CommandLine line =
        new CommandLine(new Failing(fault)).setExecutionExceptionHandler(Faults::execution);
    line.setErr(new PrintWriter(err, true));
    int code = line.execute();
    return new Ran(code, "", err.toString());
  }

  @Test
  void versionAndHelpSucceed() {
    assertTrue(Ran.tunwarden("--version").ok().startsWith("tunwarden "));
    String help = Ran.tunwarden("--help").ok();
    assertTrue(help.contains("Examples:"), help);
    assertTrue(help.lines().allMatch(line -> line.length() <= 90), help);
  }

  @Test
  void anUnknownWordIsRefusedInOneSentence() {
    assertEquals(
        "There is no option '--verzion'; did you mean '--version'? (see tunwarden --help)",
        Ran.tunwarden("--verzion").refused());
  }

  @Test
  void badInputIsItsOwnSentenceAndExitCodeTwo() {
    Ran ran = failing(new BadInputException("cellar.toml line 3:\n  fill is odd"));
    assertEquals("cellar.toml line 3: fill is odd", ran.refused());
  }

  @Test
  void aMissingFileIsWrongInputAndALockedOneIsAFailure() {
    IOException missing = new NoSuchFileException("a.csv");
    assertEquals(
        "There is no file a.csv; check the name.",
        failing(new UncheckedIOException(missing)).refused());
    Ran locked = failing(new UncheckedIOException(new AccessDeniedException("a.csv")));
    assertEquals(1, locked.code());
    assertEquals("No permission to use a.csv; check its owner and mode.", locked.err().strip());
  }

  @Test
  void theUnforeseenNamesTheLogAndShowsNoStackTrace() {
    Ran ran = failing(new IllegalStateException("flange"));
    assertEquals(1, ran.code());
    assertEquals(1, ran.err().lines().count());
    assertTrue(ran.err().contains("flange") && ran.err().contains(LogFile.path().toString()));
    assertFalse(ran.err().contains("\tat "));
  }

  /**
   * The name in the list finds a command when it is asked for, the one on its class at other times.
   */
  @Test
  void everyCommandIsFoundByItsOwnName() {
    everyNameHolds(Main.commandLine(), "");
  }

  private static void everyNameHolds(CommandLine line, String path) {
    line.getSubcommands()
        .forEach(
            (name, command) -> {
              String words = (path + " " + name).strip();
              Ran ran = Ran.tunwarden((words + " --help").split(" "));
              assertEquals(0, ran.code(), words + ran.err());
              assertTrue(ran.out().contains("tunwarden " + words), ran.out());
              everyNameHolds(command, words);
            });
  }
}

package tunwarden.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.rehearse.Scenario;

/** The command that plays simulated vessels. */
class RehearseCommandTest {
  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  @TempDir Path folder;

  private int run(String... args) {
    return Main.run(new PrintWriter(out), new PrintWriter(err), args);
  }

  @Test
  void withoutAScenarioItListsThem() {
    assertEquals(0, run("rehearse"));
    for (Scenario scenario : Scenario.values()) {
      assertTrue(out.toString().contains(scenario.word()));
    }
  }

  @Test
  void aLogGoesToAFileOrToStandardOutput() throws Exception {
    Path file = folder.resolve("log.csv");
    assertEquals(0, run("rehearse", "vent-and-return", "--log", file.toString(), "--seed", "3"));
    assertEquals(0, run("rehearse", "vent-and-return", "--log", "-", "--seed", "3"));
    assertEquals(Files.readString(file), out.toString());
  }

  @Test
  void anUnknownScenarioIsToldInOneSentence() {
    assertEquals(2, run("rehearse", "earthquake", "--log", "-"));
    assertTrue(err.toString().contains("'earthquake'") && err.toString().contains("cooling-lost"));
    assertEquals(1, err.toString().lines().count());
  }

  @Test
  void aFolderThatIsMissingIsToldInOneSentence() {
    String file = folder.resolve("none").resolve("log.csv").toString();
    assertEquals(2, run("rehearse", "settled", "--log", file));
    assertEquals(1, err.toString().lines().count());
  }
}

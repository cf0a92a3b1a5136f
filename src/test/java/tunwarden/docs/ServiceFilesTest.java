package tunwarden.docs;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.concurrent.TimeUnit;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.w3c.dom.Document;
import tunwarden.app.Main;

/** The files that start the program with the computer, as far as this machine can try them. */
class ServiceFilesTest {
  private static final Path FILES = Path.of("src/dist/service");

  @TempDir private Path folder;

  @Test
  void systemdFindsNothingToSayAboutTheUnit() throws Exception {
    assumeTrue(isThere("systemd-analyze"), "skipped: no systemd-analyze on this computer");
    String unit = Files.readString(FILES.resolve("tunwarden.service"));
    Path copy = folder.resolve("tunwarden.service");
    // The program is not installed here; any that is stands for it.
    Path java = Path.of(System.getProperty("java.home"), "bin", "java");
    Files.writeString(copy, unit.replace("/opt/tunwarden/bin/tunwarden", java.toString()));
    assertEquals("", verify(copy));
    Files.writeString(copy, Files.readString(copy).replace("RestartSec", "RestartSecs"));
    assertTrue(verify(copy).contains("RestartSecs"), "a mistake would be seen");
  }

  private static boolean isThere(String program) throws InterruptedException {
    try {
      Process process = new ProcessBuilder(program, "--version").start();
      process.getInputStream().readAllBytes();
      return process.waitFor() == 0;
    } catch (IOException absent) {
      return false;
    }
  }

  private static String verify(Path unit) throws Exception {
    Process process =
        new ProcessBuilder("systemd-analyze", "verify", unit.toString())
            .redirectErrorStream(true)
            .start();
    String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    assertTrue(process.waitFor(60, TimeUnit.SECONDS));
    return said.strip();
  }

  @Test
  void theTaskIsXmlAndItsCommandIsOneOfOurs() throws Exception {
    DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
    factory.setNamespaceAware(true);
    Document task =
        factory.newDocumentBuilder().parse(FILES.resolve("tunwarden-task.xml").toFile());
    assertEquals("Task", task.getDocumentElement().getLocalName());
    assertTrue(task.getElementsByTagName("Command").item(0).getTextContent().endsWith(".cmd"));
    parse(task.getElementsByTagName("Arguments").item(0).getTextContent());
  }

  @Test
  void theUnitsCommandIsOneOfOurs() throws IOException {
    String line =
        Files.readAllLines(FILES.resolve("tunwarden.service")).stream()
            .filter(l -> l.startsWith("ExecStart="))
            .findFirst()
            .orElseThrow();
    parse(line.substring(line.indexOf(' ') + 1));
  }

  private static void parse(String words) {
    String[] args = words.split(" ");
    assertDoesNotThrow(() -> Main.commandLine().parseArgs(args), Arrays.toString(args));
  }
}

package tunwarden.app.headless;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.app.Main;

/** The program as a process of its own: signals, exit codes, what is left on the disk. */
class HeadlessProcessTest {
  @TempDir private Path folder;

  @Test
  void sigtermEndsCleanlyWithinTwoSecondsAndAChangedFileIsReadAgain() throws Exception {
    assumeFalse(
        System.getProperty("os.name").startsWith("Windows"), "skipped: signals of Unix only");
    Path cellar = folder.resolve("cellar.toml");
    Files.writeString(
        cellar,
        """
        [vessel.FV2]
        volume = "2000 L"
        fill = "1800 L"
        liquid = { kind = "beer" }
        limits = { relief = "1.5 bar" }
        [vessel.FV2.readings]
        pressure = { device = "text-line", port = "%1$s", field = "P" }
        temperature = { device = "text-line", port = "%1$s", field = "T" }
        """
            .formatted(folder.resolve("no-such-port")));
    Path out = folder.resolve("out.txt");
    Process program =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                System.getProperty("java.class.path"),
                Main.class.getName(),
                "headless",
                "--cellar",
                cellar.toString(),
                "--data",
                folder.resolve("data").toString(),
                "--serve",
                "127.0.0.1:0")
            .redirectErrorStream(true)
            .redirectOutput(out.toFile())
            .start();
    try {
      await(out, () -> Files.readString(out).contains("Serving on"));
      Files.writeString(cellar, Files.readString(cellar) + "# changed\n");
      await(out, () -> Files.readString(out).contains("read again"));
      long begun = System.nanoTime();
      signal(program, "TERM");
      assertTrue(program.waitFor(20, TimeUnit.SECONDS));
      long tookMs = (System.nanoTime() - begun) / 1_000_000;
      assertEquals(0, program.exitValue(), Files.readString(out));
      assertTrue(tookMs < 2000, "ending took " + tookMs + " ms");
      String journal = journal();
      assertTrue(journal.endsWith("\n") && journal.contains("Watching ended."), journal);
      assertFalse(Files.exists(folder.resolve("data/state.json.new")));
    } finally {
      program.destroyForcibly();
    }
  }

  private static void signal(Process process, String name) throws Exception {
    Process kill = new ProcessBuilder("kill", "-" + name, String.valueOf(process.pid())).start();
    assertEquals(0, kill.waitFor());
  }

  private String journal() throws IOException {
    try (var months = Files.list(folder.resolve("data/journal"))) {
      return Files.readString(months.findFirst().orElseThrow());
    }
  }

  private static void await(Path out, Callable<Boolean> condition) throws Exception {
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(40);
    while (!condition.call()) {
      assertTrue(System.nanoTime() < end, Files.readString(out));
      Thread.sleep(50);
    }
  }
}

package tunwarden.app.board;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.app.Main;
import tunwarden.pty.Pty;

/** {@code watch --data} as a process on a terminal made by {@code script}, over a serial port. */
class WatchProcessTest {
  @TempDir private Path folder;
  private volatile boolean speaking = true;
  private Process program;
  private Pty pty;

  @AfterEach
  void end() {
    speaking = false;
    if (program != null) {
      program.descendants().forEach(ProcessHandle::destroyForcibly);
      program.destroyForcibly();
    }
    if (pty != null) {
      pty.close();
    }
  }

  private void speak() {
    while (speaking) {
      pty.send(String.format(Locale.ROOT, "P=%.3f T=5.25\r\n", 0.873));
      try {
        Thread.sleep(200);
      } catch (InterruptedException e) {
        return;
      }
    }
  }

  private void start() throws IOException {
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
        [recording]
        flush = "500 ms"
        """
            .formatted(pty.port()));
    String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    String command =
        String.join(
            " ",
            java,
            "-cp",
            System.getProperty("java.class.path"),
            Main.class.getName(),
            "watch --cellar",
            cellar.toString(),
            "--data",
            folder.resolve("data").toString());
    ProcessBuilder builder = new ProcessBuilder("script", "-qec", command, "/dev/null");
    builder.environment().put("TERM", "xterm");
    program =
        builder
            .redirectErrorStream(true)
            .redirectOutput(folder.resolve("screen.txt").toFile())
            .start();
  }

  private void await(Callable<Boolean> condition) throws Exception {
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(40);
    while (!condition.call()) {
      assertTrue(System.nanoTime() < end, () -> "waited in vain");
      Thread.sleep(50);
    }
  }

  private String content(String below) throws IOException {
    Path directory = folder.resolve(below);
    if (!Files.isDirectory(directory)) {
      return "";
    }
    try (var files = Files.list(directory)) {
      var first = files.findFirst();
      return first.isEmpty() ? "" : Files.readString(first.get());
    }
  }

  @Test
  void termEndsWithoutAFalseAlarmAndTheNextStartGoesOn() throws Exception {
    pty = Pty.plugged(folder);
    assumeTrue(Files.exists(Path.of("/usr/bin/script")), "skipped: this test needs script");
    new Thread(this::speak, "instrument").start();
    for (int life = 0; life < 2; life++) {
      long before = content("data/readings/FV2").lines().count();
      start();
      await(() -> content("data/readings/FV2").lines().count() > before + 3);
      String pid = Files.readString(folder.resolve("data/lock")).strip();
      long begun = System.nanoTime();
      assertEquals(0, new ProcessBuilder("kill", "-TERM", pid).start().waitFor());
      assertTrue(program.waitFor(20, TimeUnit.SECONDS));
      long tookMs = (System.nanoTime() - begun) / 1_000_000;
      assertTrue(tookMs < 2000, "ending took " + tookMs + " ms");
      assertEquals(0, program.exitValue());
      String journal = content("data/journal");
      assertFalse(journal.contains("\"kind\":\"alarm\""), journal);
      assertFalse(journal.contains("gone"), journal);
    }
    String journal = content("data/journal");
    assertTrue(journal.contains("FV2: the estimate goes on from its state of"), journal);
    assertTrue(Files.readString(folder.resolve("screen.txt")).contains("\u001b[?1049l"));
  }
}

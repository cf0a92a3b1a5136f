package tunwarden.app.headless;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.app.Main;
import tunwarden.app.Ran;
import tunwarden.pty.Pty;

/**
 * The program as a process of its own over a pseudo-terminal: signals, exit codes, what is left on
 * the disk.
 */
class HeadlessProcessTest {
  private static final String CELLAR =
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
      """;

  @TempDir private Path folder;
  private Path cellar;
  private Path out;
  private Pty pty;
  private Thread instrument;
  private volatile boolean speaking = true;
  private Process program;
  private int lives;

  @BeforeEach
  void plug() throws IOException {
    pty = Pty.plugged(folder);
    cellar = folder.resolve("cellar.toml");
    Files.writeString(cellar, CELLAR.formatted(pty.port()));
    instrument =
        new Thread(
            () -> {
              while (speaking) {
                pty.send(String.format(Locale.ROOT, "P=%.3f T=5.25\r\n", 0.873));
                pause(200);
              }
            },
            "instrument");
    instrument.start();
  }

  @AfterEach
  void unplug() throws InterruptedException {
    speaking = false;
    instrument.join();
    if (program != null) {
      program.destroyForcibly();
    }
    pty.close();
  }

  private static void pause(int ms) {
    try {
      Thread.sleep(ms);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private void start() throws Exception {
    out = folder.resolve("out" + ++lives + ".txt");
    List<String> command =
        new ArrayList<>(
            List.of(
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
                "127.0.0.1:0"));
    program =
        new ProcessBuilder(command).redirectErrorStream(true).redirectOutput(out.toFile()).start();
    await(() -> Files.readString(out).contains("Serving on"));
  }

  private void signal(String name) throws Exception {
    Process kill = new ProcessBuilder("kill", "-" + name, String.valueOf(program.pid())).start();
    assertEquals(0, kill.waitFor());
  }

  private String journal() throws IOException {
    try (var months = Files.list(folder.resolve("data/journal"))) {
      return Files.readString(months.findFirst().orElseThrow());
    }
  }

  private String readings() throws IOException {
    Path vessel = folder.resolve("data/readings/FV2");
    if (!Files.exists(vessel)) {
      return "";
    }
    try (var days = Files.list(vessel)) {
      var day = days.findFirst();
      return day.isEmpty() ? "" : Files.readString(day.get());
    }
  }

  private void await(Callable<Boolean> condition) throws Exception {
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(40);
    while (!condition.call()) {
      assertTrue(System.nanoTime() < end && program.isAlive(), Files.readString(out));
      Thread.sleep(50);
    }
  }

  private String alarms(String... words) {
    List<String> args = new ArrayList<>(List.of("alarms"));
    args.addAll(List.of(words));
    args.addAll(List.of("--data", folder.resolve("data").toString()));
    return Ran.tunwarden(args.toArray(String[]::new)).ok();
  }

  @Test
  void hangUpReadsTheFileAgainAndTermEndsWithinTwoSecondsWithoutAFalseAlarm() throws Exception {
    start();
    await(() -> readings().lines().count() > 3);
    assertFalse(Files.readString(out).contains("read again"));
    signal("HUP");
    await(() -> Files.readString(out).contains("read again"));
    long rows = readings().lines().count();
    await(() -> readings().lines().count() > rows + 3);
    long begun = System.nanoTime();
    signal("TERM");
    assertTrue(program.waitFor(20, TimeUnit.SECONDS));
    long tookMs = (System.nanoTime() - begun) / 1_000_000;
    assertEquals(0, program.exitValue(), Files.readString(out));
    assertTrue(tookMs < 2000, "ending took " + tookMs + " ms");
    System.out.println("SIGTERM to the end: " + tookMs + " ms");
    String journal = journal();
    assertTrue(journal.endsWith("\n") && journal.contains("Watching ended."), journal);
    assertFalse(journal.contains("\"kind\":\"alarm\""), journal);
    assertFalse(journal.contains("gone"), journal);
    assertFalse(Files.exists(folder.resolve("data/state.json.new")));
  }

  @Test
  void alarmsShelvesNotesAndEstimatesSurviveAKill() throws Exception {
    start();
    await(() -> readings().lines().count() > 3);
    alarms("shelve", "leak", "--vessel", "FV2", "--for", "2 h", "--word", "seal on order");
    alarms("out-of-service", "vacuum", "--vessel", "FV2", "--word", "open");
    alarms("note", "new gauge fitted", "--vessel", "FV2");
    program.destroyForcibly();
    assertTrue(program.waitFor(10, TimeUnit.SECONDS));
    assertEquals(128 + 9, program.exitValue());
    start();
    assertTrue(Files.readString(out).contains("FV2: the estimate goes on from its state of"));
    String list = alarms("list");
    assertTrue(list.contains("FV2 leak: shelved") && list.contains("seal on order"), list);
    assertTrue(list.contains("FV2 vacuum: out of service"), list);
    String journal = journal();
    assertTrue(journal.contains("new gauge fitted"), journal);
    assertTrue(journal.contains("leak shelved"), journal);
  }
}

package tunwarden.terminal;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.pty.Pty;

/** The packaged program as a new user meets it: a real terminal, real keys, a real serial line. */
class DashboardInTerminalIT {
  private static final Path JAR = Path.of("target/tunwarden.jar").toAbsolutePath();
  private static final Path LOGS = Path.of("replay-logs").toAbsolutePath();
  private static final String VESSEL =
      " --volume 2000L --fill 1800L --liquid beer --relief 1.5bar --tolerance 0.1bar";

  @TempDir private Path folder;
  private String run;

  /** A home of its own, so that nothing a person chose earlier changes the screen. */
  @BeforeEach
  void aHomeOfItsOwn() {
    run = "XDG_STATE_HOME=" + folder.resolve("state") + " java -jar " + JAR;
  }

  @Test
  void withoutACellarFileARehearsalOpensAndSaysSo() {
    try (Tmux terminal = Tmux.open(80, 24, folder)) {
      terminal.line(run);
      String screen = terminal.await("REHEARSAL");
      assertTrue(terminal.await("relief margin").contains("FV1"), screen);
      terminal.press("Enter");
      terminal.await("pressure ladder");
    }
  }

  @Test
  void aLogIsReplayedInItsOwnTimeAndTheTerminalIsGivenBack() {
    try (Tmux terminal = Tmux.open(120, 40, folder)) {
      terminal.line("stty -g > before");
      terminal.line(run + " replay " + LOGS.resolve("cooling-lost.csv") + VESSEL);
      terminal.await("REPLAY");
      terminal.await("earliest lift");
      terminal.press("C-z");
      terminal.press("C-s");
      terminal.press("u");
      terminal.await("psi");
      terminal.press("q");
      terminal.await("the prompt", s -> s.contains("$") && !s.contains("REPLAY"));
      terminal.line("stty -g > after; cmp before after && echo the same");
      terminal.await("the same");
    }
  }

  @Test
  void beingToldToStopGivesTheTerminalBack() {
    try (Tmux terminal = Tmux.open(80, 24, folder)) {
      terminal.line("stty -g > before");
      terminal.line(run + " & echo $! > pid; fg");
      terminal.await("REHEARSAL");
      terminal.resize(100, 30);
      terminal.await("relief margin");
      terminal.press("C-c");
      terminal.await("the prompt", s -> s.contains("$") && !s.contains("REHEARSAL"));
      terminal.line("clear; stty -g > after; cmp before after && echo the same");
      terminal.await("the same");
    }
  }

  @Test
  void aSerialLineIsShownLostAndFoundAgain() throws IOException {
    try (Pty pty = Pty.plugged(folder);
        Feeder feeder = new Feeder(pty);
        Tmux terminal = Tmux.open(80, 24, folder)) {
      Files.writeString(folder.resolve("cellar.toml"), cellar(pty.port()));
      feeder.start();
      terminal.line(run + " watch");
      terminal.await("LIVE");
      String live = terminal.await("0.87");
      assertFalse(live.contains("REHEARSAL"), live);
      feeder.unplug();
      terminal.await("port");
      feeder.plug();
      terminal.await("a fresh reading", s -> s.contains("0.87") && !s.contains("STALE"));
    }
  }

  @Test
  void aWrongCellarFileIsOneSentenceAndTheTerminalStaysWhole() throws IOException {
    String wrong = cellar("/dev/ttyUSB0").replace("fill =", "titel = \"ale\"\nfill =");
    Files.writeString(folder.resolve("cellar.toml"), wrong);
    try (Tmux terminal = Tmux.open(120, 24, folder)) {
      terminal.line(run + " watch; echo code $?");
      String screen = terminal.await("code 2");
      assertTrue(screen.contains("line 3"), screen);
      assertTrue(screen.contains("title"), screen);
      assertFalse(screen.contains("Exception"), screen);
    }
  }

  private static String cellar(String port) {
    return """
        [vessel.FV2]
        volume = "2000 L"
        fill = "1800 L"
        liquid = { kind = "beer" }
        limits = { relief = "1.5 bar", tolerance = "0.1 bar" }
        [vessel.FV2.readings]
        pressure = { device = "text-line", port = "%1$s", field = "P" }
        temperature = { device = "text-line", port = "%1$s", field = "T" }
        """
        .formatted(port);
  }
}

package tunwarden.serial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.InstantSource;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.config.profile.Profiles;
import tunwarden.pty.Pty;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Profile;

/** Text lines over a real pseudo-terminal, through the serial library. */
class StreamOverPtyTest {
  private static final Duration SOON = Duration.ofSeconds(3);
  private static final Duration REOPENED = Duration.ofSeconds(5);
  private static final double AMBIENT_PA = 100_000;

  private final Queue<Sample> samples = new ConcurrentLinkedQueue<>();
  @TempDir private Path folder;

  private PortRunner runner(Pty pty) {
    Profile profile = Profiles.find("text-line", folder);
    List<Binding> bindings =
        List.of(
            Binding.plain("FV2", Quantity.PRESSURE, profile, "P", AMBIENT_PA),
            Binding.plain("FV2", Quantity.TEMPERATURE, profile, "T", AMBIENT_PA));
    PortPlan plan = new PortPlan(pty.port(), bindings);
    PortRunner runner =
        new PortRunner(plan, new SerialLinks(), samples::add, InstantSource.system());
    runner.start();
    return runner;
  }

  private List<Reading> readings(Quantity quantity) {
    return samples.stream()
        .filter(s -> s instanceof Reading r && r.quantity() == quantity)
        .map(s -> (Reading) s)
        .toList();
  }

  private void opened(PortRunner runner) {
    Eventually.within(SOON, "open", () -> runner.health().state() == LinkState.OPEN);
  }

  @Test
  void aLineInPiecesBecomesTemperatureThenPressure() {
    try (Pty pty = Pty.plugged(folder);
        PortRunner runner = runner(pty)) {
      opened(runner);
      pty.send("tail of a line cut off\nP=0.8");
      Eventually.sleep(150);
      pty.send("73 T=5.");
      Eventually.sleep(150);
      pty.send("25\r\n");
      Eventually.within(SOON, "two readings", () -> samples.size() == 2);
      List<Sample> got = List.copyOf(samples);
      assertEquals(Quantity.TEMPERATURE, ((Reading) got.get(0)).quantity());
      assertEquals(5.25 + 273.15, ((Reading) got.get(0)).value(), 1e-9);
      assertEquals(Quantity.PRESSURE, ((Reading) got.get(1)).quantity());
      assertEquals(87_300, ((Reading) got.get(1)).value(), 1e-6);
      assertEquals(1, runner.health().traffic().messages());
      assertEquals(22, runner.health().traffic().bytesDropped());
    }
  }

  @Test
  void aPortMissingAtStartIsSaidAndOpenedWhenItComes() {
    try (Pty pty = Pty.unplugged(folder);
        PortRunner runner = runner(pty)) {
      Eventually.within(SOON, "said", () -> runner.health().state() == LinkState.MISSING);
      Eventually.within(SOON, "faults", () -> samples.size() == 2);
      assertTrue(samples.stream().allMatch(s -> ((Fault) s).quality() == Quality.PORT_GONE));
      assertTrue(runner.health().detail().contains(pty.port()), runner.health().detail());
      Eventually.sleep(2500);
      pty.plug();
      Eventually.within(REOPENED, "opened", () -> runner.health().state() == LinkState.OPEN);
      pty.send("\nP=1.0 T=4\n");
      Eventually.within(SOON, "a pressure", () -> readings(Quantity.PRESSURE).size() == 1);
    }
  }

  @Test
  void unpluggedAndPluggedBackIsReopenedWithinFiveSeconds() {
    try (Pty pty = Pty.plugged(folder);
        PortRunner runner = runner(pty)) {
      opened(runner);
      for (int round = 1; round <= 2; round++) {
        pty.send("\nP=1.0 T=4\n");
        int expected = round;
        Eventually.within(SOON, "read", () -> readings(Quantity.PRESSURE).size() == expected);
        pty.unplug();
        Eventually.within(SOON, "loss seen", () -> !runner.health().state().isOpen());
        Eventually.within(
            SOON,
            "fault",
            () -> samples.stream().anyMatch(s -> s instanceof Fault f && f.quality().isBad()));
        pty.plug();
        Eventually.within(REOPENED, "reopened", () -> runner.health().state().isOpen());
      }
      assertEquals(2, runner.health().traffic().troubles().get(Trouble.LOST));
    }
  }

  @Test
  void aPortThatVanishesWithoutAWordIsMissedByItsName() throws IOException {
    try (Pty pty = Pty.plugged(folder);
        PortRunner runner = runner(pty)) {
      opened(runner);
      pty.send("\nP=1.0 T=4\n");
      Eventually.within(SOON, "read", () -> readings(Quantity.PRESSURE).size() == 1);
      Files.delete(Path.of(pty.port()));
      Eventually.within(REOPENED, "loss seen", () -> !runner.health().state().isOpen());
      pty.unplug();
      pty.plug();
      Eventually.within(REOPENED, "reopened", () -> runner.health().state().isOpen());
      pty.send("\nP=1.0 T=4\n");
      Eventually.within(SOON, "read again", () -> readings(Quantity.PRESSURE).size() == 2);
    }
  }

  @Test
  void silenceIsSaid() {
    try (Pty pty = Pty.plugged(folder);
        PortRunner runner = runner(pty)) {
      opened(runner);
      pty.send("\nP=1.0 T=4\n");
      Eventually.within(
          Duration.ofSeconds(7), "silent", () -> runner.health().state() == LinkState.SILENT);
      assertEquals("<0a>P=1.0 T=4<0a>", runner.health().traffic().lastBytes());
      pty.send("P=1.0 T=4\n");
      Eventually.within(SOON, "open again", () -> runner.health().state() == LinkState.OPEN);
    }
  }

  @Test
  void garbageAndEndlessBytesAreCountedAndSurvived() {
    try (Pty pty = Pty.plugged(folder);
        PortRunner runner = runner(pty)) {
      opened(runner);
      pty.send("\n");
      pty.send(new byte[0]);
      for (int i = 0; i < 40; i++) {
        pty.send("x".repeat(250));
      }
      Eventually.within(SOON, "said", () -> runner.health().state() == LinkState.ENDLESS);
      pty.send("\n\033[2J\007nonsense\nP=ERR T=4\n");
      Eventually.within(SOON, "temperature", () -> readings(Quantity.TEMPERATURE).size() == 1);
      // A value is handed over a moment before the health that counts its line is published.
      Eventually.within(
          SOON, "counted", () -> runner.health().traffic().troubles().containsKey(Trouble.FOREIGN));
      LinkHealth health = runner.health();
      assertEquals(1L, health.traffic().troubles().get(Trouble.TOO_LONG));
      assertEquals(1L, health.traffic().troubles().get(Trouble.FOREIGN));
      assertTrue(health.traffic().bytesDropped() >= 10_000);
      assertTrue(health.traffic().lastBytes().contains("<1b>[2J<07>"));
      assertEquals(0, readings(Quantity.PRESSURE).size());
      Fault fault =
          (Fault) samples.stream().filter(s -> s instanceof Fault).findFirst().orElseThrow();
      assertEquals(Quality.LOOP_FAULT, fault.quality());
    }
  }

  @Test
  void aWrongBaudRateIsRecognised() {
    try (Pty pty = Pty.plugged(folder);
        PortRunner runner = runner(pty)) {
      opened(runner);
      for (int i = 0; i < 12; i++) {
        pty.send(WrongBaud.heardAt(9600, 19200, "P=0.873 T=5.25\r\n"));
      }
      Eventually.within(SOON, "said", () -> runner.health().state() == LinkState.GARBLED);
    }
  }
}

package tunwarden.serial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.file.Path;
import java.time.Duration;
import java.time.InstantSource;
import java.util.Arrays;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.BiFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.config.profile.ProfileReader;
import tunwarden.pty.Pty;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.serial.ScriptedSlave.Piece;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.Profile;
import tunwarden.wire.simulate.PlayedInstrument;

/**
 * The read-only master against every fault of a line that was seen to break masters, each over a
 * pseudo-terminal: after each fault no wrong value has come out and the next request is answered.
 * Pressure and temperature stand far apart here, so that two requests of one instrument are needed.
 */
class ModbusFaultsOverPtyTest {
  private static final Duration SOON = Duration.ofSeconds(8);
  private static final String PROFILE =
      """
      {"name": "far", "title": "two blocks", "speaks": "modbus-rtu", "period": "100 ms",
       "timeout": "150 ms", "retries": 1,
       "fields": {
        "P": {"measures": "pressure", "unit": "bar", "accuracy": "1 mbar",
              "range": ["0 bar", "10 bar"],
              "register": {"function": 3, "address": 0, "type": "float32"}},
        "T": {"measures": "temperature", "unit": "C", "accuracy": "0.1 C",
              "range": ["-20 C", "100 C"],
              "register": {"function": 3, "address": 100, "type": "float32"}}}}
      """;

  private final Profile profile = ProfileReader.read(PROFILE, "far");
  private final Queue<Sample> samples = new ConcurrentLinkedQueue<>();
  private final PlayedInstrument instrument = PlayedInstrument.of(profile, 1);
  private final AtomicInteger asked = new AtomicInteger();
  @TempDir private Path folder;

  ModbusFaultsOverPtyTest() {
    instrument.show(java.util.Map.of("P", 150_000.0, "T", 280.0));
  }

  private PortRunner runner(Pty pty) {
    PortRunner runner =
        new PortRunner(
            new PortPlan(
                pty.port(),
                List.of(
                    new Binding("A", Quantity.PRESSURE, profile, field("P"), 1, trim()),
                    new Binding("A", Quantity.TEMPERATURE, profile, field("T"), 1, trim()))),
            new SerialLinks(),
            samples::add,
            InstantSource.system());
    runner.start();
    return runner;
  }

  private tunwarden.wire.profile.Field field(String name) {
    return profile.field(name).orElseThrow();
  }

  private Binding.Trim trim() {
    return new Binding.Trim(
        tunwarden.wire.signal.Calibration.NONE, 100_000, profile.polling().period(), 1);
  }

  private byte[] right(byte[] request) {
    return instrument.hear(request, request.length);
  }

  /** Runs with a script that sees the number of the request, and waits for right values after. */
  @SuppressWarnings("try")
  private LinkHealth survives(BiFunction<Integer, byte[], List<Piece>> script) {
    try (Pty pty = Pty.plugged(folder);
        ScriptedSlave slave =
            new ScriptedSlave(pty, r -> script.apply(asked.incrementAndGet(), r));
        PortRunner runner = runner(pty)) {
      Eventually.within(SOON, "right values after the fault", () -> readings() >= 6);
      assertOnlyRightValues();
      return runner.health();
    }
  }

  private long readings() {
    return samples.stream().filter(s -> s instanceof Reading).count();
  }

  private void assertOnlyRightValues() {
    for (Sample sample : samples) {
      if (sample instanceof Reading reading) {
        double expected = reading.quantity() == Quantity.PRESSURE ? 150_000 : 280;
        assertEquals(expected, reading.value(), 0.01, reading::toString);
      }
    }
  }

  private static byte[] with(byte[] before, byte[] frame, byte[] after) {
    ByteArrayOutputStream all = new ByteArrayOutputStream();
    all.writeBytes(before);
    all.writeBytes(frame);
    all.writeBytes(after);
    return all.toByteArray();
  }

  private static byte[] noise(int count) {
    byte[] noise = new byte[count];
    new java.util.SplittableRandom(7).nextBytes(noise);
    return noise;
  }

  @Test
  void plainAnswers() {
    LinkHealth health = survives((n, r) -> List.of(Piece.now(right(r))));
    assertTrue(health.traffic().troubles().isEmpty(), health.traffic()::toString);
    assertTrue(samples.stream().noneMatch(s -> s instanceof Fault));
  }

  @Test
  void aFrameSplitByPauses() {
    LinkHealth health =
        survives(
            (n, r) -> {
              byte[] answer = right(r);
              return List.of(
                  Piece.now(Arrays.copyOfRange(answer, 0, 3)),
                  new Piece(10, Arrays.copyOfRange(answer, 3, 4)),
                  new Piece(10, Arrays.copyOfRange(answer, 4, answer.length)));
            });
    assertTrue(health.traffic().troubles().isEmpty(), health.traffic()::toString);
  }

  @Test
  void noiseBehindTheFrame() {
    survives((n, r) -> List.of(Piece.now(with(new byte[0], right(r), noise(5)))));
  }

  @Test
  void oneNoiseByteBeforeTheFrame() {
    survives((n, r) -> List.of(Piece.now(with(new byte[] {0}, right(r), new byte[0]))));
  }

  @Test
  void aBadChecksumIsCountedAndNeverAValue() {
    LinkHealth health =
        survives(
            (n, r) -> {
              byte[] answer = right(r);
              answer[4] ^= (byte) (n % 3 == 1 ? 0x40 : 0);
              return List.of(Piece.now(answer));
            });
    assertTrue(health.traffic().troubles().get(Trouble.CHECKSUM) >= 1);
  }

  @Test
  void anEchoOfEveryRequest() {
    LinkHealth health = survives((n, r) -> List.of(Piece.now(r), new Piece(3, right(r))));
    assertTrue(health.traffic().troubles().isEmpty(), health.traffic()::toString);
  }

  @ParameterizedTest
  @ValueSource(ints = {170, 260, 380, 490, 620})
  void aLateAnswerIsNeverTakenForAnotherRegister(int delayMs) {
    survives((n, r) -> List.of(new Piece(n % 4 == 1 ? delayMs : 0, right(r))));
  }

  @Test
  void fourHundredNoiseBytes() {
    LinkHealth health = survives((n, r) -> List.of(Piece.now(n <= 2 ? noise(400) : right(r))));
    assertTrue(health.traffic().troubles().get(Trouble.BROKEN) >= 1);
    assertTrue(samples.stream().anyMatch(s -> s.toString().contains("256 bytes of noise")));
  }

  @Test
  void aSilentDeviceIsSaidAndComesBack() {
    LinkHealth health = survives((n, r) -> n <= 2 ? List.of() : List.of(Piece.now(right(r))));
    assertEquals(2L, health.traffic().troubles().get(Trouble.NO_ANSWER));
    Fault fault = (Fault) samples.peek();
    assertEquals(Quality.NO_ANSWER, fault.quality());
  }

  @Test
  void aRefusalIsSaidInWords() {
    byte[] busy = {1, (byte) 0x83, 4, 0x40, (byte) 0xF3};
    LinkHealth health = survives((n, r) -> List.of(Piece.now(n == 1 ? busy : right(r))));
    assertEquals(1L, health.traffic().troubles().get(Trouble.REFUSAL));
    Fault fault = (Fault) samples.peek();
    assertEquals(Quality.OUT_OF_SERVICE, fault.quality());
    assertEquals("unit 1: server device failure", fault.detail());
  }

  @Test
  void registersBesideTheWantedOnesAreNotInsistedOn() {
    byte[] noSuchAddress = {1, (byte) 0x83, 2, (byte) 0xC0, (byte) 0xF1};
    survives((n, r) -> List.of(Piece.now(r[5] == 2 ? right(r) : noSuchAddress)));
    assertTrue(samples.stream().noneMatch(s -> s instanceof Fault), samples::toString);
  }

  @Test
  void unplugInTheMiddleOfARequest() {
    try (Pty pty = Pty.plugged(folder)) {
      try (PortRunner runner = runner(pty)) {
        Eventually.within(SOON, "asked", () -> pty.receive(10).length > 0);
        long start = System.nanoTime();
        pty.unplug();
        Eventually.within(SOON, "loss seen", () -> !runner.health().state().isOpen());
        assertTrue(System.nanoTime() - start < 1_000_000_000L, "took too long");
        pty.plug();
        try (ScriptedSlave slave = new ScriptedSlave(pty, r -> List.of(Piece.now(right(r))))) {
          Eventually.within(Duration.ofSeconds(5), "read again", () -> readings() >= 4);
          assertFalse(slave.requests().isEmpty());
        }
      }
      assertOnlyRightValues();
    }
  }

  @Test
  void theTwoBlocksOfOneInstrumentDifferInLength() {
    try (Pty pty = Pty.plugged(folder);
        ScriptedSlave slave = new ScriptedSlave(pty, r -> List.of(Piece.now(right(r))));
        PortRunner runner = runner(pty)) {
      Eventually.within(SOON, "two requests", () -> slave.requests().size() >= 2);
      assertEquals(LinkState.OPEN, runner.health().state());
      assertEquals(2, slave.requests().get(0)[5]);
      assertEquals(3, slave.requests().get(1)[5]);
    }
  }
}

package tunwarden.serial;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicReference;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.config.profile.Profiles;
import tunwarden.pty.PtyCable;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.rehearse.PortRehearsal;
import tunwarden.rehearse.Rehearsal;
import tunwarden.rehearse.Scenario;
import tunwarden.wire.profile.Profile;

/** A rehearsed vessel on one end of a cable is read on the other. */
class RehearsalOverPtyTest {
  @TempDir private Path folder;

  static List<String> shipped() {
    return Profiles.SHIPPED;
  }

  private void plays(String device, Scenario scenario) throws Exception {
    Path near = Files.createDirectory(folder.resolve("near"));
    Path far = Files.createDirectory(folder.resolve("far"));
    Profile profile = Profiles.find(device, folder);
    Rehearsal rehearsal = Rehearsal.endless(scenario, 1, Instant.EPOCH, Duration.ofSeconds(1));
    AtomicBoolean goesOn = new AtomicBoolean(true);
    AtomicReference<Throwable> trouble = new AtomicReference<>();
    try (PtyCable cable = new PtyCable(near, far)) {
      PortRehearsal.Stage stage = new PortRehearsal.Stage(cable.far(), profile, 3, 1);
      PortRehearsal playing = new PortRehearsal(rehearsal, stage, 101_325);
      Thread thread = new Thread(() -> play(playing, goesOn, trouble));
      thread.start();
      try (Watching watching = new Watching(cable.near(), Watching.unit(profile, 3))) {
        Quantity last =
            profile.fields().values().stream().anyMatch(f -> f.name().startsWith("p"))
                    || profile.fields().containsKey("P")
                ? Quantity.PRESSURE
                : Quantity.TEMPERATURE;
        Eventually.within(
            Duration.ofSeconds(10),
            device + " " + watching.health().traffic(),
            () -> watching.readings(r -> r.quantity() == last).size() >= 2);
        for (Reading reading : watching.readings(r -> r.quantity() == Quantity.TEMPERATURE)) {
          assertEquals(rehearsal.truth().temperatureK(), reading.value(), 1.0);
        }
        assertTrue(watching.faults().isEmpty(), watching.faults()::toString);
      } finally {
        goesOn.set(false);
        thread.join(3000);
      }
      assertEquals(null, trouble.get());
    }
  }

  private static void play(
      PortRehearsal playing, AtomicBoolean goesOn, AtomicReference<Throwable> trouble) {
    try {
      playing.play(new SerialLinks(), goesOn::get, row -> {});
    } catch (PortException e) {
      trouble.set(e);
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"text-query-addressed", "modbus-rtu-float"})
  void anAskedInstrumentIsPlayed(String device) throws Exception {
    plays(device, Scenario.SETTLED);
  }

  @Test
  void aStreamingInstrumentIsPlayed() throws Exception {
    plays("text-line", Scenario.COOLING_LOST);
  }

  @ParameterizedTest
  @MethodSource("shipped")
  @Tag("long")
  void everyProfileIsPlayed(String device) throws Exception {
    plays(device, Scenario.SETTLED);
  }

  @ParameterizedTest
  @EnumSource(Scenario.class)
  @Tag("long")
  void everyScenarioIsPlayed(Scenario scenario) throws Exception {
    plays("text-line", scenario);
  }
}

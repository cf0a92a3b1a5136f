package tunwarden.rehearse;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** The logs that ship with the program are what the rehearsal makes, byte for byte. */
class ReplayLogsTest {
  @ParameterizedTest
  @EnumSource(
      value = Scenario.class,
      names = {"COOLING_LOST", "SEALED_TOO_EARLY"})
  void theShippedLogIsMadeAgain(Scenario scenario) throws IOException {
    Path file = Path.of("replay-logs", scenario.word() + ".csv");
    StringBuilder made = new StringBuilder();
    RehearsalLog.write(scenario, 1, made);
    assertTrue(made.length() < 1_000_000);
    assertTrue(made.toString().startsWith("# simulated, not measured"));
    assertEquals(Files.readString(file), made.toString());
  }
}

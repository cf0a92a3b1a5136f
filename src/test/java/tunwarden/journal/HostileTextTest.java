package tunwarden.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.InstantSource;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.estimate.Outcome;
import tunwarden.estimate.Step;
import tunwarden.journal.disk.RealDisk;
import tunwarden.reading.Mark;
import tunwarden.reading.Quality;

/** What instruments and logs may send that is no plain text. */
class HostileTextTest {
  private static final Instant NOON = Instant.parse("2026-03-02T12:00:00Z");
  @TempDir private Path folder;

  @ParameterizedTest
  @ValueSource(
      strings = {"..", "../x", "a/b", "a\\b", "", ".", "x/../../y", "/etc", "C:", "a\u0000b", "a."})
  void aVesselsNameNeverLeadsOutOfTheFolder(String name) throws IOException {
    try (DataFolder data = DataFolder.open(folder, new RealDisk())) {
      assertThrows(
          IllegalArgumentException.class, () -> data.readings(name, LocalDate.parse("2026-03-02")));
    }
  }

  @Test
  void deviceNamesOfWindowsGetAnotherFolder() throws IOException {
    try (DataFolder data = DataFolder.open(folder, new RealDisk())) {
      Path file = data.readings("NUL", LocalDate.parse("2026-03-02"));
      assertEquals("_NUL", file.getParent().getFileName().toString());
    }
  }

  @Test
  void escapesFormulasAndOverlongRemarksAreStoredHarmless() throws IOException {
    String escape = "\u001b]0;owned\u0007\u001b[2Jcalm\u202Eterces";
    String formula = "=HYPERLINK(\"http://x.example\",\"y\")";
    String huge = "x".repeat(100_000);
    int second = 0;
    try (Recorder recorder =
        Recorder.open(folder, new RealDisk(), RecorderSettings.USUAL, InstantSource.system())) {
      recorder.start();
      for (String text : List.of(escape, formula, "@SUM(A1)", huge, "two\nlines")) {
        Step step = new Step(Outcome.ACCEPTED, Quality.GOOD, "", null, List.of());
        recorder.sampled(new Mark(NOON.plusSeconds(second++), "FV2", text), step);
      }
    }
    String log = Files.readString(folder.resolve("readings/FV2/2026-03-02.csv"));
    assertFalse(log.contains("\u001b") || log.contains("\u0007") || log.contains("\u202E"));
    assertTrue(log.contains(",\"'=HYPERLINK("), log);
    assertTrue(log.contains(",'@SUM(A1)"), log);
    assertEquals(6, log.lines().count(), "a line break in a remark begins no row");
    try (var months = Files.list(folder.resolve("journal"))) {
      String journal = Files.readString(months.findFirst().orElseThrow());
      assertFalse(journal.contains("\u001b"), "JSON escapes control characters");
      assertTrue(journal.lines().allMatch(line -> line.length() < 2500));
    }
  }

  @Test
  void linesThatAreNotOursAreLeftOut() {
    for (String line :
        List.of("", "[".repeat(100_000), "{\"n\":1}", "null", "{\"n\":1,\"time\":\"soon\"}")) {
      assertEquals(Optional.empty(), JournalLines.read(line));
    }
  }
}

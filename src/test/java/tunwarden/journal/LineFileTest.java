package tunwarden.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.journal.disk.AtomicFile;
import tunwarden.journal.disk.LineFile;
import tunwarden.journal.disk.TornTail;

/** Files of whole lines under every fault the disk can show. */
class LineFileTest {
  @TempDir private Path folder;
  private final FaultyDisk disk = new FaultyDisk();
  private Path file;

  @BeforeEach
  void name() {
    file = folder.resolve("deep/er/lines.txt");
  }

  @Test
  void shortWritesAreFinished() throws IOException {
    disk.shortWrites = true;
    try (LineFile lines = LineFile.open(disk, file, "head")) {
      lines.add("a long line that needs many writes");
    }
    assertEquals(List.of("head", "a long line that needs many writes"), Files.readAllLines(file));
  }

  @Test
  void aFullDiskLeavesOnlyWholeLinesAndLosesNothingThatWaits() throws IOException {
    try (LineFile lines = LineFile.open(disk, file, "")) {
      lines.add("first");
      lines.flush();
      disk.room.set(4);
      lines.add("second");
      assertThrows(IOException.class, lines::flush);
      lines.takeBack();
      assertEquals("first\n", Files.readString(file));
      disk.room.set(Long.MAX_VALUE);
      lines.flush();
    }
    assertEquals(List.of("first", "second"), Files.readAllLines(file));
  }

  @Test
  void halfALineThatCouldNotBeTakenBackIsTakenBackLater() throws IOException {
    try (LineFile lines = LineFile.open(disk, file, "")) {
      lines.add("first");
      lines.flush();
      disk.room.set(4);
      disk.truncateFails = true;
      lines.add("second");
      assertThrows(IOException.class, lines::flush);
      lines.takeBack();
      disk.room.set(Long.MAX_VALUE);
      assertThrows(IOException.class, lines::flush, "not while the file cannot be cut");
      disk.truncateFails = false;
      lines.flush();
    }
    assertEquals(List.of("first", "second"), Files.readAllLines(file));
  }

  @Test
  void aFailedForceIsToldAndTriedAgain() throws IOException {
    try (LineFile lines = LineFile.open(disk, file, "")) {
      disk.forceFails = true;
      lines.add("first");
      assertThrows(IOException.class, lines::flush);
      disk.forceFails = false;
      lines.flush();
    }
    assertEquals(List.of("first"), Files.readAllLines(file));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "one;two;       | one;two;       | 0",
        "one;two;thr    | one;two;       | 3",
        "one            | ''             | 3",
        "one;@@@@       | one;           | 4",
        "one;tw@@@;     | one;           | 6",
        "''             | ''             | 0"
      })
  void tornTailsAreCutToWholeLines(String before, String after, long cut) throws IOException {
    Path torn = folder.resolve("torn");
    Files.writeString(torn, characters(before), StandardCharsets.UTF_8);
    Optional<TornTail.Repair> repair = TornTail.repair(disk, torn);
    assertEquals(characters(after), Files.readString(torn));
    assertEquals(cut, repair.map(TornTail.Repair::cut).orElse(0L));
    assertTrue(TornTail.repair(disk, torn).isEmpty(), "once repaired, nothing is left to repair");
  }

  private static String characters(String table) {
    return table.replace(';', '\n').replace('@', '\0');
  }

  @Test
  void aReplacementThatFailsLeavesTheOldFile() throws IOException {
    Path state = folder.resolve("state.json");
    AtomicFile.write(disk, state, "old".getBytes(StandardCharsets.UTF_8));
    byte[] other = "new and longer".getBytes(StandardCharsets.UTF_8);
    disk.room.set(5);
    assertThrows(IOException.class, () -> AtomicFile.write(disk, state, other));
    disk.room.set(Long.MAX_VALUE);
    disk.forceFails = true;
    assertThrows(IOException.class, () -> AtomicFile.write(disk, state, other));
    disk.forceFails = false;
    disk.renameFails = true;
    assertThrows(IOException.class, () -> AtomicFile.write(disk, state, other));
    assertEquals("old", Files.readString(state));
    disk.renameFails = false;
    AtomicFile.write(disk, state, other);
    assertEquals("new and longer", Files.readString(state));
  }
}

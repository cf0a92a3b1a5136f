package tunwarden.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Closed days, also when the last compression was cut short or rows came late. */
class CompressorTest {
  @TempDir private Path folder;
  private final FaultyDisk disk = new FaultyDisk();
  private final Compressor compressor = new Compressor(disk);
  private Path plain;
  private Path packed;

  @BeforeEach
  void names() {
    plain = folder.resolve("2026-03-01.csv");
    packed = folder.resolve("2026-03-01.csv.gz");
  }

  @Test
  void lateRowsFollowWithoutASecondHeader() throws IOException {
    Files.writeString(plain, "time,x\n1,1\n2,2\n");
    compressor.compress(plain);
    Files.writeString(plain, "time,x\n3,3\n");
    compressor.compress(plain);
    assertEquals(List.of("time,x", "1,1", "2,2", "3,3"), RecorderTest.unpack(packed));
    assertFalse(Files.exists(plain));
  }

  @Test
  void aPlainFileThatWasLeftBesideIsNotAddedTwice() throws IOException {
    String rows = "time,x\n1,1\n2,2\n";
    Files.writeString(plain, rows);
    compressor.compress(plain);
    Files.writeString(plain, rows);
    compressor.compress(plain);
    assertEquals(List.of("time,x", "1,1", "2,2"), RecorderTest.unpack(packed));
  }

  @Test
  void aFullDiskKeepsThePlainFile() throws IOException {
    Files.writeString(plain, "time,x\n1,1\n");
    disk.room.set(4);
    assertThrows(IOException.class, () -> compressor.compress(plain));
    assertEquals("time,x\n1,1\n", Files.readString(plain));
    assertFalse(Files.exists(packed));
  }
}

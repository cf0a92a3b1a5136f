package tunwarden.replay;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.time.Instant;
import java.util.HexFormat;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/** Rows read on a thread of their own come in order, with the failures and the hash of the file. */
@Timeout(20)
class ReadAheadTest {
  @TempDir Path folder;

  private static LogRow row(long second) {
    return new LogRow(second, Instant.ofEpochSecond(second), "T", List.of());
  }

  /** Rows without end, or a failure after some. */
  private static final class Rows implements RowSource {
    final long failAfter;
    long given;

    Rows(long failAfter) {
      this.failAfter = failAfter;
    }

    @Override
    public LogRow next() {
      if (given == failAfter) {
        throw new BadLogException("log.csv", 7, "time", "it broke");
      }
      return row(given++);
    }
  }

  @Test
  void aFailureComesAfterTheRowsBeforeIt() throws IOException {
    Rows rows = new Rows(2500);
    try (ReadAhead<LogRow> ahead = new ReadAhead<>(rows::next)) {
      for (long second = 0; second < 2500; second++) {
        assertEquals(second, ahead.next().time().getEpochSecond());
      }
      BadLogException failure = assertThrows(BadLogException.class, ahead::next);
      assertEquals(7, failure.line());
      assertThrows(BadLogException.class, ahead::next);
    }
  }

  @Test
  void closingEndsASourceWithoutEnd() throws IOException {
    Rows rows = new Rows(-1);
    try (ReadAhead<LogRow> ahead = new ReadAhead<>(rows::next)) {
      ahead.next();
    }
    assertTrue(rows.given < 100_000, "memory must stay bounded: " + rows.given);
  }

  @Test
  void theHashIsThatOfTheWholeFile() throws Exception {
    Path log = folder.resolve("log.csv");
    StringBuilder text = new StringBuilder("time,pressure_bar_g,temperature_c\n");
    for (int i = 0; i < 5000; i++) {
      text.append(Instant.ofEpochSecond(i)).append(",1.0").append(i % 10).append(",4.1\n");
    }
    byte[] bytes = text.append("1970-01-02T").toString().getBytes(StandardCharsets.UTF_8);
    Files.write(log, bytes);
    String expected = HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    try (LogReader early = LogFile.open(log, LogOptions.NONE).openHashed();
        LogReader plain = LogFile.open(log, LogOptions.NONE).open()) {
      early.next();
      assertEquals(expected, early.sha256().orElseThrow());
      assertTrue(plain.sha256().isEmpty());
    }
    try (LogReader reader = LogFile.open(log, LogOptions.NONE).openHashed();
        ReadAhead<LogRow> ahead = new ReadAhead<>(reader::next)) {
      long rows = 0;
      while (ahead.next() != null) {
        rows++;
      }
      assertEquals(5000, rows);
      assertNull(ahead.next());
      assertEquals(expected, reader.sha256().orElseThrow());
    }
  }
}

package tunwarden.replay;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.reading.Mark;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;

/** Our own log format, read and written. */
class LogReaderTest {
  private static final String NAMES = "time,pressure_bar_g,temperature_c";

  @TempDir Path folder;

  @Test
  void temperatureComesFirstAndPressureLast() throws IOException {
    List<LogRow> rows = read(NAMES + "\n2026-03-02T08:00:00Z,0.873,5.25\n");
    List<Quantity> order =
        rows.get(0).samples().stream().map(s -> ((Reading) s).quantity()).toList();
    assertEquals(List.of(Quantity.TEMPERATURE, Quantity.PRESSURE), order);
    assertEquals(87_300, ForeignLogTest.value(rows.get(0), Quantity.PRESSURE), 1e-9);
  }

  @Test
  void everyColumnOfTheFormatIsRead() throws IOException {
    List<LogRow> rows =
        read(
            "# a remark\ntime,vessel,pressure_bar_g,temperature_c,level_l,barometer_bar_a,"
                + "headspace_temperature_c,gravity_sg,dissolved_g_per_l,dissolved_u95_g_per_l,event\n"
                + "2026-03-02T08:00:00Z,FV2,0.9,5,1800,0.998,6,1.048,5.1,0.2,\"lab, by hand\"\n");
    LogRow row = rows.get(0);
    assertEquals("FV2", row.vessel());
    assertEquals(1.8, ForeignLogTest.value(row, Quantity.LEVEL), 1e-12);
    assertEquals(99_800, ForeignLogTest.value(row, Quantity.BAROMETER), 1e-9);
    assertEquals(279.15, ForeignLogTest.value(row, Quantity.HEADSPACE_TEMPERATURE), 1e-9);
    assertEquals(11.9, ForeignLogTest.value(row, Quantity.GRAVITY), 0.05);
    Reading lab =
        row.samples().stream()
            .filter(s -> s instanceof Reading r && r.quantity() == Quantity.DISSOLVED)
            .map(s -> (Reading) s)
            .findFirst()
            .orElseThrow();
    assertEquals(5.1, lab.value());
    assertEquals(0.2, lab.u95());
    assertTrue(
        row.samples()
            .contains(new Mark(Instant.parse("2026-03-02T08:00:00Z"), "FV2", "lab, by hand")));
  }

  @Test
  void aTornLastLineIsIgnoredAndSaid() throws IOException {
    String whole = NAMES + "\n2026-03-02T08:00:00Z,0.873,5.25\n";
    for (String tail :
        List.of("2026-03-02T08:0", "2026-03-02T08:00:10Z,0.8", "2026-03-02T08:00:10Z,0.873,5.2")) {
      Path file = Files.writeString(folder.resolve("torn.csv"), whole + tail);
      try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
        assertEquals(1, ForeignLogTest.all(reader).size(), tail);
        assertEquals(
            List.of("the last row, line 3, is torn and was ignored"), reader.notes().sentences());
      }
    }
  }

  @Test
  void aWholeLastLineWithoutItsEndIsKept() throws IOException {
    List<LogRow> rows =
        read(NAMES + "\n2026-03-02T08:00:00Z,0.873,5.25\n2026-03-02T08:00:10Z,0.874,5.26");
    assertEquals(2, rows.size());
  }

  @Test
  void aCompressedLogIsReadAndItsDamageIsSaid() throws IOException {
    StringBuilder text = new StringBuilder(NAMES + "\n");
    for (int i = 0; i < 20_000; i++) {
      text.append(Instant.parse("2026-03-02T08:00:00Z").plusSeconds(i))
          .append(",0.9,")
          .append(5 + i % 7)
          .append('\n');
    }
    Path file = folder.resolve("log.csv.gz");
    try (OutputStream out = new GZIPOutputStream(Files.newOutputStream(file))) {
      out.write(text.toString().getBytes(StandardCharsets.UTF_8));
    }
    try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
      assertEquals(20_000, ForeignLogTest.all(reader).size());
    }
    byte[] bytes = Files.readAllBytes(file);
    Files.write(file, java.util.Arrays.copyOf(bytes, bytes.length - 40));
    try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
      assertTrue(ForeignLogTest.all(reader).size() > 10_000);
      assertTrue(
          reader.notes().sentences().get(0).contains("damaged"),
          reader.notes().sentences().toString());
    }
  }

  @Test
  void aStrayQuoteCostsOneRowOnly() throws IOException {
    List<LogRow> rows =
        read(
            NAMES
                + "\n2026-03-02T08:00:00Z,\"0.873,5.25\n2026-03-02T08:00:10Z,0.873,5.25\n"
                + "2026-03-02T08:00:20Z,0.873,5.25\n");
    assertEquals(2, rows.size());
  }

  @Test
  void aLineWithoutEndDoesNotFillTheMemory() throws IOException {
    Path file = folder.resolve("long.csv");
    Files.writeString(
        file,
        NAMES
            + "\n2026-03-02T08:00:00Z,0.873,5.25\n"
            + "x".repeat(300_000)
            + "\n2026-03-02T08:00:10Z,0.873,5.25\n");
    try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
      assertEquals(2, ForeignLogTest.all(reader).size());
      assertEquals("line 3: longer than 65536 characters", reader.notes().firstUnreadable());
    }
  }

  @Test
  void whatCannotBeReadNamesFileLineAndField() throws IOException {
    Path file =
        Files.writeString(folder.resolve("x.csv"), NAMES + "\n2026-03-02T08:00:00Z,high,5\n");
    try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
      BadLogException refused = assertThrows(BadLogException.class, reader::next);
      assertEquals(
          file
              + ": no row could be read; the first is line 2, pressure_bar_g: 'high' is not a number",
          refused.getMessage());
    }
    assertThrows(
        BadLogException.class, () -> LogFile.open(folder.resolve("none"), LogOptions.NONE));
    assertThrows(BadLogException.class, () -> LogFile.open(folder, LogOptions.NONE));
  }

  @Test
  void whatIsWrittenReadsBackTheSame() throws IOException {
    String text =
        "time,vessel,pressure_bar_g,temperature_c,dissolved_g_per_l,dissolved_u95_g_per_l,event\n"
            + "2026-03-02T08:00:00Z,FV2,0.873,5.25,,,\n"
            + "2026-03-02T08:00:00.500Z,FV2,-0.00412,-1.2,5.1,0.15,\"opened, then shut\"\n"
            + "2026-03-02T08:00:01Z,FV2,,5.25,,,\n";
    StringBuilder out = new StringBuilder();
    LogWriter writer =
        new LogWriter(
            out,
            new LogWriter.Columns(
                List.of(Quantity.PRESSURE, Quantity.TEMPERATURE, Quantity.DISSOLVED), true, true));
    writer.header();
    read(text).forEach(writer::write);
    assertEquals(text, out.toString());
  }

  private List<LogRow> read(String text) throws IOException {
    Path file = Files.writeString(folder.resolve("log.csv"), text);
    try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
      return ForeignLogTest.all(reader);
    }
  }
}

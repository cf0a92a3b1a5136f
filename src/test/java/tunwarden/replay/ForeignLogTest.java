package tunwarden.replay;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;

/** Logs of other people's boxes. */
class ForeignLogTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final double[] BAR = {0.873, 0.875, 0.880};
  private static final double[] CELSIUS = {5.25, 5.30, 5.40};

  @TempDir Path folder;

  static Stream<ForeignSamples.Case> samples() {
    return ForeignSamples.all().stream();
  }

  @Test
  void thereAreAtLeastTwentyFiveSamples() {
    assertTrue(ForeignSamples.all().size() >= 25, "samples: " + ForeignSamples.all().size());
  }

  @ParameterizedTest
  @MethodSource("samples")
  void everyWayOfWritingSaysTheSame(ForeignSamples.Case sample) throws IOException {
    Path file = Files.write(folder.resolve("sample.csv"), sample.bytes());
    try (LogReader reader = LogFile.open(file, sample.options()).open()) {
      List<LogRow> rows = all(reader);
      assertEquals(3, rows.size());
      for (int i = 0; i < 3; i++) {
        assertEquals(START.plusSeconds(30L * i), rows.get(i).time());
        assertEquals(BAR[i] * 1e5, value(rows.get(i), Quantity.PRESSURE), 0.2);
        assertEquals(CELSIUS[i] + 273.15, value(rows.get(i), Quantity.TEMPERATURE), 0.0051);
      }
      String said = String.join("; ", reader.notes().sentences());
      boolean expected = sample.said().equals("month first") || said.contains(sample.said());
      assertTrue(expected, "said only: " + said);
    }
  }

  @Test
  void oneRowMaySpeakOfSeveralVessels() throws IOException {
    List<LogRow> rows =
        read(
            "time,FV1 pressure [bar],FV1 temp [°C],FV2 pressure [bar],FV2 temp [°C]",
            "2026-03-02T08:00:00Z,0.9,5,1.2,12");
    assertEquals(List.of("FV1", "FV2"), rows.stream().map(LogRow::vessel).toList());
    assertEquals(1.2e5, value(rows.get(1), Quantity.PRESSURE), 1e-6);
    assertEquals(285.15, value(rows.get(1), Quantity.TEMPERATURE), 1e-9);
  }

  @Test
  void aColumnMayNameTheVessel() throws IOException {
    List<LogRow> rows =
        read(
            "time;tank;P [bar];T [°C]",
            "2026-03-02T08:00:00Z;FV1;0,9;5",
            "2026-03-02T08:00:00Z;FV2;1,2;12");
    assertEquals(List.of("FV1", "FV2"), rows.stream().map(LogRow::vessel).toList());
  }

  /** Vienna leaves summer time on 2026-10-25 at 03:00, which becomes 02:00 again. */
  @Test
  void anHourThatComesTwiceIsToldApart() throws IOException {
    String[] lines = {
      "Zeit;Druck [barg];T [°C]",
      "25.10.2026 01:50:00;0,9;5",
      "25.10.2026 02:20:00;0,9;5",
      "25.10.2026 02:50:00;0,9;5",
      "25.10.2026 02:20:00;0,8;5",
      "25.10.2026 02:50:00;0,8;5",
      "25.10.2026 03:20:00;0,8;5"
    };
    List<LogRow> rows = read(LogOptions.NONE.inZone(ZoneId.of("Europe/Vienna")), lines);
    assertEquals(6, rows.size());
    Instant first = Instant.parse("2026-10-24T23:50:00Z");
    for (int i = 0; i < 6; i++) {
      assertEquals(first.plusSeconds(1800L * i), rows.get(i).time());
    }
  }

  /** Vienna enters summer time on 2026-03-29 at 02:00. */
  @Test
  void anHourThatDoesNotExistIsSaid() throws IOException {
    Path file =
        write(
            "Zeit;Druck [barg];T [°C]",
            "29.03.2026 01:50:00;0,9;5",
            "29.03.2026 02:20:00;0,9;5",
            "29.03.2026 03:50:00;0,9;5");
    LogOptions vienna = LogOptions.NONE.inZone(ZoneId.of("Europe/Vienna"));
    try (LogReader reader = LogFile.open(file, vienna).open()) {
      all(reader);
      String said = String.join("; ", reader.notes().sentences());
      assertTrue(said.contains("1 row inside the hour that the zone's clocks skip"), said);
    }
  }

  @Test
  void unreadableRowsAreCountedAndTheFirstIsShown() throws IOException {
    Path file =
        write(
            "time,P [bar],T [°C]",
            "2026-03-02T08:00:00Z,0.9,5",
            "2026-03-02T08:00:10Z,over,5",
            "yesterday,0.9,5",
            "2026-03-02T08:00:20Z,0.9 psi,5",
            "2026-03-02T08:00:30Z,NaN,5",
            "2026-03-02T08:00:40Z,,5");
    try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
      assertEquals(3, all(reader).size());
      assertEquals(3, reader.notes().unreadable());
      assertEquals("line 3, P [bar]: 'over' is not a number", reader.notes().firstUnreadable());
      String said = String.join("; ", reader.notes().sentences());
      assertTrue(said.contains("1 cell said that there was no value"), said);
    }
  }

  @Test
  void aCellInAnotherUnitThanItsColumnIsRefused() throws IOException {
    Path file =
        write("time,P [bar],T [°C]", "2026-03-02T08:00:00Z,0.9,5", "2026-03-02T08:00:10Z,13 psi,5");
    try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
      assertEquals(1, all(reader).size());
      assertEquals(
          "line 3, P [bar]: '13 psi' while the column is in bar gauge",
          reader.notes().firstUnreadable());
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "=the file is empty",
        "\n\n# nothing\n=holds no line of names",
        "reading\n0.9\n0.8\n=only one column",
        "time,P [bar]\n=holds no rows|no row below this line",
        "P [bar],T [C]\n0.9,5\n=no row below this line holds a time",
        "time,P [bar],T [C]\n2026-03-02T08:00:00Z,NaN,NaN\n2026-03-02T08:00:10Z,NaN,NaN\n=number",
        "time,bananas,T [C]\n2026-03-02T08:00:00Z,4,5\n=recognised as the pressure",
        "time,P,T [C]\n2026-03-02T08:00:00Z,85,5\n=states no unit",
        "time,P [bar],T [C]\n02.03.2026 08:00,0,873,5,25\n=both the separator and the decimal sign"
      })
  void whatIsNoLogIsRefusedInOneSentence(String textAndPiece) throws IOException {
    int cut = textAndPiece.lastIndexOf('=');
    Path file = Files.writeString(folder.resolve("bad.csv"), textAndPiece.substring(0, cut));
    BadLogException refused =
        assertThrows(
            BadLogException.class,
            () -> {
              try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
                all(reader);
              }
            });
    String[] pieces = textAndPiece.substring(cut + 1).split("\\|");
    assertTrue(
        Stream.of(pieces).anyMatch(piece -> refused.getMessage().contains(piece)),
        refused.getMessage());
    assertTrue(refused.getMessage().startsWith(file.toString()), refused.getMessage());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "pressure=nowhere=there is no column 'nowhere'",
        "volts=P=is none of time",
        "pressure=P/furlong=is not a unit of a pressure",
        "time=time/never=is not a way to write a time",
        "pressure=is not of the form"
      })
  void aWrongColumnsOptionIsRefusedInOneSentence(String optionAndPiece) throws IOException {
    int cut = optionAndPiece.lastIndexOf('=');
    Path file = write("time,P,T [C]", "2026-03-02T08:00:00Z,0.9,5");
    LogOptions options = LogOptions.NONE.withColumns(optionAndPiece.substring(0, cut));
    BadLogException refused =
        assertThrows(BadLogException.class, () -> LogFile.open(file, options));
    assertTrue(
        refused.getMessage().contains(optionAndPiece.substring(cut + 1)), refused.getMessage());
    assertEquals("--columns", refused.field());
  }

  @Test
  void aLogWrittenNewestFirstIsRefused() throws IOException {
    StringBuilder text = new StringBuilder("time,P [bar],T [C]\n");
    for (int i = 400; i > 0; i--) {
      text.append(START.plusSeconds(10L * i)).append(",0.9,5\n");
    }
    Path file = Files.writeString(folder.resolve("log.csv"), text);
    try (LogReader reader = LogFile.open(file, LogOptions.NONE).open()) {
      BadLogException refused = assertThrows(BadLogException.class, () -> all(reader));
      assertTrue(refused.getMessage().contains("turn the log round"), refused.getMessage());
    }
  }

  private List<LogRow> read(String... lines) throws IOException {
    return read(LogOptions.NONE, lines);
  }

  private List<LogRow> read(LogOptions options, String... lines) throws IOException {
    try (LogReader reader = LogFile.open(write(lines), options).open()) {
      return all(reader);
    }
  }

  private Path write(String... lines) throws IOException {
    String text = String.join("\n", lines) + "\n";
    return Files.writeString(folder.resolve("log.csv"), text, StandardCharsets.UTF_8);
  }

  static List<LogRow> all(RowSource source) throws IOException {
    List<LogRow> rows = new ArrayList<>();
    for (LogRow row = source.next(); row != null; row = source.next()) {
      rows.add(row);
    }
    return rows;
  }

  static double value(LogRow row, Quantity quantity) {
    return row.samples().stream()
        .filter(s -> s instanceof Reading reading && reading.quantity() == quantity)
        .mapToDouble(s -> ((Reading) s).value())
        .findFirst()
        .orElseThrow();
  }
}

package tunwarden.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.function.BooleanSupplier;
import java.util.zip.GZIPInputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.alarm.Assessments;
import tunwarden.estimate.EventKind;
import tunwarden.estimate.Outcome;
import tunwarden.estimate.Step;
import tunwarden.journal.disk.Disk;
import tunwarden.reading.Fault;
import tunwarden.reading.Mark;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.units.BadInputException;

/** Recording as a whole: files, rotation, compression, retention, full disk. */
class RecorderTest {
  private static final Instant NOON = Instant.parse("2026-03-02T12:00:00Z");
  private static final RecorderSettings QUICK =
      new RecorderSettings(
          Duration.ofMillis(20),
          1000,
          Duration.ofMinutes(1),
          Duration.ofMillis(50),
          new RecorderSettings.Keep(100, 1 << 30, 1000, true),
          Duration.ofHours(6));

  @TempDir private Path folder;
  private final FaultyDisk disk = new FaultyDisk();
  private volatile Instant now = NOON;
  private final InstantSource clock = () -> now;

  private Recorder open(RecorderSettings settings) throws IOException {
    return Recorder.open(folder, (Disk) disk, settings, clock);
  }

  private static void give(Recorder recorder, Sample sample) {
    recorder.sampled(sample, new Step(Outcome.ACCEPTED, Quality.GOOD, "", null, List.of()));
  }

  private static void row(Recorder recorder, Instant at, double bar, double celsius) {
    give(recorder, Reading.good(at, "FV2", Quantity.TEMPERATURE, celsius + 273.15));
    give(recorder, Reading.good(at, "FV2", Quantity.PRESSURE, bar * 1e5));
  }

  private static void await(BooleanSupplier condition) throws InterruptedException {
    long end = System.nanoTime() + Duration.ofSeconds(10).toNanos();
    while (!condition.getAsBoolean()) {
      assertTrue(System.nanoTime() < end, "waited ten seconds in vain");
      Thread.sleep(5);
    }
  }

  private List<String> readings(String day) throws IOException {
    return Files.readAllLines(folder.resolve("readings/FV2/" + day + ".csv"));
  }

  private List<JournalLines.Numbered> journal() throws IOException {
    return new JournalReader(disk, folder.resolve("journal")).find(n -> true, 1000);
  }

  @Test
  void rowsGoToTheFileOfTheirDay() throws IOException {
    try (Recorder recorder = open(QUICK)) {
      recorder.start();
      row(recorder, Instant.parse("2026-03-01T23:59:59Z"), 0.873, 5.25);
      row(recorder, Instant.parse("2026-03-02T00:00:00.5Z"), 0.874, 5.26);
      give(recorder, new Mark(NOON, "FV2", "valve closed, by hand"));
    }
    assertEquals(
        List.of(RecordFiles.COLUMNS.header(), "2026-03-01T23:59:59Z,0.873,5.25,,,,,,,"),
        readings("2026-03-01"));
    assertEquals(
        "2026-03-02T12:00:00Z,,,,,,,,,\"valve closed, by hand\"", readings("2026-03-02").get(2));
    assertEquals("valve closed, by hand", journal().get(0).entry().text());
  }

  @Test
  void badValuesLeaveNoRowButAreExplainedInTheJournal() throws IOException {
    try (Recorder recorder = open(QUICK)) {
      recorder.start();
      row(recorder, NOON, 0.873, 5.25);
      give(recorder, new Fault(NOON, "FV2", Quantity.PRESSURE, Quality.PORT_GONE, "unplugged"));
      give(recorder, new Fault(NOON, "FV2", Quantity.PRESSURE, Quality.PORT_GONE, "unplugged"));
    }
    assertEquals(2, readings("2026-03-02").size());
    assertEquals(
        List.of("The pressure reading: the serial port is gone (unplugged)."),
        journal().stream().map(n -> n.entry().text()).toList());
  }

  @Test
  void estimatesAreRecordedOnceAMinute() throws IOException {
    try (Recorder recorder = open(QUICK)) {
      recorder.start();
      for (int t = 0; t < 150; t += 10) {
        recorder.assessed(Assessments.of("FV2").at(t).build());
      }
    }
    List<String> lines = Files.readAllLines(folder.resolve("estimates/FV2/2026-03-02.csv"));
    assertEquals(4, lines.size());
    assertEquals(
        "2026-03-02T06:01:00Z,0.80000,4.000,5.3000,0.2000,5.5000,0.9000,0.0400,0.5900,sealed",
        lines.get(2));
  }

  @Test
  void aSecondProgramIsToldThatTheFolderIsInUse() throws IOException {
    try (Recorder recorder = open(QUICK)) {
      recorder.start();
      String words = assertThrows(BadInputException.class, () -> open(QUICK)).getMessage();
      assertTrue(words.contains("in use"), words);
    }
    open(QUICK).close();
  }

  @Test
  void listenersHearOfAnEntryOnlyAfterItIsOnTheDisk() throws Exception {
    List<Boolean> wasOnDisk = new CopyOnWriteArrayList<>();
    try (Recorder recorder = open(QUICK)) {
      recorder.listen(
          (entries, durable) -> {
            try {
              String text = Files.readString(folder.resolve("journal/2026-03.jsonl"));
              wasOnDisk.add(
                  durable
                      && text.endsWith(JournalLines.line(entries.get(entries.size() - 1)) + "\n"));
            } catch (IOException e) {
              wasOnDisk.add(false);
            }
          });
      recorder.start();
      for (int i = 0; i < 20; i++) {
        recorder.write(JournalEntry.station(NOON, "test", "entry " + i));
        Thread.sleep(3);
      }
      await(() -> !wasOnDisk.isEmpty());
    }
    assertFalse(wasOnDisk.contains(false));
  }

  @Test
  void numbersGoOnAfterARestart() throws IOException {
    for (int run = 0; run < 3; run++) {
      try (Recorder recorder = open(QUICK)) {
        recorder.start();
        recorder.write(JournalEntry.station(NOON, "test", "run " + run));
        recorder.assessed(Assessments.of("FV2").event(EventKind.VENT, 0, false).build());
      }
    }
    assertEquals(
        List.of(1L, 2L, 3L, 4L, 5L, 6L),
        journal().stream().map(JournalLines.Numbered::number).toList());
  }

  @Test
  void aTornTailIsRepairedAndSaid() throws IOException {
    Path day = folder.resolve("readings/FV2/2026-03-02.csv");
    Files.createDirectories(day.getParent());
    Files.writeString(day, RecordFiles.COLUMNS.header() + "\n2026-03-02T11:00:00Z,0.8");
    try (Recorder recorder = open(QUICK)) {
      assertEquals(1, recorder.repairs().size());
      recorder.start();
      row(recorder, NOON, 0.873, 5.25);
    }
    assertEquals(2, readings("2026-03-02").size());
    assertTrue(journal().get(0).entry().text().contains("in the middle of a line: 24 bytes"));
  }

  @Test
  void aFullQueueDropsReadingsAndCountsThemButNeverAnEntry() throws IOException {
    RecorderSettings small =
        new RecorderSettings(
            Duration.ofMillis(20),
            10,
            Duration.ofMinutes(1),
            Duration.ofMillis(50),
            QUICK.keep(),
            Duration.ofHours(6));
    Recorder recorder = open(small);
    for (int i = 0; i < 50; i++) {
      row(recorder, NOON.plusSeconds(i), 0.8, 5);
      recorder.write(JournalEntry.station(NOON, "alarm", "number " + i));
    }
    assertEquals(10, recorder.accepted());
    assertEquals(90, recorder.dropped());
    recorder.start();
    recorder.close();
    assertEquals(50, journal().size());
  }

  @Test
  void aFullDiskStopsRecordingWithAWordAndItResumesByItself() throws Exception {
    List<String> words = new CopyOnWriteArrayList<>();
    List<Boolean> durable = new CopyOnWriteArrayList<>();
    try (Recorder recorder = open(QUICK)) {
      recorder.watchDisk((failing, text) -> words.add(failing + " " + text));
      recorder.listen((entries, safe) -> durable.add(safe));
      recorder.start();
      row(recorder, NOON, 0.8, 5);
      await(() -> recorder.waiting() == 0);
      disk.room.set(30);
      row(recorder, NOON.plusSeconds(1), 0.81, 5);
      await(recorder::isFailing);
      recorder.write(JournalEntry.station(NOON, "alarm", "told while the disk is full"));
      await(() -> durable.contains(false));
      disk.room.set(Long.MAX_VALUE);
      await(() -> !recorder.isFailing());
    }
    assertTrue(words.get(0).contains("No space left on device. Watching goes on."), words.get(0));
    assertEquals("false Recording has resumed.", words.get(words.size() - 1));
    assertEquals(3, readings("2026-03-02").size());
    assertTrue(
        journal().stream().anyMatch(n -> n.entry().text().equals("told while the disk is full")));
    for (JournalLines.Numbered line : journal()) {
      assertTrue(line.number() > 0);
    }
  }

  @Test
  void closedDaysAreCompressedAndTheOldestGoFirstWhenTheDiskIsFull() throws Exception {
    try (Recorder recorder = open(QUICK)) {
      recorder.start();
      for (int day = 5; day > 0; day--) {
        row(recorder, NOON.minus(Duration.ofDays(day)), 0.8, day);
      }
    }
    try (Recorder recorder = open(QUICK)) {
      recorder.start();
      Path last = folder.resolve("readings/FV2/2026-03-01.csv.gz");
      await(
          () -> Files.exists(last) && !Files.exists(folder.resolve("readings/FV2/2026-03-01.csv")));
      assertEquals(2, unpack(last).size());
      disk.usable.set(900);
      row(recorder, NOON, 0.8, 5);
      Path first = folder.resolve("readings/FV2/2026-02-25.csv.gz");
      await(() -> !Files.exists(first));
      assertTrue(Files.exists(last), "the newest closed day stays");
      await(() -> recorder.waiting() == 0);
    }
    assertTrue(journal().stream().anyMatch(n -> n.entry().kind().equals("retention")));
  }

  @Test
  void withoutLeaveToDeleteTheOldDaysStayAndRecordingStops() throws Exception {
    RecorderSettings keepAll = QUICK.withKeep(new RecorderSettings.Keep(100, 1 << 30, 1000, false));
    Path old = folder.resolve("readings/FV2/2026-01-01.csv.gz");
    Files.createDirectories(old.getParent());
    Files.writeString(old, "not looked into");
    disk.usable.set(900);
    try (Recorder recorder = open(keepAll)) {
      recorder.start();
      row(recorder, NOON, 0.8, 5);
      await(recorder::isFailing);
      assertTrue(Files.exists(old));
      disk.usable.set(5000);
      await(() -> !recorder.isFailing());
    }
    assertEquals(2, readings("2026-03-02").size());
  }

  @Test
  void daysOlderThanIsKeptGo() throws Exception {
    Path old = folder.resolve("readings/FV2/2025-11-01.csv.gz");
    Path mine = folder.resolve("readings/FV2/notes.txt");
    Files.createDirectories(old.getParent());
    Files.writeString(old, "x");
    Files.writeString(mine, "x");
    try (Recorder recorder = open(QUICK)) {
      recorder.start();
      await(() -> !Files.exists(old));
    }
    assertTrue(Files.exists(mine), "a file somebody put there is left alone");
  }

  static List<String> unpack(Path file) throws IOException {
    try (BufferedReader lines =
        new BufferedReader(
            new InputStreamReader(
                new GZIPInputStream(Files.newInputStream(file)), StandardCharsets.UTF_8))) {
      return lines.lines().toList();
    }
  }
}

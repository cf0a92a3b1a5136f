package tunwarden.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentSkipListSet;
import java.util.zip.GZIPInputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmCounts;
import tunwarden.alarm.AlarmSettings;
import tunwarden.estimate.Outcome;
import tunwarden.estimate.Step;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;

/**
 * The power fails at a random operation of a simulated disk that forgets what was not made durable:
 * harder than a killed process, whose written bytes the system keeps. A day that is just being
 * compressed is in it too.
 */
class PowerCutTest {
  private static final Instant NOON = Instant.parse("2026-03-02T12:00:00Z");
  private static final int CUTS = 200;
  private static final int READINGS = 12;
  private static final RecorderSettings QUICK =
      new RecorderSettings(
          Duration.ofMillis(1),
          1000,
          Duration.ofMinutes(1),
          Duration.ofMillis(1),
          new RecorderSettings.Keep(100, 1 << 30, 0, true),
          Duration.ofHours(6));

  @TempDir private Path folder;

  @Test
  void nothingReportedIsLostWhereverThePowerFails() throws Exception {
    PowerCutDisk uncut = prepared();
    record(uncut);
    long operations = uncut.operations();
    assertTrue(operations > 60, "too few operations to cut: " + operations);
    SplittableRandom random = new SplittableRandom(4711);
    int cutShort = 0;
    for (int i = 0; i < CUTS; i++) {
      PowerCutDisk disk = prepared();
      disk.cutAt(random.nextLong(operations));
      Set<String> reported = record(disk);
      cutShort += disk.isCut() ? 1 : 0;
      check(disk.afterPowerReturns(random), reported, "cut " + i);
    }
    assertTrue(cutShort > CUTS * 9 / 10, "too few runs were cut short: " + cutShort);
  }

  /** Yesterday's rows lie there plain, waiting to be compressed. */
  private PowerCutDisk prepared() {
    PowerCutDisk disk = new PowerCutDisk();
    StringBuilder rows = new StringBuilder(RecordFiles.COLUMNS.header() + "\n");
    for (int i = 0; i < 5; i++) {
      rows.append("2026-03-01T00:00:0" + i + "Z,0.0000" + i + ",,,,,,,,\n");
    }
    disk.put(
        folder.resolve("readings/FV2/2026-03-01.csv"),
        rows.toString().getBytes(StandardCharsets.UTF_8));
    return disk;
  }

  /** Records for a moment; returns the alarm entries that were reported as safe. */
  private Set<String> record(PowerCutDisk disk) throws InterruptedException {
    Set<String> reported = new ConcurrentSkipListSet<>();
    try (Recorder recorder = Recorder.open(folder, disk, QUICK, () -> NOON)) {
      recorder.listen(
          (entries, durable) ->
              entries.stream()
                  .filter(n -> durable && n.entry().kind().equals(JournalEntry.ALARM))
                  .forEach(n -> reported.add(n.entry().text())));
      recorder.start();
      for (int i = 0; i < READINGS; i++) {
        recorder.sampled(
            Reading.good(NOON.plusSeconds(i), "FV2", Quantity.PRESSURE, i),
            new Step(Outcome.ACCEPTED, Quality.GOOD, "", null, List.of()));
        JournalEntry entry = JournalEntry.station(NOON, JournalEntry.ALARM, "alarm " + i);
        recorder.write(List.of(entry), new SavedState(NOON, bookAfter(i + 1), Map.of())::bytes);
        Thread.sleep(1);
      }
    } catch (IOException noPower) {
      assertTrue(disk.isCut(), noPower::toString);
    }
    return reported;
  }

  /** A book in which so many alarms were raised. */
  private static AlarmBook bookAfter(int raised) {
    AlarmCounts counts = new AlarmCounts(raised, 0, 0, false, List.of());
    return AlarmBook.restored(AlarmSettings.DEFAULT, List.of(), counts);
  }

  private void check(PowerCutDisk disk, Set<String> reported, String where) throws Exception {
    // The folder opens, is repaired, and takes new entries.
    try (Recorder recorder = Recorder.open(folder, disk, QUICK, () -> NOON)) {
      recorder.start();
      recorder.write(JournalEntry.station(NOON, "start", "again"));
    }
    long inBook =
        SavedState.read(disk, folder.resolve("state.json"), AlarmSettings.DEFAULT)
            .map(state -> state.book().counts().raised())
            .orElse(0L);
    Set<String> alarms = new TreeSet<>();
    List<String> today = new ArrayList<>();
    Set<String> yesterday = new TreeSet<>();
    for (Map.Entry<Path, byte[]> file : disk.contents().entrySet()) {
      String name = file.getKey().getFileName().toString();
      List<String> lines = lines(name, file.getValue(), where);
      if (name.endsWith(".jsonl")) {
        lines.forEach(l -> alarms.add(JournalLines.read(l).orElseThrow().entry().text()));
      } else if (name.startsWith("2026-03-02")) {
        today.addAll(lines.subList(Math.min(1, lines.size()), lines.size()));
      } else if (name.startsWith("2026-03-01") && !name.endsWith(".new")) {
        assertEquals(6, lines.size(), where + " " + name);
        yesterday.addAll(lines);
      }
    }
    assertTrue(alarms.containsAll(reported), where + ": " + reported + " but " + alarms);
    assertTrue(alarms.contains("again"), where);
    long inJournal = alarms.stream().filter(text -> text.startsWith("alarm ")).count();
    assertEquals(inJournal, inBook, where + ": the book and the journal tell different stories");
    assertEquals(6, yesterday.size(), where);
    for (int i = 0; i < today.size(); i++) {
      String stamp = NOON.plusSeconds(i).toString();
      assertTrue(today.get(i).startsWith(stamp), where + ": " + today.get(i));
      assertEquals(9, today.get(i).chars().filter(c -> c == ',').count(), where);
    }
  }

  private static List<String> lines(String name, byte[] content, String where) throws IOException {
    var in = new ByteArrayInputStream(content);
    try (BufferedReader lines =
        new BufferedReader(
            new InputStreamReader(
                name.endsWith(".gz") ? new GZIPInputStream(in) : in, StandardCharsets.UTF_8))) {
      boolean plain = name.endsWith(".csv") || name.endsWith(".jsonl");
      boolean whole = content.length == 0 || content[content.length - 1] == '\n';
      assertTrue(!plain || whole, where + ": " + name + " is torn");
      return lines.lines().toList();
    }
  }
}

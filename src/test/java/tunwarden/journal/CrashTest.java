package tunwarden.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.InstantSource;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.alarm.AlarmSettings;
import tunwarden.journal.disk.RealDisk;

/**
 * Kills a recording process with SIGKILL at random moments, its start included. After each kill no
 * alarm entry that was reported may be missing, at most one flush interval of readings may be gone,
 * and every line of every file must be whole once the folder has been opened again.
 */
class CrashTest {
  private static final int FLUSH_MS = 100;

  /** Allowance for a busy machine, on which the recorder's thread may be woken late. */
  private static final int LATE_MS = 400;

  @TempDir private Path folder;
  private final TreeMap<Integer, Long> given = new TreeMap<>();
  private final Set<String> reported = new HashSet<>();
  private int killedWhileWriting;

  @Test
  void nothingReportedIsLostInTwoHundredKills() throws Exception {
    killMany(200, 20260302);
  }

  @Test
  @Tag("long")
  void nothingReportedIsLostInThreeHundredKills() throws Exception {
    killMany(300, System.nanoTime());
  }

  private void killMany(int kills, long seed) throws Exception {
    SplittableRandom random = new SplittableRandom(seed);
    for (int kill = 0; kill < kills; kill++) {
      String where = "kill " + kill + " of seed " + seed;
      runAndKill(random);
      if (kill % 2 == 0) {
        // Every other time the next child finds the folder as the kill left it.
        checkWhatWasKept(where);
      }
    }
    checkWhatWasKept("last kill of seed " + seed);
    assertTrue(killedWhileWriting > kills / 2, "too few kills hit a writing process");
  }

  private void runAndKill(SplittableRandom random) throws Exception {
    int first = given.isEmpty() ? 1 : given.lastKey() + 1;
    Process child =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-XX:TieredStopAtLevel=1",
                "-XX:+UseSerialGC",
                "-Xshare:auto",
                "-cp",
                System.getProperty("java.class.path"),
                CrashChild.class.getName(),
                folder.toString(),
                String.valueOf(first),
                String.valueOf(FLUSH_MS))
            .redirectError(beside(".err").toFile())
            .redirectOutput(beside(".out").toFile())
            .start();
    boolean started = random.nextInt(8) > 0;
    if (started) {
      waitUntilReady();
    }
    TimeUnit.MILLISECONDS.sleep(random.nextInt(started ? 300 : 250));
    child.destroyForcibly();
    assertTrue(child.waitFor(10, TimeUnit.SECONDS));
    assertEquals(128 + 9, child.exitValue(), () -> errors());
    int before = given.size();
    Files.readAllLines(beside(".out")).forEach(this::note);
    killedWhileWriting += given.size() > before ? 1 : 0;
  }

  private void waitUntilReady() throws Exception {
    long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(30);
    while (Files.size(beside(".out")) == 0) {
      assertTrue(System.nanoTime() < end, () -> "the child did not start: " + errors());
      TimeUnit.MILLISECONDS.sleep(3);
    }
  }

  private Path beside(String ending) {
    return folder.resolveSibling(folder.getFileName() + ending);
  }

  private String errors() {
    try {
      return Files.readString(beside(".err"));
    } catch (IOException e) {
      return e.toString();
    }
  }

  private void note(String line) {
    String[] words = line.split(" ");
    if (words[0].equals("R") && words.length == 3) {
      given.put(Integer.parseInt(words[1]), Long.parseLong(words[2]));
    } else if (words[0].equals("A")) {
      reported.add(words[1]);
    }
  }

  private void checkWhatWasKept(String where) throws IOException {
    // A start repairs; a folder still locked or unreadable would throw here.
    try (Recorder recorder =
        Recorder.open(folder, new RealDisk(), RecorderSettings.USUAL, InstantSource.system())) {
      recorder.start();
    }
    Set<String> kept = new HashSet<>();
    for (String line : lines("journal", ".jsonl")) {
      JournalLines.read(line).orElseThrow(() -> new AssertionError(where + ": " + line));
      kept.add(JournalLines.read(line).orElseThrow().entry().text());
    }
    Set<String> missing = new HashSet<>(reported);
    missing.removeAll(kept);
    assertEquals(Set.of(), missing, where);
    checkReadings(where);
    long inBook =
        SavedState.read(new RealDisk(), folder.resolve("state.json"), AlarmSettings.DEFAULT)
            .map(state -> state.book().counts().raised())
            .orElse(0L);
    long inJournal =
        kept.stream().filter(text -> text.matches("\\d+")).mapToLong(Long::valueOf).max().orElse(0);
    assertEquals(inJournal, inBook, where + ": the book is not that of the last alarm told");
  }

  private void checkReadings(String where) throws IOException {
    int fields = RecordFiles.COLUMNS.header().split(",", -1).length;
    Set<Integer> kept = new HashSet<>();
    for (String line : lines("readings/FV2", ".csv")) {
      String[] cells = line.split(",", -1);
      assertEquals(fields, cells.length, where + ": " + line);
      if (!cells[0].equals("time")) {
        kept.add((int) Math.round(Double.parseDouble(cells[1]) * 1e5));
      }
    }
    // Of each life of the child, only its last moments may be missing.
    List<Integer> lost = new ArrayList<>();
    for (int n : given.keySet()) {
      if (!kept.contains(n)) {
        lost.add(n);
      }
    }
    for (int n : lost) {
      assertFalse(
          given.get(n) < endOfLife(n) - FLUSH_MS - LATE_MS, where + ": reading " + n + " is gone");
    }
  }

  /** When the child that gave reading {@code n} spoke last: a life has no pauses to speak of. */
  private long endOfLife(int n) {
    long last = given.get(n);
    for (long at : given.tailMap(n).values()) {
      if (at - last > 150) {
        return last;
      }
      last = at;
    }
    return last;
  }

  private List<String> lines(String below, String ending) throws IOException {
    List<String> lines = new ArrayList<>();
    Path directory = folder.resolve(below);
    if (!Files.isDirectory(directory)) {
      return lines;
    }
    try (Stream<Path> files = Files.list(directory)) {
      for (Path file : files.filter(f -> f.toString().endsWith(ending)).sorted().toList()) {
        String text = Files.readString(file);
        assertTrue(text.isEmpty() || text.endsWith("\n"), file + " is torn");
        lines.addAll(text.lines().toList());
      }
    }
    return lines;
  }
}

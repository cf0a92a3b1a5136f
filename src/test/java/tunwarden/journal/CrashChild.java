package tunwarden.journal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.Map;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmCounts;
import tunwarden.alarm.AlarmSettings;
import tunwarden.estimate.Outcome;
import tunwarden.estimate.Step;
import tunwarden.journal.disk.RealDisk;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;

/**
 * The process that the crash test kills: records a counter as a pressure at 100 Hz, an alarm entry
 * and the book it leads to with every third reading, and says on standard output what it has done:
 * {@code R n} for a reading handed in, {@code A n} for an entry reported as safe.
 */
final class CrashChild {
  private static final int LONGEST_LIFE = 3000;

  private CrashChild() {}

  public static void main(String[] args) throws Exception {
    Path folder = Path.of(args[0]);
    int first = Integer.parseInt(args[1]);
    RecorderSettings settings =
        RecorderSettings.USUAL.withFlush(Duration.ofMillis(Long.parseLong(args[2])));
    Recorder recorder = Recorder.open(folder, new RealDisk(), settings, InstantSource.system());
    recorder.listen(
        (entries, durable) ->
            entries.stream()
                .filter(n -> durable && n.entry().kind().equals(JournalEntry.ALARM))
                .forEach(n -> say("A " + n.entry().text())));
    recorder.start();
    say("ready");
    long next = System.nanoTime();
    for (int n = first; n < first + LONGEST_LIFE; n++) {
      give(recorder, n);
      next += 10_000_000;
      long left = next - System.nanoTime();
      if (left > 0) {
        Thread.sleep(left / 1_000_000, (int) (left % 1_000_000));
      }
    }
  }

  private static void give(Recorder recorder, int n) {
    Instant now = Instant.now();
    recorder.sampled(
        Reading.good(now, "FV2", Quantity.PRESSURE, n),
        new Step(Outcome.ACCEPTED, Quality.GOOD, "", null, List.of()));
    say("R " + n + " " + now.toEpochMilli());
    if (n % 3 == 0) {
      JournalEntry entry = JournalEntry.station(now, JournalEntry.ALARM, String.valueOf(n));
      AlarmCounts counts = new AlarmCounts(n, 0, 0, false, List.of());
      AlarmBook book = AlarmBook.restored(AlarmSettings.DEFAULT, List.of(), counts);
      recorder.write(List.of(entry), new SavedState(now, book, Map.of())::bytes);
    }
  }

  /** One system call a line, so that a kill never leaves a line in a buffer of ours. */
  private static synchronized void say(String line) {
    byte[] bytes = (line + "\n").getBytes(StandardCharsets.US_ASCII);
    try {
      System.out.write(bytes);
      System.out.flush();
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }
}

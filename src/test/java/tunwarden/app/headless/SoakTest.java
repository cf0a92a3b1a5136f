package tunwarden.app.headless;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.atomic.AtomicLong;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmSettings;
import tunwarden.alarm.Assessments;
import tunwarden.alarm.Transition;
import tunwarden.app.board.Assembly;
import tunwarden.estimate.Estimators;
import tunwarden.journal.Entries;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.JournalReader;
import tunwarden.journal.Recorder;
import tunwarden.journal.RecorderSettings;
import tunwarden.journal.disk.RealDisk;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.serve.LatestState;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Station;
import tunwarden.station.StationSettings;
import tunwarden.vessel.Vessel;

/**
 * Simulated hours with unplugged ports, values that are no numbers, floods of readings and a clock
 * that steps back an hour: nothing grows, and every alarm transition is in the journal.
 */
class SoakTest {
  private static final int STEP_S = 10;
  private static final int VESSELS = 2;
  private static final long ALLOWED_GROWTH = 12L << 20;

  @TempDir private Path folder;
  private final List<Vessel> vessels = new ArrayList<>();
  private final AtomicLong transitions = new AtomicLong();
  private volatile Instant now = Assessments.START;
  private Recorder recorder;
  private Station station;

  @Test
  void twoHoursWithFaults() throws Exception {
    soak(2);
  }

  @Test
  @Tag("long")
  void aDayWithFaults() throws Exception {
    soak(24);
  }

  private record Use(long heap, long threads, long descriptors) {
    static Use now() throws IOException {
      System.gc();
      Runtime runtime = Runtime.getRuntime();
      Path open = Path.of("/proc/self/fd");
      long descriptors = 0;
      if (Files.isDirectory(open)) {
        try (Stream<Path> all = Files.list(open)) {
          descriptors = all.count();
        }
      }
      return new Use(
          runtime.totalMemory() - runtime.freeMemory(), Thread.activeCount(), descriptors);
    }
  }

  private void soak(int hours) throws Exception {
    for (int i = 0; i < VESSELS; i++) {
      vessels.add(Assessments.vessel("FV" + i));
    }
    recorder =
        Recorder.open(
            folder,
            new RealDisk(),
            RecorderSettings.USUAL.withFlush(Duration.ofMillis(200)),
            () -> now);
    AlarmKeeper alarms =
        new AlarmKeeper(
            AlarmBook.empty(AlarmSettings.DEFAULT),
            List.of(AlarmKeeper.Listener.each(this::changed)));
    station =
        new Station(
            vessels,
            Estimators.standard(),
            Assembly.FORECASTS,
            StationSettings.USUAL,
            List.of(alarms, recorder, new LatestState()));
    recorder.start();
    long steps = hours * 3600L / STEP_S;
    run(0, steps / 4);
    Use before = Use.now();
    run(steps / 4, steps);
    Use after = Use.now();
    recorder.close();
    assertEquals(0, recorder.dropped());
    assertTrue(after.heap() - before.heap() < ALLOWED_GROWTH, before + " then " + after);
    assertTrue(after.threads() <= before.threads(), before + " then " + after);
    assertTrue(after.descriptors() <= before.descriptors() + 2, before + " then " + after);
    long recorded =
        new JournalReader(new RealDisk(), folder.resolve("journal"))
            .find(n -> n.entry().kind().equals(JournalEntry.ALARM), Integer.MAX_VALUE)
            .size();
    assertEquals(transitions.get(), recorded);
    assertTrue(recorded > 3L * hours, "a soak without alarms proves little: " + recorded);
  }

  private void changed(Transition transition) {
    transitions.incrementAndGet();
    recorder.write(Entries.of(transition));
  }

  private void run(long from, long to) throws InterruptedException {
    SplittableRandom random = new SplittableRandom(from);
    for (long step = from; step < to; step++) {
      long seconds = step * STEP_S;
      long backS = seconds > to * STEP_S * 2 / 3 ? 3600 : 0;
      now = Assessments.START.plusSeconds(seconds - backS);
      for (Vessel vessel : vessels) {
        give(vessel.id(), seconds, random);
      }
      station.tick(now.plusSeconds(1));
      while (recorder.waiting() > 20_000) {
        Thread.sleep(5);
      }
    }
  }

  private void give(String vessel, long seconds, SplittableRandom random) {
    long inHour = seconds % 3600;
    if (inHour > 1200 && inHour < 1500) {
      station.accept(new Fault(now, vessel, Quantity.PRESSURE, Quality.PORT_GONE, "unplugged"));
      return;
    }
    if (random.nextInt(50) == 0) {
      station.accept(new Fault(now, vessel, Quantity.PRESSURE, Quality.NOT_FINITE, "NaN"));
      return;
    }
    int times = random.nextInt(500) == 0 ? 300 : 1;
    double bar = 0.9 + 0.45 * Math.sin(seconds / 1500.0) + random.nextDouble(-0.002, 0.002);
    for (int i = 0; i < times; i++) {
      Instant at = now.plusMillis(i);
      station.accept(Reading.good(at, vessel, Quantity.TEMPERATURE, 278.15));
      station.accept(Reading.good(at, vessel, Quantity.PRESSURE, bar * 1e5));
    }
  }
}

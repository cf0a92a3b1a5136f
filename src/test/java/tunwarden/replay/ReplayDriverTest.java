package tunwarden.replay;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.BooleanSupplier;
import org.junit.jupiter.api.Test;

/** The clock and the thread of a replay. */
class ReplayDriverTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final long SECOND = 1_000_000_000L;

  @Test
  void dataTimeRunsAtThePace() {
    ReplayClock clock = new ReplayClock(START, 0, 60, false);
    assertEquals(START.plusSeconds(120), clock.dataTime(2 * SECOND));
    assertEquals(SECOND / 2, clock.nanosUntil(START.plusSeconds(30), 0));
    ReplayClock slow = clock.withPace(1, 2 * SECOND);
    assertEquals(START.plusSeconds(121), slow.dataTime(3 * SECOND));
    ReplayClock still = slow.withPaused(true, 3 * SECOND);
    assertEquals(START.plusSeconds(121), still.dataTime(99 * SECOND));
    assertEquals(
        START.plusSeconds(122), still.withPaused(false, 99 * SECOND).dataTime(100 * SECOND));
  }

  @Test
  void aWholeLogIsPlayedAndStandsAtItsEnd() throws Exception {
    try (Bench bench = new Bench(1000)) {
      bench.driver.start();
      bench.until(() -> bench.driver.status().ended());
      assertEquals(500, bench.driver.status().rows());
      assertTrue(bench.driver.status().paused());
    }
  }

  @Test
  void seekGoesBackAndStepGoesOneRowOn() throws Exception {
    try (Bench bench = new Bench(1000)) {
      bench.driver.pause(true);
      bench.driver.start();
      bench.driver.seek(START.plusSeconds(2000));
      bench.until(() -> bench.driver.status().rows() == 201);
      bench.driver.seekBy(Duration.ofSeconds(-1500));
      bench.until(() -> bench.driver.status().rows() == 51);
      bench.driver.step();
      bench.until(() -> bench.driver.status().rows() == 52);
      bench.driver.seekBy(Duration.ofDays(-5));
      bench.until(() -> bench.driver.status().rows() == 1);
      assertEquals(START, bench.driver.status().at());
    }
  }

  @Test
  void aLongWayThroughTheLogIsFollowedAndCanBeStopped() throws Exception {
    AtomicLong seen = new AtomicLong();
    try (Bench bench = new Bench(1000)) {
      bench.driver.pause(true);
      bench.target.onSample =
          () -> {
            if (seen.incrementAndGet() == 120) {
              bench.driver.stopSeeking();
            }
          };
      bench.driver.start();
      bench.driver.seek(START.plusSeconds(4000));
      bench.until(() -> seen.get() >= 120 && bench.driver.status().seek().isEmpty());
      assertTrue(bench.driver.status().rows() <= 200, "stands at " + bench.driver.status());
    }
  }

  /** A driver whose waits pass at once while the counter moves on by what was waited for. */
  private static final class Bench implements AutoCloseable {
    private final AtomicLong nanos = new AtomicLong();
    private final ReplayPlayerTest.Listening target = new ReplayPlayerTest.Listening();
    private final ReplayDriver driver;

    Bench(double pace) throws IOException {
      ReplayPlayer player =
          new ReplayPlayer(ReplayPlayerTest.rows(500), target, Duration.ofSeconds(60));
      driver =
          new ReplayDriver(
              player,
              pace,
              nanos::get,
              new ReplayDriver.Waiting() {
                @Override
                public void await(long wait) {
                  nanos.addAndGet(wait);
                  Thread.onSpinWait();
                }

                @Override
                public void wake() {}
              });
    }

    void until(BooleanSupplier reached) throws InterruptedException {
      for (int i = 0; i < 2000 && !reached.getAsBoolean(); i++) {
        Thread.sleep(5);
      }
      assertTrue(reached.getAsBoolean(), "stands at " + driver.status());
    }

    @Override
    public void close() throws IOException {
      driver.close();
    }
  }
}

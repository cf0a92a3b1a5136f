package tunwarden.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.ForwardPoint;

class RecentRiseTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  private static RecentRise after(double hours, double paPerHour, double noisePa) {
    Random random = new Random(5);
    RecentRise rise = RecentRise.NONE;
    for (int minute = 0; minute <= hours * 60; minute++) {
      double pa = 1e5 + paPerHour * minute / 60 + noisePa * random.nextGaussian();
      rise = rise.seen(START.plusSeconds(60L * minute), pa);
    }
    return rise;
  }

  @Test
  void aSteadyRiseIsFound() {
    assertEquals(2400.0 / 3600, after(5.5, 2400, 0).paPerS().orElseThrow(), 1e-9);
    assertEquals(2400.0 / 3600, after(5.5, 2400, 200).paPerS().orElseThrow(), 150.0 / 3600);
  }

  @Test
  void anHourThatHasJustBegunGoesByTheHoursBefore() {
    assertEquals(2400.0 / 3600, after(5.1, 2400, 0).paPerS().orElseThrow(), 1e-9);
  }

  @Test
  void nothingIsSaidTooEarlyOrAfterAFallOrAGap() {
    assertTrue(after(1.2, 2400, 0).paPerS().isEmpty());
    RecentRise rise = after(5.5, 2400, 0);
    assertTrue(rise.seen(START.plusSeconds(20_000), 0.5e5).paPerS().isEmpty());
    assertTrue(rise.seen(START.plusSeconds(90_000), 1.2e5).paPerS().isEmpty());
  }

  @Test
  void aRunThatForeseesTheRiseIsLeftAlone() {
    assertFalse(Contradiction.isThere(run(2400, 500), 2400.0 / 3600));
    assertFalse(Contradiction.isThere(run(0, 500), 200.0 / 3600));
    assertFalse(Contradiction.isThere(run(0, 500), -2400.0 / 3600));
  }

  @Test
  void aFlatRunUnderARisingGaugeFollowsTheGauge() {
    List<ForwardPoint> flat = run(0, 500);
    assertTrue(Contradiction.isThere(flat, 2400.0 / 3600));
    List<ForwardPoint> resolved = Contradiction.resolved(flat, 2400.0 / 3600);
    TimeRange range = new Trend(START, resolved).until(1.24e5).orElseThrow();
    assertEquals(Duration.ofHours(10), range.middle());
    assertTrue(range.low().compareTo(Duration.ofHours(7)) < 0, range.toString());
    assertTrue(range.high().orElseThrow().compareTo(Duration.ofHours(19)) > 0, range.toString());
  }

  private static List<ForwardPoint> run(double paPerHour, double band) {
    List<ForwardPoint> run = new ArrayList<>();
    for (int i = 0; i <= 96; i++) {
      double pa = 1e5 + paPerHour * i / 2;
      run.add(new ForwardPoint(Trend.STEP.multipliedBy(i), pa, pa - band, pa + band));
    }
    return run;
  }
}

package tunwarden.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.Random;
import org.junit.jupiter.api.Test;

class WarmingConstantTest {
  private static final double AMBIENT_K = 297.15;
  private static final double HOUR = 3600;
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  private static WarmingConstant after(double hours, double tauHours, double noiseK) {
    Random random = new Random(7);
    WarmingConstant learnt = WarmingConstant.towards(AMBIENT_K);
    for (int minute = 0; minute <= hours * 60; minute++) {
      double gap = 20 * Math.exp(-minute / 60.0 / tauHours);
      double seen = AMBIENT_K - gap + noiseK * random.nextGaussian();
      learnt = learnt.seen(START.plusSeconds(60L * minute), seen);
    }
    return learnt;
  }

  @Test
  void findsTheConstantOfACleanRun() {
    assertEquals(30 * HOUR, after(6, 30, 0).seconds().orElseThrow(), 1);
  }

  @Test
  void noiseCostsAFewPerCent() {
    assertEquals(30 * HOUR, after(6, 30, 0.1).seconds().orElseThrow(), 0.05 * 30 * HOUR);
  }

  @Test
  void saysNothingFromTooShortARun() {
    assertTrue(after(1, 30, 0).seconds().isEmpty());
  }

  @Test
  void aColdVesselThatStaysColdTeachesNothing() {
    assertTrue(after(48, 1e9, 0.05).seconds().isEmpty());
  }

  @Test
  void coolingStartsANewRun() {
    WarmingConstant learnt = after(6, 30, 0).seen(START.plusSeconds(30_000), AMBIENT_K - 20);
    assertTrue(learnt.seconds().isEmpty());
  }
}

package tunwarden.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import org.junit.jupiter.api.Test;

class GravityTrackTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  @Test
  void aSteadyFallIsTold() {
    GravityTrack track = GravityTrack.NONE;
    for (int minute = 0; minute <= 3 * 1440; minute += 15) {
      track = track.seen(START.plusSeconds(60L * minute), 12 - 2.0 * minute / 1440);
    }
    assertEquals(2, track.dropPlatoPerDay().orElseThrow(), 0.15);
    assertEquals(6, track.newest().orElseThrow().plato(), 0.2, "two hours of smoothing behind");
  }

  @Test
  void valuesByHandOnceADayCountInFull() {
    GravityTrack track = GravityTrack.NONE;
    for (int day = 0; day < 3; day++) {
      track = track.seen(START.plusSeconds(86_400L * day), 8 - 1.5 * day);
    }
    assertEquals(5, track.newest().orElseThrow().plato(), 0.01);
    assertEquals(1.5, track.dropPlatoPerDay().orElseThrow(), 0.02);
  }

  @Test
  void nothingIsToldTooSoonNorOfWhatRests() {
    GravityTrack one = GravityTrack.NONE.seen(START, 4);
    assertTrue(one.dropPlatoPerDay().isEmpty());
    assertTrue(one.seen(START.plusSeconds(3600), 3.9).dropPlatoPerDay().isEmpty());
    assertTrue(one.seen(START.plusSeconds(86_400), 4).dropPlatoPerDay().isEmpty());
    assertEquals(one, one.seen(START.minusSeconds(60), 9), "out of order");
  }
}

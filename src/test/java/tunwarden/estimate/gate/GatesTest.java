package tunwarden.estimate.gate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import org.junit.jupiter.api.Test;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;

class GatesTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  private Track track = Track.EMPTY;

  private Verdict pressure(long second, double pa) {
    Reading reading = Reading.good(START.plusSeconds(second), "T1", Quantity.PRESSURE, pa);
    Verdict verdict = Gates.judge(track, reading);
    track = verdict.track();
    return verdict;
  }

  @Test
  void aRestlessSignalThatStopsIsStuckAndAQuietOneIsNot() {
    for (int i = 0; i < 300; i++) {
      assertTrue(pressure(i, 1e5 + i % 7).usable());
    }
    Quality last = Quality.GOOD;
    for (int i = 300; i < 420; i++) {
      last = pressure(i, 1e5).quality();
    }
    assertEquals(Quality.STUCK, last);
    assertEquals(Quality.GOOD, pressure(421, 1e5 + 3).quality());

    track = Track.EMPTY;
    for (int i = 0; i < 5000; i++) {
      assertTrue(pressure(i, 1e5).usable());
    }
  }

  @Test
  void aSuddenValueIsBelievedOnceItIsConfirmed() {
    pressure(0, 1e5);
    assertEquals(Quality.TOO_FAST, pressure(1, 9e5).quality());
    assertTrue(pressure(2, 9e5).usable());
  }

  @Test
  void aClockThatWasSetBackIsBelievedAfterFiveReadings() {
    pressure(7200, 1e5);
    for (int i = 0; i < 4; i++) {
      assertFalse(pressure(i, 1e5).usable());
    }
    assertTrue(pressure(4, 1e5).usable());
    assertTrue(pressure(5, 1e5).usable());
  }

  @Test
  void onOneRepeatedTimeNothingIsProved() {
    pressure(10, 1e5);
    for (int i = 0; i < 20; i++) {
      assertEquals(Quality.OUT_OF_ORDER, pressure(10, 1e5).quality());
    }
  }
}

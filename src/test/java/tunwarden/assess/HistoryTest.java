package tunwarden.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** The history against a plain list of everything that went in. */
class HistoryTest {
  private static final Instant START = Instant.parse("2026-03-02T00:00:00Z");

  @Test
  void aWindowHoldsTheLeastGreatestAndLastOfEachColumn() {
    History history = new History();
    float[] values = new float[600];
    Random random = new Random(7);
    for (int s = 0; s < values.length; s++) {
      values[s] = 100_000 + random.nextInt(5_000);
      history.addPressure(START.plusSeconds(s), values[s]);
    }
    History.Trace trace = history.window(START, START.plusSeconds(600), 60).pressure();
    for (int column = 0; column < 60; column++) {
      float min = Float.MAX_VALUE;
      float max = 0;
      for (int s = 10 * column; s < 10 * column + 10; s++) {
        min = Math.min(min, values[s]);
        max = Math.max(max, values[s]);
      }
      assertTrue(trace.min()[column] <= min && trace.max()[column] >= max, "column " + column);
    }
    assertEquals(values[599], trace.last()[59]);
  }

  @Test
  void noSpikeIsLostHoweverLongTheWindow() {
    History history = new History();
    int days = 7;
    int spikeAt = 3 * 86_400 + 12_345;
    for (int s = 0; s < days * 86_400; s += 5) {
      history.addPressure(START.plusSeconds(s), s == spikeAt ? 250_000 : 100_000);
    }
    for (int columns : new int[] {1, 7, 80, 150, 400}) {
      History.Trace trace =
          history.window(START, START.plusSeconds(days * 86_400L), columns).pressure();
      int expected = (int) ((long) spikeAt * columns / (days * 86_400L));
      assertEquals(250_000, trace.max()[expected], columns + " columns");
    }
  }

  @Test
  void aSilenceStaysEmptyAndNaNIsNotTaken() {
    History history = new History();
    history.addTemperature(START, 277);
    history.addTemperature(START.plusSeconds(100), Double.NaN);
    history.addTemperature(START.plusSeconds(200), 278);
    History.Window window = history.window(START, START.plusSeconds(201), 201);
    assertTrue(window.temperature().has(0) && window.temperature().has(200));
    assertFalse(window.temperature().has(100));
    assertFalse(window.pressure().has(0));
  }

  @Test
  void oldSecondsAreStillSeenCoarsely() {
    History history = new History();
    for (int s = 0; s < 36_000; s++) {
      history.addPressure(START.plusSeconds(s), 100_000 + s);
    }
    History.Trace early = history.window(START, START.plusSeconds(600), 100).pressure();
    assertTrue(early.has(0) && early.has(99));
    assertTrue(early.max()[0] - early.min()[0] >= 3, "ten hours back only wider bins are left");
    History.Trace late =
        history.window(START.plusSeconds(35_400), START.plusSeconds(36_000), 600).pressure();
    assertEquals(135_400, late.min()[0]);
    assertEquals(135_400, late.max()[0], "the newest ten minutes are kept second by second");
  }

  @Test
  void aValueOlderThanTheRingChangesNothingNew() {
    History history = new History();
    history.addPressure(START.plusSeconds(1_000_000), 200_000);
    history.addPressure(START, 100_000);
    History.Trace now =
        history.window(START.plusSeconds(999_999), START.plusSeconds(1_000_002), 3).pressure();
    assertEquals(200_000, now.last()[1]);
    history.forgetAfter(START.minusSeconds(1));
    assertFalse(history.window(START, START.plusSeconds(10), 1).pressure().has(0));
  }

  @Test
  void timesFarApartCostNoMoreThanTimesCloseTogether() {
    History history = new History();
    history.addPressure(Instant.parse("1970-01-01T00:00:00Z"), 1);
    history.addPressure(Instant.parse("2199-01-01T00:00:00Z"), 2);
    Instant from = Instant.parse("2198-12-31T23:59:00Z");
    assertEquals(2, history.window(from, from.plusSeconds(120), 120).pressure().last()[60]);
  }

  @Test
  void anEmptyOrBackwardWindowIsRefused() {
    History history = new History();
    assertThrows(IllegalArgumentException.class, () -> history.window(START, START, 10));
    assertThrows(
        IllegalArgumentException.class, () -> history.window(START, START.plusSeconds(1), 0));
  }
}

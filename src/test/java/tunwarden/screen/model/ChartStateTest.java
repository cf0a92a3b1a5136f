package tunwarden.screen.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.time.Instant;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Zooming, panning and the cursor of the chart. */
class ChartStateTest {
  private static final Instant NOW = Instant.parse("2026-03-02T11:02:31Z");

  @Test
  void theOfferedSpansGoRound() {
    ChartState chart = ChartState.USUAL;
    long[] spans = {86_400, 604_800, 600, 7_200};
    for (long span : spans) {
      chart = chart.nextSpan();
      assertEquals(span, chart.spanS());
    }
  }

  @Test
  void zoomingInKeepsTheMomentUnderTheCursorInItsPlace() {
    ChartState chart = ChartState.USUAL;
    for (int i = 0; i < 30; i++) {
      chart = chart.moveCursor(NOW, -1);
    }
    ChartState closer = chart.zoomIn(NOW);
    assertEquals(chart.cursor(), closer.cursor());
    assertEquals(share(chart), share(closer), 1e-3);
    assertTrue(closer.heldEnd().isPresent(), "a chart zoomed into the past stands still");
  }

  private static double share(ChartState chart) {
    double before = Duration.between(chart.start(NOW), chart.cursor().orElseThrow()).toMillis();
    return before / (1000.0 * chart.spanS());
  }

  @Test
  void panningBackAndForthFollowsThePresentAgain() {
    ChartState back = ChartState.USUAL.pan(NOW, -1).pan(NOW, -1);
    assertEquals(NOW.minusSeconds(3_600), back.end(NOW));
    assertFalse(back.pan(NOW, 1).heldEnd().isEmpty());
    assertTrue(back.pan(NOW, 1).pan(NOW, 1).heldEnd().isEmpty());
    assertTrue(back.follow().heldEnd().isEmpty());
  }

  @Test
  void whateverIsDoneTheChartEndsInThePastAndKeepsItsCursor() {
    Random random = new Random(2);
    ChartState chart = ChartState.USUAL;
    for (int i = 0; i < 20_000; i++) {
      chart =
          switch (random.nextInt(6)) {
            case 0 -> chart.zoomIn(NOW);
            case 1 -> chart.zoomOut(NOW);
            case 2 -> chart.pan(NOW, -1);
            case 3 -> chart.pan(NOW, 1);
            case 4 -> chart.moveCursor(NOW, random.nextBoolean() ? 1 : -1);
            default -> chart.nextSpan();
          };
      assertFalse(chart.end(NOW).isAfter(NOW));
      assertTrue(chart.start(NOW).isBefore(chart.end(NOW)));
      assertTrue(chart.spanS() >= 60 && chart.spanS() <= 31 * 86_400);
    }
  }
}

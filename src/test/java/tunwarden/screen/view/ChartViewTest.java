package tunwarden.screen.view;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import tunwarden.assess.History;
import tunwarden.forecast.TrendPoint;
import tunwarden.screen.Boards;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Glyphs;
import tunwarden.screen.model.Key;
import tunwarden.screen.model.Look;
import tunwarden.screen.model.Model;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Size;
import tunwarden.screen.model.Update;
import tunwarden.screen.model.VesselBoard;

/** The chart's picture: spikes, silences, the forecast. */
class ChartViewTest {
  private static final Size SIZE = new Size(100, 40);

  private static String screen(History history, Glyphs glyphs, String keys) {
    VesselBoard made = Boards.vessel("FV2", "ale", 0.5, 4, Boards.NOW, List.of());
    VesselBoard vessel = new VesselBoard(made.assessment(), List.of(), history, List.of());
    Board board = Boards.board(Origin.LIVE, Boards.NOW, List.of(vessel));
    Model model = Model.start(board, Look.USUAL.withGlyphs(glyphs), SIZE);
    for (char key : keys.toCharArray()) {
      model = Update.key(model, Key.typed(key)).model();
    }
    return ScreenView.draw(model).text();
  }

  @ParameterizedTest
  @EnumSource(Glyphs.class)
  void oneSecondOfAWeekStillReachesTheTopOfTheScale(Glyphs glyphs) {
    History history = new History();
    for (int s = 604_000; s > 0; s -= 20) {
      history.addPressure(Boards.NOW.minusSeconds(s), 50_000);
    }
    String flat = screen(history, glyphs, "vww");
    history.addPressure(Boards.NOW.minusSeconds(300_000), 170_000);
    String spiked = screen(history, glyphs, "vww");
    assertTrue(flat.contains("last 7 d"), flat);
    assertTrue(chartRows(flat, glyphs) <= 2, flat);
    assertTrue(chartRows(spiked, glyphs) >= 6, "the spike spans the scale: " + spiked);
  }

  /** Rows in which something measured is drawn in the middle of the chart. */
  private static long chartRows(String text, Glyphs glyphs) {
    String blank = glyphs == Glyphs.ASCII ? "[ -]*" : "[ ┄]*";
    return text.lines()
        .skip(SIZE.rows() - 15)
        .limit(8)
        .filter(row -> row.length() > 50)
        .filter(row -> !row.substring(20, 50).matches(blank))
        .count();
  }

  @Test
  void theForecastGoesOutFromThePresentReading() {
    VesselBoard vessel = Boards.vessel("FV2", "ale", 0.5, 4, Boards.NOW, List.of());
    List<TrendPoint> trend = TrendLine.fromNow(vessel.assessment());
    assertEquals(50_000, trend.get(0).paGauge());
    assertEquals(Boards.NOW.minusSeconds(1), trend.get(0).at());
    Instant between = Boards.NOW.plusSeconds(300);
    TrendPoint middle = TrendLine.at(trend, between).orElseThrow();
    assertTrue(middle.lowPaGauge() < middle.paGauge() && middle.paGauge() < middle.highPaGauge());
    assertTrue(TrendLine.at(trend, Boards.NOW.plusSeconds(900_000)).isEmpty());
  }

  @Test
  void aSilenceLongerThanStaleIsAGapInTheLine() {
    History history = new History();
    for (int s = 7_000; s > 0; s -= 2) {
      boolean silent = s > 2_000 && s < 4_000;
      if (!silent) {
        history.addPressure(Boards.NOW.minusSeconds(s), 50_000);
      }
    }
    String text = screen(history, Glyphs.BLOCKS, "v");
    assertTrue(
        text.lines().skip(24).anyMatch(row -> row.matches(".*[▀▄▘]{10} {12,}[▀▄▘]{10}.*")), text);
  }
}

package tunwarden.screen.view;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import tunwarden.screen.Boards;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Origin;
import tunwarden.units.Display;

class ToldTest {
  private static final Board BOARD = Boards.three(Origin.LIVE, Boards.NOW);

  private static String told(String text) {
    return Told.of(text, Display.METRIC, BOARD);
  }

  @Test
  void timesAreThoseOfTheClockOnTheWall() {
    assertEquals(
        "Leak since 09:02, 1.20 bar g", told("Leak since 2026-03-02T09:02:31Z, 1.20 bar g"));
    assertEquals(
        "Vent from 03-01 23:59 to 00:10.",
        told("Vent from 2026-03-01T23:59:59.5Z to 2026-03-02T00:10:00Z."));
  }

  @Test
  void whatOnlyLooksLikeATimeStaysAsItIs() {
    assertEquals("batch 2026-99-99T00:00Z", told("batch 2026-99-99T00:00Z"));
  }

  @Test
  void unitsTurnInTheSameSentence() {
    assertEquals(
        "Leak since 09:02, 14.5 psi",
        Told.of("Leak since 2026-03-02T09:02:31Z, 1.00 bar", Display.US, BOARD));
  }
}

package tunwarden.screen.terminal;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmState;
import tunwarden.screen.Boards;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Origin;

/** The bell rings once for each alarm that wants somebody, and for no other. */
class ChimeTest {
  private final Chime chime = new Chime();

  private static Board with(AlarmKind kind, AlarmState state) {
    return Boards.board(
        Origin.LIVE,
        Boards.NOW,
        List.of(
            Boards.vessel(
                "BT1",
                "lager",
                1.41,
                8,
                Boards.NOW,
                List.of(Boards.alarm(kind, "BT1", state, Boards.NOW)))));
  }

  @Test
  void aNewAlarmRingsOnce() {
    assertFalse(chime.isDue(Boards.many(2, Boards.NOW)));
    Board high = with(AlarmKind.ABOVE_EARLIEST_LIFT, AlarmState.UNACKNOWLEDGED);
    assertTrue(chime.isDue(high));
    assertFalse(chime.isDue(high), "it goes on without ringing again");
  }

  @Test
  void whatSomebodyHasSeenToIsSilent() {
    assertFalse(chime.isDue(with(AlarmKind.ABOVE_EARLIEST_LIFT, AlarmState.ACKNOWLEDGED)));
    assertFalse(chime.isDue(with(AlarmKind.ABOVE_EARLIEST_LIFT, AlarmState.SHELVED)));
  }

  @Test
  void oneThatComesBackRingsAgain() {
    Board high = with(AlarmKind.ABOVE_EARLIEST_LIFT, AlarmState.UNACKNOWLEDGED);
    assertTrue(chime.isDue(high));
    assertFalse(chime.isDue(Boards.many(2, Boards.NOW)));
    assertTrue(chime.isDue(high));
  }

  @Test
  void advicesDoNotRing() {
    for (AlarmKind kind : AlarmKind.values()) {
      Board board = with(kind, AlarmState.UNACKNOWLEDGED);
      boolean worth = board.vessels().get(0).alarms().get(0).priority().ordinal() >= 2;
      assertTrue(new Chime().isDue(board) == worth, kind.word());
    }
  }
}

package tunwarden.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmState;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.Key;
import tunwarden.screen.model.Origin;
import tunwarden.screen.model.Page;
import tunwarden.screen.model.Size;
import tunwarden.screen.model.VesselBoard;

/** Whole sessions: what a person types, what the screen says, what the desk is asked. */
class ScriptedSessionTest {
  private static final Size SIZE = new Size(100, 30);

  private static Sessions on(Origin origin) {
    return new Sessions(Boards.three(origin, Boards.NOW), SIZE);
  }

  private static Sessions withAlarm(AlarmKind kind) {
    VesselBoard vessel =
        Boards.vessel(
            "BT1",
            "lager",
            1.41,
            8,
            Boards.NOW,
            List.of(Boards.alarm(kind, "BT1", AlarmState.UNACKNOWLEDGED, Boards.NOW)));
    return new Sessions(Boards.board(Origin.LIVE, Boards.NOW, List.of(vessel)), SIZE);
  }

  @Test
  void opensAVesselAndComesBack() {
    Sessions session = on(Origin.LIVE).press(Key.Kind.DOWN).press(Key.Kind.ENTER);
    assertEquals(Page.VESSEL, session.model().page());
    assertTrue(session.screen().contains("FV2  pale ale"), session.screen());
    session.press(Key.Kind.ESCAPE);
    assertEquals(Page.CELLAR, session.model().page());
  }

  @Test
  void findsAVesselByPartOfItsTitle() {
    Sessions session = on(Origin.LIVE).type("/bitt").press(Key.Kind.ENTER);
    assertTrue(session.screen().contains("1 vessel, least margin first, only 'bitt'"));
    assertEquals("CK4", session.model().vessel().orElseThrow().id());
    session.press(Key.Kind.ESCAPE);
    assertTrue(session.screen().contains("3 vessels"));
  }

  @Test
  void aNameNobodyHasIsSaidToBeSo() {
    Sessions session = on(Origin.LIVE).type("/zzz").press(Key.Kind.ENTER);
    assertTrue(session.screen().contains("No vessel's name contains 'zzz'."));
    assertTrue(session.screen().contains("3 vessels"));
  }

  @Test
  void unitsTurnEverywhereAtOnceAndAreRemembered() {
    Sessions session = on(Origin.LIVE).type("vu");
    assertTrue(session.screen().contains("psi g"), session.screen());
    assertTrue(session.screen().contains("°F"));
    assertTrue(session.screen().contains("2.69 ± 0.07 vol"));
    assertFalse(session.screen().contains("bar"), session.screen());
    session.type("uu");
    assertTrue(session.screen().contains("1.33 bar g"));
    assertEquals(3, session.asked().size());
    assertEquals("remember PSI DARK BLOCKS", session.asked().get(0));
  }

  @Test
  void aCautionIsAcknowledgedWithoutAsking() {
    Sessions session = withAlarm(AlarmKind.LEAK).type("a");
    assertEquals(List.of("acknowledge BT1 LEAK ''"), session.asked());
  }

  @Test
  void aHighAlarmAsksForAWord() {
    Sessions session = withAlarm(AlarmKind.ABOVE_EARLIEST_LIFT);
    assertTrue(session.screen().contains("!! HIGH  BT1  above earliest lift"), session.screen());
    session.type("a").press(Key.Kind.ENTER);
    assertTrue(session.screen().contains("a high alarm needs a word"));
    assertEquals(List.of(), session.asked());
    session.type("cooling on").press(Key.Kind.ENTER);
    assertEquals(List.of("acknowledge BT1 ABOVE_EARLIEST_LIFT 'cooling on'"), session.asked());
  }

  @Test
  void shelvingTakesAReasonAndAnEndWithinADay() {
    Sessions session = withAlarm(AlarmKind.LEAK).type("h").press(Key.Kind.ENTER);
    assertTrue(session.screen().contains("shelving needs a reason"));
    session.type("gauge being changed").press(Key.Kind.ENTER);
    session.type("3 d").press(Key.Kind.ENTER);
    assertTrue(session.screen().contains("shelving ends within 24 h"));
    for (int i = 0; i < 3; i++) {
      session.press(Key.Kind.BACKSPACE);
    }
    session.type("30 min").press(Key.Kind.ENTER);
    assertEquals(
        List.of("shelve BT1 LEAK 'gauge being changed' 2026-03-02T11:32:31Z"), session.asked());
  }

  @Test
  void leavingAsksOnlyWhileAlarmsWait() {
    assertTrue(on(Origin.LIVE).type("q").model().prompt().isPresent());
    Sessions calm = new Sessions(Boards.many(3, Boards.NOW), SIZE);
    assertTrue(calm.type("q").model().over());
    Sessions asked = on(Origin.LIVE).type("q");
    assertTrue(asked.screen().contains("1 alarm is unacknowledged. Leave all the same?"));
    assertFalse(asked.type("n").model().over());
    assertTrue(asked.type("qy").model().over());
    assertTrue(on(Origin.LIVE).press(Key.Kind.INTERRUPT).model().over());
  }

  @Test
  void aLaboratoryValueNeedsItsUnitAndItsUncertainty() {
    Sessions session = on(Origin.LIVE).type("l5.2").press(Key.Kind.ENTER);
    assertTrue(session.screen().contains("write the value and its ±"), session.screen());
    session.press(Key.Kind.ESCAPE).type("l2.6 vol ± 0.1").press(Key.Kind.ENTER);
    assertEquals(List.of("lab BT1 5.140 0.198"), session.asked());
    session.type("l5.2 g/L +- 0.1 g/L").press(Key.Kind.ENTER);
    assertEquals("lab BT1 5.200 0.100", session.asked().get(1));
    session.type("l5.2 ± 0.1").press(Key.Kind.ENTER);
    assertTrue(session.screen().contains("has no unit"), session.screen());
  }

  @Test
  void aReplaySaysSoAndIsSteered() {
    Sessions session = on(Origin.REPLAY);
    assertTrue(session.screen().contains("REPLAY  log time"));
    assertFalse(session.screen().contains("LIVE"));
    assertTrue(session.screen().contains("playing ×60"));
    session.type(" ><.eE").type("k+2 h").press(Key.Kind.ENTER);
    session.type("k12:00").press(Key.Kind.ENTER).type("mvalve shut").press(Key.Kind.ENTER);
    assertEquals(
        List.of(
            "pause true",
            "pace 120",
            "pace 30",
            "step",
            "seek 2026-03-02T13:32:31Z",
            "seek 2026-03-02T09:39:11Z",
            "seek 2026-03-02T13:02:31Z",
            "seek 2026-03-02T12:00:00Z",
            "mark 'valve shut'"),
        session.asked());
  }

  @Test
  void aTimeThatIsNoneIsRefusedInOneSentence() {
    Sessions session = on(Origin.REPLAY).type("kteatime").press(Key.Kind.ENTER);
    assertTrue(session.screen().contains("'teatime' is no time; write 14:30"), session.screen());
  }

  @Test
  void replayKeysDoNothingOnALiveBoard() {
    assertEquals(List.of(), on(Origin.LIVE).type(" ><.eE").asked());
  }

  @Test
  void helpShowsTheKeysOfThePageAndAnyKeyClosesIt() {
    Sessions session = on(Origin.LIVE).type("v?");
    assertTrue(session.screen().contains("Vessel page"));
    assertTrue(session.screen().contains("0 to relief set, or close"));
    session.press(Key.Kind.DOWN);
    assertFalse(session.screen().contains("Vessel page"));
  }

  @Test
  void aNoteAndAReportReachTheDesk() {
    Sessions session = on(Origin.LIVE).type("nhose changed").press(Key.Kind.ENTER).type("ry");
    assertEquals(List.of("note BT1 'hose changed'", "report BT1"), session.asked());
    assertTrue(session.screen().contains("The report of BT1 is being written."));
  }

  @Test
  void theCursorReadsValuesOffTheChart() {
    Sessions session = on(Origin.LIVE).type("v").press(Key.Kind.LEFT).press(Key.Kind.LEFT);
    assertTrue(session.screen().contains("10:59:31  1.33 bar g"), session.screen());
    session.press(Key.Kind.ESCAPE);
    assertTrue(session.screen().contains("now ▸ forecast"));
    assertEquals(Page.VESSEL, session.model().page(), "Esc takes the cursor away first");
  }

  @Test
  void anOldReadingIsUnmistakablyStale() {
    Board board = Boards.three(Origin.LIVE, Boards.NOW);
    Sessions session = on(Origin.LIVE).board(Boards.at(board, Boards.NOW.plusSeconds(95)));
    assertTrue(session.screen().contains("STALE"), session.screen());
    assertTrue(session.screen().contains("96 s"));
    assertTrue(session.type("v").screen().contains("! STALE"), session.screen());
  }

  @Test
  void helpOnASmallScreenShowsEveryKeyOfThePageInWholeAlsoInAReplay() {
    Board board = Boards.three(Origin.REPLAY, Boards.NOW);
    for (Page page : Page.values()) {
      String screen =
          new Sessions(board, new Size(80, 24)).press(Key.typed(page.letter())).type("?").screen();
      String help = screen.lines().skip(3).collect(Collectors.joining("\n"));
      assertFalse(help.contains("…"), screen);
      for (String words :
          List.of(
              "pause, go on",
              "one row",
              "go to a time",
              "mark this moment",
              "draw afresh",
              "leave")) {
        assertTrue(screen.contains(words), words + " is missing:\n" + screen);
      }
    }
  }

  @Test
  void whatGoesOnIsOnTheVesselPageInLocalTime() {
    Sessions session = on(Origin.LIVE).type("/CK4").press(Key.Kind.ENTER).type("v");
    assertTrue(session.screen().contains("leak since 08:52, from 0.62 bar g"), session.screen());
  }

  @Test
  void enterInTheJournalOfAReplayGoesToThatTime() {
    Sessions session = on(Origin.REPLAY).type("j").press(Key.Kind.END).press(Key.Kind.ENTER);
    assertEquals(List.of("seek 2026-03-02T08:32:31Z"), session.asked());
    assertEquals(List.of(), on(Origin.LIVE).type("j").press(Key.Kind.ENTER).asked());
  }

  @Test
  void aTimeAfterTheKnownEndOfALogIsTakenAndOneBeforeItsBeginIsTheBegin() {
    Sessions session = on(Origin.REPLAY).type("k2030-01-01T00:00:00Z").press(Key.Kind.ENTER);
    session.type("k2020-01-01T00:00:00Z").press(Key.Kind.ENTER);
    assertEquals(
        List.of("seek 2030-01-01T00:00:00Z", "seek 2026-03-02T02:42:31Z"), session.asked());
  }
}

package tunwarden.alarm;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import tunwarden.alarm.Transition.Change;
import tunwarden.assess.Observed;
import tunwarden.estimate.EventKind;
import tunwarden.reading.Quality;

/** The states of ISA-18.2, the delays and the deadbands, stepped through by hand. */
class AlarmBookTest {
  private static final String V = "FV2";

  private AlarmBook book = AlarmBook.empty(AlarmSettings.DEFAULT);
  private final List<Transition> log = new ArrayList<>();

  private void fold(Assessments assessments) {
    take(book.fold(assessments.build()));
  }

  private void take(AlarmBook.Folded folded) {
    book = folded.book();
    log.addAll(folded.transitions());
  }

  private AlarmState state(AlarmKind kind) {
    return book.alarms(V).stream()
        .filter(alarm -> alarm.kind() == kind)
        .map(Alarm::state)
        .findFirst()
        .orElse(AlarmState.NORMAL);
  }

  private String text(AlarmKind kind) {
    return book.alarms(V).stream()
        .filter(alarm -> alarm.kind() == kind)
        .map(Alarm::text)
        .findFirst()
        .orElse("");
  }

  private static Instant second(long seconds) {
    return Assessments.START.plusSeconds(seconds);
  }

  private void raiseMarginLow() {
    fold(Assessments.of(V).at(0).bar(1.25));
    fold(Assessments.of(V).at(10).bar(1.25));
  }

  @Test
  void aQuietVesselHasNoAlarmAndLeavesTheBookAsItIs() {
    AlarmBook before = book;
    fold(Assessments.of(V));
    assertTrue(book.alarms().isEmpty());
    assertTrue(before == book);
  }

  @Test
  void aConditionMustHoldForItsOnDelay() {
    fold(Assessments.of(V).at(0).bar(1.25));
    fold(Assessments.of(V).at(9).bar(1.25));
    assertEquals(AlarmState.NORMAL, state(AlarmKind.MARGIN_LOW));
    fold(Assessments.of(V).at(10).bar(1.25));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
    assertEquals(second(0), book.alarms(V).get(0).since());
    assertEquals(
        "Relief margin 0.14 bar is below 0.20 bar at 1.25 bar g; the valve may open from"
            + " 1.40 bar g.",
        text(AlarmKind.MARGIN_LOW));
  }

  @Test
  void anInterruptionStartsTheOnDelayAfresh() {
    fold(Assessments.of(V).at(0).bar(1.25));
    fold(Assessments.of(V).at(5).bar(1.0));
    fold(Assessments.of(V).at(11).bar(1.25));
    fold(Assessments.of(V).at(20).bar(1.25));
    assertEquals(AlarmState.NORMAL, state(AlarmKind.MARGIN_LOW));
  }

  @Test
  void acknowledgedThenReturnedIsNormal() {
    raiseMarginLow();
    take(book.acknowledge(AlarmKind.MARGIN_LOW, V, "on my way", second(20)));
    assertEquals(AlarmState.ACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
    assertEquals("on my way", book.alarms(V).get(0).remark());
    fold(Assessments.of(V).at(30).bar(0.8));
    fold(Assessments.of(V).at(90).bar(0.8));
    assertEquals(AlarmState.NORMAL, state(AlarmKind.MARGIN_LOW));
    assertEquals(
        List.of(Change.RAISED, Change.ACKNOWLEDGED, Change.RETURNED),
        log.stream().map(Transition::change).toList());
  }

  @Test
  void returnedBeforeAnybodySawItStaysUntilAcknowledged() {
    raiseMarginLow();
    fold(Assessments.of(V).at(30).bar(0.8));
    fold(Assessments.of(V).at(89).bar(0.8));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
    fold(Assessments.of(V).at(90).bar(0.8));
    assertEquals(AlarmState.RETURNED_UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
    take(book.acknowledge(AlarmKind.MARGIN_LOW, V, "", second(100)));
    assertEquals(AlarmState.NORMAL, state(AlarmKind.MARGIN_LOW));
    assertTrue(book.memories().isEmpty(), "nothing is kept of an alarm that is over");
  }

  @Test
  void theDeadbandKeepsAnAlarmWhoseValueHoversAtTheLimit() {
    raiseMarginLow();
    // The margin is back above 0.20 bar, but by less than the deadband of 0.02 bar.
    fold(Assessments.of(V).at(100).bar(1.18));
    fold(Assessments.of(V).at(1000).bar(1.18));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
    fold(Assessments.of(V).at(1001).bar(1.16));
    fold(Assessments.of(V).at(1061).bar(1.16));
    assertEquals(AlarmState.RETURNED_UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
  }

  @Test
  void aSilentInstrumentKeepsItsAlarmAndRaisesItsOwn() {
    raiseMarginLow();
    for (long t = 20; t < 4000; t += 20) {
      fold(Assessments.of(V).at(t).pressure(Quality.STALE));
    }
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
    assertTrue(text(AlarmKind.MARGIN_LOW).endsWith("Last known: the instrument is silent."));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.INSTRUMENT_STALE));
    assertTrue(text(AlarmKind.INSTRUMENT_STALE).contains("pressure reading"));
  }

  @Test
  void silenceDoesNotLetAnOffDelayRunOut() {
    raiseMarginLow();
    fold(Assessments.of(V).at(20).bar(0.8));
    fold(Assessments.of(V).at(40).pressure(Quality.STALE));
    fold(Assessments.of(V).at(200).bar(0.8));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
  }

  @Test
  void anInstrumentThatHasNeverSpokenIsGivenTheStaleTime() {
    Observed never = Observed.NEVER;
    fold(Assessments.of(V).at(0).pressure(never));
    fold(Assessments.of(V).at(29).pressure(never));
    assertEquals(AlarmState.NORMAL, state(AlarmKind.INSTRUMENT_STALE));
    fold(Assessments.of(V).at(30).pressure(never));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.INSTRUMENT_STALE));
  }

  @Test
  void aSecondInstrumentRaisesAnAcknowledgedAlarmAgain() {
    fold(Assessments.of(V).at(0).pressure(Quality.PORT_GONE));
    take(book.acknowledge(AlarmKind.INSTRUMENT_STALE, V, "", second(1)));
    Observed gone = Assessments.observed(277, Quality.PORT_GONE);
    fold(Assessments.of(V).at(2).pressure(Quality.PORT_GONE).temperature(gone));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.INSTRUMENT_STALE));
    assertEquals(Change.RAISED_AGAIN, log.get(log.size() - 1).change());
    assertTrue(log.get(log.size() - 1).annunciates());
  }

  @Test
  void aShelvedAlarmComesBackByItselfAndMustBeSeenAgain() {
    raiseMarginLow();
    take(book.acknowledge(AlarmKind.MARGIN_LOW, V, "", second(11)));
    take(book.shelve(AlarmKind.MARGIN_LOW, V, "cooling at work", second(600), second(12)));
    assertEquals(AlarmState.SHELVED, state(AlarmKind.MARGIN_LOW));
    assertEquals(Optional.of(second(600)), book.alarms(V).get(0).shelvedUntil());
    fold(Assessments.of(V).at(599).bar(1.25));
    assertEquals(AlarmState.SHELVED, state(AlarmKind.MARGIN_LOW));
    fold(Assessments.of(V).at(600).bar(1.25));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
  }

  @Test
  void aShelfNeedsAReasonAndAnEnd() {
    AlarmKind kind = AlarmKind.MARGIN_LOW;
    assertThrows(
        IllegalArgumentException.class, () -> book.shelve(kind, V, " ", second(60), second(0)));
    assertThrows(
        IllegalArgumentException.class, () -> book.shelve(kind, V, "why", second(0), second(0)));
    Instant tooFar = second(0).plus(Duration.ofHours(25));
    String words =
        assertThrows(
                IllegalArgumentException.class,
                () -> book.shelve(kind, V, "why", tooFar, second(0)))
            .getMessage();
    assertTrue(words.contains("24 h"), words);
  }

  @Test
  void anEventWhileShelvedIsNotLost() {
    take(book.shelve(AlarmKind.LIFT_SEEN, V, "testing the valve", second(60), second(0)));
    fold(Assessments.of(V).at(10).event(EventKind.LIFT, 8, false));
    assertEquals(AlarmState.SHELVED, state(AlarmKind.LIFT_SEEN));
    fold(Assessments.of(V).at(61));
    assertEquals(AlarmState.RETURNED_UNACKNOWLEDGED, state(AlarmKind.LIFT_SEEN));
  }

  @Test
  void anInstrumentOutOfServiceSuppressesWhatRestsOnIt() {
    raiseMarginLow();
    fold(Assessments.of(V).at(20).pressure(Quality.OUT_OF_SERVICE));
    assertEquals(AlarmState.SUPPRESSED, state(AlarmKind.MARGIN_LOW));
    fold(Assessments.of(V).at(30).bar(1.25));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
    fold(Assessments.of(V).at(40).pressure(Quality.OUT_OF_SERVICE));
    take(book.acknowledge(AlarmKind.MARGIN_LOW, V, "", second(41)));
    assertEquals(AlarmState.SUPPRESSED, state(AlarmKind.MARGIN_LOW));
  }

  @Test
  void outOfServiceLastsUntilAPersonEndsIt() {
    take(book.outOfService(AlarmKind.VACUUM, V, "vacuum break fitted", second(0)));
    fold(Assessments.of(V).at(10).bar(-0.05));
    fold(Assessments.of(V).at(20).bar(-0.05));
    assertEquals(AlarmState.OUT_OF_SERVICE, state(AlarmKind.VACUUM));
    take(book.inService(AlarmKind.VACUUM, V, second(30)));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.VACUUM));
    assertFalse(log.stream().anyMatch(t -> t.at().isBefore(second(30)) && t.annunciates()));
  }

  @Test
  void aLiftThatIsOverWhenReportedShowsBothSteps() {
    fold(Assessments.of(V).at(100).event(EventKind.LIFT, 80, false));
    assertEquals(
        List.of(Change.RAISED, Change.RETURNED), log.stream().map(Transition::change).toList());
    assertTrue(log.get(0).annunciates());
    assertEquals(AlarmState.RETURNED_UNACKNOWLEDGED, state(AlarmKind.LIFT_SEEN));
    assertTrue(text(AlarmKind.LIFT_SEEN).contains("200 g of gas lost"));
    int before = log.size();
    fold(Assessments.of(V).at(110).event(EventKind.LIFT, 80, false));
    assertEquals(before, log.size(), "the same lift is told once");
    fold(Assessments.of(V).at(300).event(EventKind.LIFT, 250, true));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.LIFT_SEEN));
  }

  @Test
  void anEventRenamedByTheEstimatorEndsItsFirstAlarm() {
    fold(Assessments.of(V).at(100).event(EventKind.LIFT, 90, true));
    fold(Assessments.of(V).at(110));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.LIFT_SEEN));
    assertFalse(text(AlarmKind.LIFT_SEEN).contains("silent"));
    fold(Assessments.of(V).at(120).event(EventKind.VENT, 90, false));
    assertEquals(AlarmState.RETURNED_UNACKNOWLEDGED, state(AlarmKind.LIFT_SEEN));
  }

  @Test
  void anEstimatorThatStartsAfreshEndsOpenEvents() {
    fold(Assessments.of(V).at(100).event(EventKind.LEAK, 90, true));
    take(book.eventsLost(V, second(200)));
    assertEquals(AlarmState.RETURNED_UNACKNOWLEDGED, state(AlarmKind.LEAK));
  }

  @Test
  void aClockThatStepsBackNeitherLosesNorRushesAnAlarm() {
    fold(Assessments.of(V).at(4000).bar(1.25));
    fold(Assessments.of(V).at(400).bar(1.25));
    assertEquals(AlarmState.NORMAL, state(AlarmKind.MARGIN_LOW));
    fold(Assessments.of(V).at(410).bar(1.25));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
    fold(Assessments.of(V).at(100).pressure(Quality.OUT_OF_ORDER));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.CLOCK));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.MARGIN_LOW));
  }

  @Test
  void adviceEndsWithoutAnybodySeeingIt() {
    var vessel = Assessments.vessel(V);
    var warmed =
        new tunwarden.vessel.Vessel(
            V,
            "",
            2,
            1.8,
            vessel.contents(),
            vessel.closure(),
            vessel.limits(),
            Optional.empty(),
            vessel.site(),
            OptionalDouble.of(297.15),
            vessel.accuracy(),
            vessel.prospects());
    fold(Assessments.of(warmed).at(0).warmTo(1.9));
    fold(Assessments.of(warmed).at(60).warmTo(1.9));
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.WARM_UP_WOULD_LIFT));
    fold(Assessments.of(warmed).at(70).warmTo(1.0));
    fold(Assessments.of(warmed).at(670).warmTo(1.0));
    assertEquals(AlarmState.NORMAL, state(AlarmKind.WARM_UP_WOULD_LIFT));
  }

  @Test
  void forecastAlarmsCarryTheirNumbers() {
    for (long t : new long[] {0, 60}) {
      fold(Assessments.of(V).at(t).liftIn(Duration.ofMinutes(200)).liquidFullAt(279.15));
    }
    assertEquals(
        "At the present trend the valve may open in 3 h 20 min (1 h 40 min, or not at all),"
            + " sooner than 4 h.",
        text(AlarmKind.TIME_TO_RELIEF_SHORT));
    assertEquals("Warming by 2.0 °C to 6.0 °C leaves no headspace.", text(AlarmKind.LIQUID_FULL));
  }

  @Test
  void theEarlyEdgeOfTheRangeCountsWithinHalfTheLimit() {
    for (long t : new long[] {0, 60}) {
      fold(Assessments.of(V).at(t).soonestIn(Duration.ofMinutes(125)));
    }
    assertEquals(AlarmState.NORMAL, state(AlarmKind.TIME_TO_RELIEF_SHORT));
    for (long t : new long[] {70, 130}) {
      fold(Assessments.of(V).at(t).soonestIn(Duration.ofMinutes(80)));
    }
    assertEquals(
        "At the upper edge of its range the trend reaches the valve's earliest opening in"
            + " 1 h 20 min, likely not within 2 d.",
        text(AlarmKind.TIME_TO_RELIEF_SHORT));
    for (long t : new long[] {140, 440}) {
      fold(Assessments.of(V).at(t).soonestIn(Duration.ofMinutes(135)));
    }
    assertEquals(AlarmState.UNACKNOWLEDGED, state(AlarmKind.TIME_TO_RELIEF_SHORT), "deadband");
    for (long t : new long[] {450, 750}) {
      fold(Assessments.of(V).at(t).soonestIn(Duration.ofMinutes(145)));
    }
    assertEquals(AlarmState.RETURNED_UNACKNOWLEDGED, state(AlarmKind.TIME_TO_RELIEF_SHORT));
  }

  @Test
  void stationAlarmsAreReportedAndReturned() {
    take(book.report(AlarmKind.DISK, true, "The data folder is full.", second(0)));
    assertEquals("The data folder is full.", book.alarms(AlarmBook.STATION).get(0).text());
    take(book.report(AlarmKind.DISK, false, "", second(10)));
    assertEquals(AlarmState.RETURNED_UNACKNOWLEDGED, book.alarms(AlarmBook.STATION).get(0).state());
  }

  @Test
  void chatterIsMarkedAndFloodsAreCounted() {
    book = AlarmBook.empty(AlarmSettings.DEFAULT);
    for (int i = 0; i < 3; i++) {
      take(book.report(AlarmKind.DISK, true, "full", second(10 * i)));
      take(book.report(AlarmKind.DISK, false, "", second(10 * i + 5)));
    }
    assertTrue(book.alarms().get(0).chattering());
    assertEquals(1, book.counts().chattered(), "the third in a minute");
    for (int i = 0; i < 12; i++) {
      take(book.fold(Assessments.of("V" + i).at(100).pressure(Quality.PORT_GONE).build()));
    }
    assertEquals(15, book.counts().raised());
    assertTrue(book.counts().flood());
    take(book.fold(Assessments.of(V).at(1000).build()));
    assertFalse(book.counts().flood());
    assertEquals(1, book.counts().floods());
  }

  @Test
  void whatWantsAPersonComesFirstThenTheWorst() {
    fold(Assessments.of(V).at(0).bar(1.45));
    fold(Assessments.of(V).at(10).bar(1.45));
    assertEquals(
        List.of(AlarmKind.ABOVE_EARLIEST_LIFT, AlarmKind.MARGIN_LOW),
        book.alarms().stream().map(Alarm::kind).toList());
    take(book.acknowledge(AlarmKind.ABOVE_EARLIEST_LIFT, V, "", second(11)));
    assertEquals(AlarmKind.MARGIN_LOW, book.alarms().get(0).kind());
  }
}

package tunwarden.alarm;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tunwarden.estimate.EventKind;
import tunwarden.reading.Quality;
import tunwarden.vessel.Vessel;

/**
 * Every kind of alarm is raised by what it is about, once its on-delay is over, and by it alone.
 */
class EveryAlarmTest {
  private static final String V = "FV2";

  private record Case(AlarmKind kind, UnaryOperator<Assessments> making) {
    @Override
    public String toString() {
      return kind.id();
    }
  }

  /** What is the case in each; the vessel lifts from 1.4 bar, is rated for 2, bears -0.02. */
  static Stream<Case> ofAVessel() {
    return Stream.of(
        new Case(AlarmKind.MARGIN_LOW, a -> a.bar(1.25)),
        new Case(AlarmKind.TIME_TO_RELIEF_SHORT, a -> a.liftIn(Duration.ofHours(3))),
        new Case(AlarmKind.ABOVE_EARLIEST_LIFT, a -> a.bar(1.45)),
        new Case(AlarmKind.ABOVE_VESSEL_LIMIT, a -> a.bar(2.05)),
        new Case(AlarmKind.VACUUM, a -> a.bar(-0.05)),
        new Case(AlarmKind.WARM_UP_WOULD_LIFT, a -> a.warmTo(1.6)),
        new Case(AlarmKind.LIQUID_FULL, a -> a.liquidFullAt(279)),
        new Case(AlarmKind.LIFT_SEEN, a -> a.event(EventKind.LIFT, 0, true)),
        new Case(AlarmKind.OVER_RELIEF, a -> a.event(EventKind.OVER_RELIEF, 0, true)),
        new Case(AlarmKind.LEAK, a -> a.event(EventKind.LEAK, 0, true)),
        new Case(AlarmKind.UNEXPLAINED_PRESSURE, a -> a.event(EventKind.UNEXPLAINED, 0, true)),
        new Case(AlarmKind.COOLING_LOST, a -> a.event(EventKind.COOLING_FAILURE, 0, true)),
        new Case(AlarmKind.INSTRUMENT_STALE, a -> a.pressure(Quality.NO_ANSWER)),
        new Case(AlarmKind.INSTRUMENT_BAD, a -> a.pressure(Quality.LOOP_FAULT)),
        new Case(AlarmKind.CLOCK, a -> a.pressure(Quality.OUT_OF_ORDER)));
  }

  private static final List<AlarmKind> OF_THE_STATION =
      List.of(AlarmKind.DISK, AlarmKind.CONFIGURATION, AlarmKind.NOTICE);

  /** Alarms that another one brings with it. */
  private static final Map<AlarmKind, EnumSet<AlarmKind>> TOGETHER = new EnumMap<>(AlarmKind.class);

  static {
    TOGETHER.put(AlarmKind.ABOVE_EARLIEST_LIFT, EnumSet.of(AlarmKind.MARGIN_LOW));
    TOGETHER.put(
        AlarmKind.ABOVE_VESSEL_LIMIT,
        EnumSet.of(AlarmKind.MARGIN_LOW, AlarmKind.ABOVE_EARLIEST_LIFT));
  }

  private static Vessel vessel() {
    Vessel plain = Assessments.vessel(V);
    return new Vessel(
        V,
        "",
        plain.volumeM3(),
        plain.fillM3(),
        plain.contents(),
        plain.closure(),
        plain.limits(),
        plain.orifice(),
        plain.site(),
        OptionalDouble.of(297.15),
        plain.accuracy(),
        plain.prospects());
  }

  private static AlarmBook after(Case one, AlarmSettings settings, long seconds) {
    AlarmBook book = AlarmBook.empty(settings);
    for (long t = 0; t <= seconds; t += 1) {
      book = book.fold(one.making().apply(Assessments.of(vessel()).at(t)).build()).book();
    }
    return book;
  }

  @ParameterizedTest
  @MethodSource("ofAVessel")
  void isRaisedAfterItsDelaySaysWhatIsTheCaseAndWhatToDo(Case one) {
    AlarmSettings settings = AlarmSettings.DEFAULT;
    long delay = settings.delays(one.kind()).on().toSeconds();
    AlarmBook book = after(one, settings, delay + 60);
    EnumSet<AlarmKind> expected = EnumSet.of(one.kind());
    expected.addAll(TOGETHER.getOrDefault(one.kind(), EnumSet.noneOf(AlarmKind.class)));
    EnumSet<AlarmKind> raised = EnumSet.noneOf(AlarmKind.class);
    book.alarms().forEach(alarm -> raised.add(alarm.kind()));
    assertEquals(expected, raised);
    Alarm alarm =
        book.alarms(V).stream().filter(a -> a.kind() == one.kind()).findFirst().orElseThrow();
    assertEquals(AlarmState.UNACKNOWLEDGED, alarm.state());
    assertTrue(alarm.text().endsWith(".") && alarm.text().length() > 20, alarm.text());
    assertTrue(alarm.action().endsWith(".") && alarm.action().length() > 20, alarm.action());
    if (delay > 0) {
      assertTrue(
          after(one, settings, delay - 1).alarms().stream().noneMatch(a -> a.kind() == one.kind()),
          "not before its on-delay is over");
    }
  }

  @ParameterizedTest
  @MethodSource("ofAVessel")
  void isNotRaisedOnceSwitchedOffUnlessItProtectsPeople(Case one) {
    if (one.kind().priority() == Priority.HIGH) {
      assertThrows(
          IllegalArgumentException.class,
          () -> AlarmManner.USUAL.withSwitchedOff(one.kind(), "tired of it"));
      return;
    }
    AlarmSettings without =
        AlarmSettings.DEFAULT.withManner(
            AlarmManner.USUAL.withSwitchedOff(one.kind(), "not in this cellar"));
    assertTrue(after(one, without, 200).alarms().stream().noneMatch(a -> a.kind() == one.kind()));
  }

  @Test
  void thereIsACaseForEveryKind() {
    EnumSet<AlarmKind> tried = EnumSet.copyOf(OF_THE_STATION);
    ofAVessel().forEach(one -> tried.add(one.kind()));
    assertEquals(EnumSet.allOf(AlarmKind.class), tried);
    for (AlarmKind kind : OF_THE_STATION) {
      AlarmBook book =
          AlarmBook.empty(AlarmSettings.DEFAULT)
              .report(kind, true, "It is so.", Assessments.START)
              .book();
      assertEquals(kind, book.alarms().get(0).kind());
      assertTrue(kind.action().endsWith("."), kind.action());
    }
  }

  @Test
  void aLoopFaultShorterThanFourSecondsIsNoAlarm() {
    AlarmBook book = AlarmBook.empty(AlarmSettings.DEFAULT);
    for (long t = 0; t <= 20; t++) {
      Assessments a = Assessments.of(vessel()).at(t);
      boolean fault = t >= 5 && t <= 8;
      book = book.fold((fault ? a.pressure(Quality.LOOP_FAULT) : a).build()).book();
      assertEquals(List.of(), book.alarms());
    }
  }
}

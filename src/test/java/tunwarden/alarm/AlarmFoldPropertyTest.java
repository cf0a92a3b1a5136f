package tunwarden.alarm;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tunwarden.assess.Assessment;
import tunwarden.estimate.EventKind;
import tunwarden.reading.Quality;

/** What must hold for any run of assessments. */
class AlarmFoldPropertyTest {
  private static final List<String> VESSELS = List.of("A", "B", "C");
  private static final int STEPS = 600;

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void sameAssessmentsGiveTheSameAlarmsAlsoAcrossARestart(long seed) {
    List<Assessment> run = run(seed);
    List<Transition> whole = new ArrayList<>();
    List<Transition> broken = new ArrayList<>();
    AlarmBook one = AlarmBook.empty(AlarmSettings.DEFAULT);
    AlarmBook two = AlarmBook.empty(AlarmSettings.DEFAULT);
    for (int i = 0; i < run.size(); i++) {
      one = take(one.fold(run.get(i)), whole);
      two = take(two.fold(run.get(i)), broken);
      if (i % 97 == 0) {
        two = AlarmBook.restored(AlarmSettings.DEFAULT, two.memories(), two.counts());
      }
    }
    assertEquals(whole, broken);
    assertEquals(one.alarms(), two.alarms());
    assertTrue(whole.size() > 50, "the run must be lively to prove anything: " + whole.size());
  }

  @ParameterizedTest
  @ValueSource(longs = {11, 12, 13, 14})
  void oneVesselNeverTouchesAnother(long seed) {
    List<Assessment> run = run(seed);
    List<Transition> together = new ArrayList<>();
    AlarmBook book = AlarmBook.empty(AlarmSettings.DEFAULT);
    for (Assessment assessment : run) {
      book = take(book.fold(assessment), together);
    }
    for (String vessel : VESSELS) {
      List<Transition> alone = new ArrayList<>();
      AlarmBook own = AlarmBook.empty(AlarmSettings.DEFAULT);
      for (Assessment assessment : run) {
        if (assessment.vessel().id().equals(vessel)) {
          own = take(own.fold(assessment), alone);
        }
      }
      assertEquals(
          alone, together.stream().filter(t -> t.alarm().vessel().equals(vessel)).toList());
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {21, 22, 23, 24})
  void transitionsOfOneAlarmFollowOnEachOther(long seed) {
    Map<String, Map<AlarmKind, AlarmState>> states = new HashMap<>();
    List<Transition> out = new ArrayList<>();
    AlarmBook book = AlarmBook.empty(AlarmSettings.DEFAULT);
    SplittableRandom people = new SplittableRandom(seed);
    for (Assessment assessment : run(seed)) {
      book = take(book.fold(assessment), out);
      book = someoneActs(book, assessment, people, out);
    }
    for (Transition transition : out) {
      Map<AlarmKind, AlarmState> page =
          states.computeIfAbsent(transition.alarm().vessel(), v -> new EnumMap<>(AlarmKind.class));
      AlarmKind kind = transition.alarm().kind();
      assertEquals(page.getOrDefault(kind, AlarmState.NORMAL), transition.from());
      page.put(kind, transition.to());
    }
    for (Alarm alarm : book.alarms()) {
      assertEquals(states.get(alarm.vessel()).get(alarm.kind()), alarm.state());
    }
  }

  private static AlarmBook someoneActs(
      AlarmBook book, Assessment assessment, SplittableRandom people, List<Transition> out) {
    if (book.alarms().isEmpty() || people.nextInt(4) > 0) {
      return book;
    }
    Alarm alarm = book.alarms().get(people.nextInt(book.alarms().size()));
    var at = assessment.time();
    return take(
        switch (people.nextInt(5)) {
          case 0 -> book.shelve(alarm.kind(), alarm.vessel(), "x", at.plusSeconds(60), at);
          case 1 -> book.unshelve(alarm.kind(), alarm.vessel(), at);
          case 2 -> book.outOfService(alarm.kind(), alarm.vessel(), "x", at);
          case 3 -> book.inService(alarm.kind(), alarm.vessel(), at);
          default -> book.acknowledge(alarm.kind(), alarm.vessel(), "", at);
        },
        out);
  }

  private static AlarmBook take(AlarmBook.Folded folded, List<Transition> out) {
    out.addAll(folded.transitions());
    return folded.book();
  }

  /** A random walk over pressures, sensor faults, events and clocks that step back. */
  private static List<Assessment> run(long seed) {
    SplittableRandom random = new SplittableRandom(seed);
    List<Assessment> all = new ArrayList<>();
    double bar = 0.8;
    long now = 0;
    for (int i = 0; i < STEPS; i++) {
      now += random.nextInt(50) == 0 ? -3600 : random.nextInt(40);
      bar = Math.max(-0.2, Math.min(2.3, bar + random.nextDouble(-0.15, 0.16)));
      String vessel = VESSELS.get(random.nextInt(VESSELS.size()));
      Assessments next = Assessments.of(vessel).at(now).bar(bar);
      Quality[] qualities = Quality.values();
      if (random.nextInt(6) == 0) {
        next.pressure(Assessments.observed(bar * 1e5, qualities[random.nextInt(qualities.length)]));
      }
      if (random.nextInt(8) == 0) {
        next.event(EventKind.values()[random.nextInt(12)], now - 5, random.nextBoolean());
      }
      if (random.nextInt(5) == 0) {
        next.liftIn(Duration.ofMinutes(random.nextInt(600)));
      }
      all.add(next.build());
    }
    return all;
  }
}

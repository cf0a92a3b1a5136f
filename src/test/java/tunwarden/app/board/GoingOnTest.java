package tunwarden.app.board;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tunwarden.assess.Assessor;
import tunwarden.assess.Observed;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.forecast.Outlook;
import tunwarden.rehearse.RehearsalCellar;
import tunwarden.vessel.Vessel;

class GoingOnTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final Vessel VESSEL =
      new RehearsalCellar(1, START, java.time.Duration.ofSeconds(10)).vessels().get(0);

  private final GoingOn goingOn = new GoingOn();

  private static Event event(EventKind kind, long begunS, boolean open) {
    Instant time = START.plusSeconds(begunS);
    return new Event(kind, VESSEL.id(), time, time, open, 1e5, 9e4, 0.1, 0.9, "");
  }

  private void see(Event... events) {
    goingOn.assessed(
        Assessor.assess(
            new Assessor.Evidence(
                VESSEL,
                START,
                Observed.NEVER,
                Observed.NEVER,
                Optional.empty(),
                Outlook.NONE,
                List.of(events))));
  }

  @Test
  void anEventIsThereFromItsBeginningToItsEnd() {
    see(event(EventKind.LEAK, 0, true), event(EventKind.WARMING, 60, true));
    assertEquals(2, goingOn.of(VESSEL.id()).size());
    see(event(EventKind.LEAK, 0, false));
    assertEquals(EventKind.WARMING, goingOn.of(VESSEL.id()).get(0).kind());
    assertEquals(1, goingOn.of(VESSEL.id()).size());
  }

  @Test
  void oneThatIsThoughtBetterOfKeepsItsPlaceUnderItsNewName() {
    see(event(EventKind.LEAK, 0, true));
    see(event(EventKind.VENT, 0, true));
    assertEquals(EventKind.VENT, goingOn.of(VESSEL.id()).get(0).kind());
    assertEquals(1, goingOn.of(VESSEL.id()).size());
  }

  @Test
  void goingBackBringsBackWhatWentOnThen() {
    see(event(EventKind.LEAK, 0, true));
    Map<String, List<Event>> then = goingOn.kept();
    see(event(EventKind.LEAK, 0, false));
    goingOn.restore(then);
    assertEquals(1, goingOn.of(VESSEL.id()).size());
  }
}

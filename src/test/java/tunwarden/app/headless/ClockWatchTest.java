package tunwarden.app.headless;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Steps of the wall clock are told from time that passes. */
class ClockWatchTest {
  private static final Instant NOON = Instant.parse("2026-03-29T12:00:00Z");
  private Instant wall = NOON;
  private long seconds;
  private final ClockWatch watch =
      new ClockWatch(new Clocks(() -> wall, () -> seconds * 1_000_000_000L));

  private Optional<String> after(long passedS, long shownS) {
    seconds += passedS;
    wall = wall.plusSeconds(shownS);
    return watch.look();
  }

  @Test
  void passingTimeIsNoStepHoweverLong() {
    assertEquals(Optional.empty(), after(3600, 3600));
  }

  @Test
  void stepsAreToldOnceWithTheirLength() {
    assertEquals(
        Optional.of("The clock of this computer was put back by 3600 s."), after(1, -3599));
    assertEquals(Optional.empty(), after(1, 1));
    assertEquals(Optional.of("The clock of this computer was put forward by 60 s."), after(1, 61));
  }
}

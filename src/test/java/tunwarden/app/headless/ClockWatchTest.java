package tunwarden.app.headless;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.Instant;
import java.util.Optional;
import org.junit.jupiter.api.Test;

/** Steps of the wall clock are told from time that passes. */
class ClockWatchTest {
  private static final Instant NOON = Instant.parse("2026-03-29T12:00:00Z");
  private final ClockWatch watch = new ClockWatch(NOON, 0);

  @Test
  void passingTimeIsNoStepHoweverLong() {
    assertEquals(Optional.empty(), watch.look(NOON.plusSeconds(3600), 3_600_000_000_000L));
  }

  @Test
  void stepsAreToldOnceWithTheirLength() {
    assertEquals(
        Optional.of("The clock of this computer was put back by 3600 s."),
        watch.look(NOON.minusSeconds(3599), 1_000_000_000L));
    assertEquals(Optional.empty(), watch.look(NOON.minusSeconds(3598), 2_000_000_000L));
    assertEquals(
        Optional.of("The clock of this computer was put forward by 60 s."),
        watch.look(NOON.minusSeconds(3537), 3_000_000_000L));
  }
}

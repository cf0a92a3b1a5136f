package tunwarden.screen.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class ProgressTest {
  private static Optional<Progress> after(long ms, double share) {
    return Progress.after(Duration.ofMillis(ms), "reading", share);
  }

  @Test
  void whatMayBeOverInAMomentIsNotShown() {
    assertTrue(after(499, 0.2).isEmpty());
    assertTrue(after(500, 0.2).isPresent());
  }

  @Test
  void whatIsLeftFollowsFromWhatIsDone() {
    assertEquals(Optional.of(Duration.ofMillis(2_700)), after(900, 0.25).orElseThrow().left());
    assertEquals(Optional.empty(), after(900, 0.005).orElseThrow().left());
  }

  @Test
  void aShareBeyondTheWholeIsTheWhole() {
    Progress done = after(900, 1.2).orElseThrow();
    assertEquals(1, done.share());
    assertEquals(Optional.of(Duration.ZERO), done.left());
    assertEquals(0, after(900, -3).orElseThrow().share());
  }
}

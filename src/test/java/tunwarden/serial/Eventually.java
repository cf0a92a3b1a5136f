package tunwarden.serial;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.function.BooleanSupplier;

/** Waits for something that another thread brings about. */
final class Eventually {
  private Eventually() {}

  static void within(Duration limit, String what, BooleanSupplier holds) {
    long end = System.nanoTime() + limit.toNanos();
    boolean held = holds.getAsBoolean();
    while (!held && System.nanoTime() < end) {
      sleep(5);
      held = holds.getAsBoolean();
    }
    assertTrue(held, () -> "not within " + limit + ": " + what);
  }

  static void sleep(long ms) {
    try {
      Thread.sleep(ms);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }
}

package tunwarden.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Instant;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogOptions;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;

/** Newton's law of cooling: T = Ta − (Ta − T0) exp(−t/τ), a textbook form. */
class WarmingHabitTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final double AMBIENT_K = 297.15;
  private static final double HOUR = 3600;

  private static DoubleUnaryOperator newton(double fromK, double constantS) {
    return t -> AMBIENT_K - (AMBIENT_K - fromK) * Math.exp(-t / constantS);
  }

  private static WarmingHabit follow(
      WarmingHabit habit, double atS, double hours, DoubleUnaryOperator kelvin) {
    Random random = new Random(5);
    WarmingHabit next = habit;
    for (int s = 0; s <= hours * HOUR; s += 30) {
      double read = kelvin.applyAsDouble(s) + 0.05 * random.nextGaussian();
      next = next.seen(START.plusSeconds((long) atS + s), read, OptionalDouble.of(AMBIENT_K));
    }
    return next;
  }

  @Test
  void theTimeConstantOfACoolingLossIsLearnt() {
    WarmingHabit habit = follow(WarmingHabit.NONE, 0, 3, t -> 277.15);
    habit = follow(habit, 3 * HOUR, 6, newton(277.15, 40 * HOUR));
    WarmingHabit.Learnt learnt = habit.learnt().orElseThrow();
    assertEquals(40 * HOUR, learnt.timeS().middle(), 2 * HOUR);
    assertTrue(learnt.timeS().low() < 40 * HOUR && learnt.timeS().high() > 40 * HOUR);
    assertEquals(277.15, learnt.fromK(), 0.3);
    assertEquals(279.94, learnt.toK(), 0.3, "24 - 20 exp(-6/40) = 6.79 °C at the end");
  }

  @Test
  void aVesselThatStaysColdOrWobblesTeachesNothing() {
    WarmingHabit habit = follow(WarmingHabit.NONE, 0, 24, t -> 277.15 + 0.5 * Math.sin(t / 3000));
    assertTrue(habit.learnt().isEmpty());
  }

  @Test
  void withoutKnownSurroundingsNothingIsLearnt() {
    WarmingHabit habit = WarmingHabit.NONE;
    for (int s = 0; s < 8 * HOUR; s += 60) {
      double kelvin = newton(277.15, 20 * HOUR).applyAsDouble(s);
      habit = habit.seen(START.plusSeconds(s), kelvin, OptionalDouble.empty());
    }
    assertEquals(WarmingHabit.NONE, habit);
  }

  @Test
  void ofTwoRisesTheQuickerCounts() {
    WarmingHabit habit = follow(WarmingHabit.NONE, 0, 6, newton(277.15, 40 * HOUR));
    habit = follow(habit, 7 * HOUR, 3, t -> 277.15);
    habit = follow(habit, 11 * HOUR, 12, newton(277.15, 90 * HOUR));
    assertEquals(40 * HOUR, habit.learnt().orElseThrow().timeS().middle(), 3 * HOUR);
    habit = follow(habit, 24 * HOUR, 3, t -> 277.15);
    habit = follow(habit, 28 * HOUR, 4, newton(277.15, 15 * HOUR));
    assertEquals(15 * HOUR, habit.learnt().orElseThrow().timeS().middle(), HOUR);
  }

  /** The shipped log is simulated, by other code, with a time constant of 9 h towards 24 °C. */
  @Test
  void theShippedDayOfCoolingLostTeachesWhatItWasMadeWith() throws IOException {
    WarmingHabit habit = WarmingHabit.NONE;
    Instant until = Instant.parse("2026-03-02T11:00:00Z");
    try (RowSource log =
        LogFile.open(Path.of("replay-logs/cooling-lost.csv"), LogOptions.NONE).open()) {
      for (LogRow row = log.next(); row != null && row.time().isBefore(until); row = log.next()) {
        for (Sample sample : row.samples()) {
          if (sample instanceof Reading read && read.quantity() == Quantity.TEMPERATURE) {
            habit = habit.seen(read.time(), read.value(), OptionalDouble.of(AMBIENT_K));
          }
        }
      }
    }
    WarmingHabit.Learnt learnt = habit.learnt().orElseThrow();
    assertEquals(9 * HOUR, learnt.timeS().middle(), 0.3 * HOUR);
    assertTrue(learnt.timeS().low() < 9 * HOUR && learnt.timeS().high() > 9 * HOUR);
  }
}

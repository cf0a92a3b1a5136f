package tunwarden.replay;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;

/** Feeding a target up to any data time, forwards and backwards. */
class ReplayPlayerTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final Duration TICK = Duration.ofSeconds(60);

  /** Remembers all it was told; its checkpoint is how much that was. */
  static final class Listening implements ReplayTarget {
    final List<String> heard = new ArrayList<>();
    volatile Runnable onSample = () -> {};

    @Override
    public void accept(Sample sample) {
      heard.add(sample.time() + "");
      onSample.run();
    }

    @Override
    public void tick(Instant now) {
      heard.add("tick " + now);
    }

    @Override
    public Object checkpoint() {
      return heard.size();
    }

    @Override
    public void restore(Object checkpoint) {
      while (heard.size() > (Integer) checkpoint) {
        heard.remove(heard.size() - 1);
      }
    }
  }

  /** A row every ten seconds, with a silence of an hour in the middle. */
  static RowSource.Supplier rows(int count) {
    return () ->
        new RowSource() {
          private int next;

          @Override
          public LogRow next() {
            if (next == count) {
              return null;
            }
            Instant time = START.plusSeconds(10L * next + (next > count / 2 ? 3600 : 0));
            next++;
            Sample sample = Reading.good(time, "v", Quantity.PRESSURE, next);
            return new LogRow(0, time, "v", List.of(sample));
          }
        };
  }

  @Test
  void silenceIsFilledWithTicksAtRoundTimes() throws IOException {
    Listening target = new Listening();
    try (ReplayPlayer player = new ReplayPlayer(rows(10), target, TICK)) {
      player.playTo(START.plusSeconds(4000), Long.MAX_VALUE);
      assertTrue(player.isEnded());
    }
    assertEquals(10 + 60, target.heard.size());
    assertTrue(target.heard.contains("tick 2026-03-02T08:01:00Z"), target.heard.toString());
  }

  @Test
  void goingBackAndForthHearsTheSameAsGoingStraight() throws IOException {
    Listening straight = new Listening();
    Listening wandering = new Listening();
    Instant end = START.plusSeconds(30_000);
    try (ReplayPlayer player = new ReplayPlayer(rows(2000), straight, TICK)) {
      player.playTo(end, Long.MAX_VALUE);
    }
    try (ReplayPlayer player = new ReplayPlayer(rows(2000), wandering, TICK)) {
      for (long second : new long[] {5000, 100, 15_000, 14_990, 0, 22_000, 7}) {
        player.playTo(START.plusSeconds(second), Long.MAX_VALUE);
        assertEquals(START.plusSeconds(second), player.at());
      }
      player.playTo(end, Long.MAX_VALUE);
    }
    assertEquals(straight.heard, wandering.heard);
  }

  @Test
  void aBoundOnRowsIsKept() throws IOException {
    Listening target = new Listening();
    try (ReplayPlayer player = new ReplayPlayer(rows(100), target, TICK)) {
      assertFalse(player.playTo(START.plusSeconds(400), 5));
      assertEquals(5, player.fed());
      player.step();
      assertEquals(6, player.fed());
    }
  }

  @Test
  void placesToReturnToStayFew() {
    CheckpointTrail trail = new CheckpointTrail(3);
    for (long rows = 0; rows < 5_000_000; rows++) {
      if (trail.wants(rows)) {
        trail.add(new CheckpointTrail.Place(rows, START.plusSeconds(rows), rows));
      }
    }
    assertTrue(trail.size() <= 129, "places: " + trail.size());
    long back = trail.before(START.plusSeconds(2_500_000)).rows();
    assertTrue(back <= 2_500_000 && back > 2_400_000, "nearest place: " + back);
    assertEquals(0, trail.before(START.minusSeconds(5)).rows());
  }
}

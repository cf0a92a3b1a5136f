package tunwarden.wire.ask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Whose turn it is, on a clock that the test moves. */
class TurnsTest {
  private static final long MS = 1_000_000;
  private static final long PERIOD = 1000 * MS;
  private static final long ANSWER = 35 * MS;
  private static final long COST = 350 * MS;

  /** Runs a line for a while; gives the times at which each party answered. */
  private static List<List<Long>> run(int parties, int dead, long forNanos) {
    Turns turns = new Turns();
    List<Turns.Party> all = new ArrayList<>();
    List<List<Long>> answered = new ArrayList<>();
    for (int i = 0; i < parties; i++) {
      all.add(turns.join(PERIOD, COST, 2, 0));
      answered.add(new ArrayList<>());
    }
    long now = 0;
    while (now < forNanos) {
      Turns.Party party = turns.next(now);
      if (party == null) {
        now += Math.max(MS, turns.waitNanos(now, 100 * MS));
      } else if (all.indexOf(party) < dead) {
        now += COST;
        turns.failed(party, now);
      } else {
        now += ANSWER;
        turns.answered(party, now);
        answered.get(all.indexOf(party)).add(now);
      }
    }
    return answered;
  }

  @Test
  void oneDeadOfEightDelaysNobodyByAFifthOfThePeriod() {
    List<List<Long>> answered = run(8, 1, 300 * PERIOD);
    for (List<Long> times : answered.subList(1, 8)) {
      assertTrue(times.size() >= 298, () -> times.size() + " answers");
      for (int i = 2; i < times.size(); i++) {
        double gap = (times.get(i) - times.get(i - 1)) / (double) PERIOD;
        assertTrue(gap > 0.8 && gap < 1.2, "period of " + gap);
      }
    }
  }

  @Test
  void aDeadOneIsStillTriedAndComesBack() {
    Turns turns = new Turns();
    Turns.Party party = turns.join(PERIOD, COST, 2, 0);
    assertSame(party, turns.next(0));
    turns.failed(party, 10 * MS);
    assertSame(party, turns.next(10 * MS), "the retry comes at once when nobody waits");
    turns.failed(party, 20 * MS);
    assertTrue(party.isSilent());
    assertNull(turns.next(20 * MS));
    assertSame(party, turns.next(20 * MS + 5 * PERIOD));
    turns.answered(party, 6 * PERIOD);
    assertEquals(false, party.isSilent());
  }

  @Test
  void withoutAGapTheDeadOneIsTriedOnceInThirtySeconds() {
    Turns turns = new Turns();
    Turns.Party busy = turns.join(40 * MS, COST, 1, 0);
    Turns.Party dead = turns.join(PERIOD, COST, 1, 0);
    long now = 0;
    int tries = 0;
    while (now < 95_000 * MS) {
      Turns.Party party = turns.next(now);
      if (party == dead) {
        tries++;
        now += COST;
        turns.failed(dead, now);
      } else if (party == busy) {
        now += 10 * MS;
        turns.answered(busy, now);
      } else {
        now += MS;
      }
    }
    assertEquals(4, tries);
  }
}

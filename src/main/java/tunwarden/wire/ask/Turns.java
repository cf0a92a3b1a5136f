package tunwarden.wire.ask;

import java.util.ArrayList;
import java.util.List;

/**
 * Whose turn it is on a line that several instruments share. Those that answer keep a fixed grid of
 * their periods, the earliest due first. One that does not answer is tried again only in a gap that
 * is long enough for the whole attempt, so that it delays nobody; when there is no such gap it is
 * tried after {@link #PATIENCE_NANOS} all the same.
 */
public final class Turns {
  /** Longest time without an attempt on a silent instrument, ns. */
  public static final long PATIENCE_NANOS = 30_000_000_000L;

  private static final int PROBE_PERIODS = 5;

  private final List<Party> parties = new ArrayList<>();

  /** One instrument on the line. */
  public static final class Party {
    private final long periodNanos;
    private final long costNanos;
    private final int tries;
    private long dueNanos;
    private long lastTryNanos;
    private int failures;

    private Party(long periodNanos, long costNanos, int tries, long startNanos) {
      this.periodNanos = periodNanos;
      this.costNanos = costNanos;
      this.tries = tries;
      this.dueNanos = startNanos;
      this.lastTryNanos = startNanos;
    }

    /** Whether as many tries as one poll allows have failed in a row. */
    public boolean isSilent() {
      return failures >= tries;
    }

    private boolean isOwed() {
      return failures > 0;
    }
  }

  /**
   * Lets an instrument take part.
   *
   * @param periodNanos between its polls
   * @param costNanos longest time an attempt that fails takes, with the quiet time after it
   * @param tries attempts before it counts as silent, at least 1
   * @param startNanos when it is first due
   */
  public Party join(long periodNanos, long costNanos, int tries, long startNanos) {
    Party party = new Party(periodNanos, costNanos, tries, startNanos);
    parties.add(party);
    return party;
  }

  /** The party to ask now, or null when nobody is due. */
  public Party next(long nowNanos) {
    Party earliest = null;
    for (Party party : parties) {
      boolean due = !party.isOwed() && party.dueNanos - nowNanos <= 0;
      if (due && (earliest == null || party.dueNanos - earliest.dueNanos < 0)) {
        earliest = party;
      }
    }
    return earliest != null ? earliest : owed(nowNanos);
  }

  private Party owed(long nowNanos) {
    long gap = gapNanos(nowNanos);
    Party longest = null;
    for (Party party : parties) {
      boolean due = party.isOwed() && party.dueNanos - nowNanos <= 0;
      boolean fits = party.costNanos <= gap || nowNanos - party.lastTryNanos >= PATIENCE_NANOS;
      if (due && fits && (longest == null || party.lastTryNanos - longest.lastTryNanos < 0)) {
        longest = party;
      }
    }
    return longest;
  }

  /** Time until one that answers is due; endless when nobody answers. */
  private long gapNanos(long nowNanos) {
    long gap = Long.MAX_VALUE;
    for (Party party : parties) {
      if (!party.isOwed()) {
        gap = Math.min(gap, party.dueNanos - nowNanos);
      }
    }
    return gap;
  }

  /** Time until somebody may be due, at most {@code mostNanos}. */
  public long waitNanos(long nowNanos, long mostNanos) {
    long wait = mostNanos;
    for (Party party : parties) {
      wait = Math.min(wait, Math.max(0, party.dueNanos - nowNanos));
    }
    return wait;
  }

  /** The party answered; its next turn is on its own grid. */
  public void answered(Party party, long nowNanos) {
    party.failures = 0;
    party.lastTryNanos = nowNanos;
    do {
      party.dueNanos += party.periodNanos;
    } while (party.dueNanos - nowNanos <= 0);
  }

  /** The party did not answer. A silent one is tried at every fifth period, and each 30 s. */
  public void failed(Party party, long nowNanos) {
    party.failures = Math.min(party.failures + 1, party.tries);
    party.lastTryNanos = nowNanos;
    if (party.isSilent()) {
      party.dueNanos = nowNanos + Math.min(PATIENCE_NANOS, PROBE_PERIODS * party.periodNanos);
    } else {
      party.dueNanos = nowNanos;
    }
  }
}

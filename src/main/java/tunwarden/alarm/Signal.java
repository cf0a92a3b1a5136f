package tunwarden.alarm;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/**
 * The condition behind an alarm after its delays, without what people did about it.
 *
 * @param active whether the alarm condition holds
 * @param blind whether nothing could be said the last time
 * @param pending since when the opposite of {@code active} has been the case, while a delay runs
 * @param causes what has raised it
 * @param since when it began
 * @param raised when it was raised lately, for counting chatter
 */
public record Signal(
    boolean active,
    boolean blind,
    Optional<Instant> pending,
    Set<String> causes,
    Instant since,
    List<Instant> raised) {

  /** ISA-18.2: an alarm chatters when it comes three times in a minute (from memory). */
  private static final int CHATTER_COUNT = 3;

  private static final Duration CHATTER_WINDOW = Duration.ofMinutes(1);

  /** Keeps its own copies. */
  public Signal {
    causes = Set.copyOf(causes);
    raised = List.copyOf(raised);
  }

  /** What a step did. */
  enum Effect {
    NONE,
    RAISED,
    RAISED_AGAIN,
    RETURNED,
    /** Raised and over at once. */
    PASSED
  }

  /** A step and what it did. */
  record Stepped(Signal next, Effect effect) {}

  static Signal quiet(Instant at) {
    return new Signal(false, false, Optional.empty(), Set.of(), at, List.of());
  }

  boolean isQuiet() {
    return !active && pending.isEmpty() && causes.isEmpty() && raised.isEmpty();
  }

  boolean isChattering() {
    return raised.size() >= CHATTER_COUNT;
  }

  Stepped step(Condition condition, AlarmSettings.Delays delays, Instant at) {
    Signal now = forgetOldRaises(at);
    return switch (condition.truth()) {
      case YES -> now.yes(condition, condition.ownDelay().orElse(delays.on()), at);
      case NO -> now.no(delays.off(), at);
      case OVER -> now.over(condition, at);
      case STANDS -> new Stepped(now.blind(false), Effect.NONE);
      default -> new Stepped(now.blinded(), Effect.NONE);
    };
  }

  private Stepped yes(Condition condition, Duration delay, Instant at) {
    boolean news = !causes.containsAll(condition.causes());
    if (active) {
      Signal same = new Signal(true, false, Optional.empty(), causes, since, raised);
      return news
          ? new Stepped(same.rise(condition, since, at), Effect.RAISED_AGAIN)
          : new Stepped(same, Effect.NONE);
    }
    Instant start = start(at);
    if (Duration.between(start, at).compareTo(delay) < 0) {
      return new Stepped(
          new Signal(false, false, Optional.of(start), causes, since, raised), Effect.NONE);
    }
    if (condition.kind().isEvent() && !condition.causes().isEmpty() && !news) {
      return new Stepped(this, Effect.NONE);
    }
    return new Stepped(rise(condition, condition.began().orElse(start), at), Effect.RAISED);
  }

  private Stepped no(Duration delay, Instant at) {
    if (!active) {
      return new Stepped(
          new Signal(false, false, Optional.empty(), causes, since, raised), Effect.NONE);
    }
    Instant start = start(at);
    if (Duration.between(start, at).compareTo(delay) < 0) {
      return new Stepped(
          new Signal(true, false, Optional.of(start), causes, since, raised), Effect.NONE);
    }
    return new Stepped(fall(Set.of()), Effect.RETURNED);
  }

  private Stepped over(Condition condition, Instant at) {
    if (!causes.containsAll(condition.causes())) {
      Signal risen = rise(condition, condition.began().orElse(at), at);
      return new Stepped(risen.fall(risen.causes), Effect.PASSED);
    }
    return active ? new Stepped(fall(causes), Effect.RETURNED) : new Stepped(this, Effect.NONE);
  }

  /** Silence neither ends an alarm nor lets an off-delay run out; an on-delay keeps its start. */
  private Signal blinded() {
    return new Signal(active, true, active ? Optional.empty() : pending, causes, since, raised);
  }

  private Signal blind(boolean now) {
    return blind == now ? this : new Signal(active, now, pending, causes, since, raised);
  }

  /** Where the running delay began; a clock that stepped back starts it afresh. */
  private Instant start(Instant at) {
    return pending.filter(start -> !start.isAfter(at)).orElse(at);
  }

  private Signal rise(Condition condition, Instant began, Instant at) {
    // An event's cause is its start: only the newest is kept, so that the set cannot grow.
    Set<String> next = new TreeSet<>(condition.kind().isEvent() ? Set.of() : causes);
    next.addAll(condition.causes());
    List<Instant> times = new ArrayList<>(raised);
    times.add(at);
    int from = Math.max(0, times.size() - CHATTER_COUNT);
    return new Signal(
        true, false, Optional.empty(), next, began, times.subList(from, times.size()));
  }

  private Signal fall(Set<String> kept) {
    return new Signal(false, false, Optional.empty(), kept, since, raised);
  }

  private Signal forgetOldRaises(Instant at) {
    List<Instant> recent =
        raised.stream()
            .filter(time -> !time.isAfter(at) && time.isAfter(at.minus(CHATTER_WINDOW)))
            .toList();
    return recent.size() == raised.size()
        ? this
        : new Signal(active, blind, pending, causes, since, recent);
  }
}

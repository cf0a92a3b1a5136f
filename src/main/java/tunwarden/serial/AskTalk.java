package tunwarden.serial;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import tunwarden.reading.Quality;
import tunwarden.wire.ask.Question;
import tunwarden.wire.ask.Result;
import tunwarden.wire.ask.Turns;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.profile.LineSettings;
import tunwarden.wire.signal.Decoded;

/**
 * Asks the instruments on one line in turn, one question outstanding. After a failure the line must
 * be quiet for one full timeout before anything else is asked, so that a late answer is not taken
 * for the answer to another question.
 */
final class AskTalk implements Talk {
  private static final long IDLE_NANOS = 100_000_000;
  private static final long LONGEST_DRAIN_NANOS = 2_000_000_000L;
  private static final long LEAST_SILENCE_NANOS = 1_750_000;

  private final Desk desk;
  private final LineSettings line;
  private final List<Unit> units = new ArrayList<>();
  private final byte[] buffer = new byte[512];
  private Turns turns = new Turns();
  private long lastByteNanos;
  private boolean fouled;

  /** One instrument on the line with its place among the turns. */
  private static final class Unit {
    private final AskedUnit asked;
    private Turns.Party party;

    Unit(AskedUnit asked) {
      this.asked = asked;
    }
  }

  AskTalk(PortPlan plan, Desk desk) {
    this.desk = desk;
    this.line = plan.line();
    Map<List<Object>, List<Binding>> byUnit = new LinkedHashMap<>();
    for (Binding binding : plan.bindings()) {
      List<Object> key = List.of(binding.profile().name(), binding.slave());
      byUnit.computeIfAbsent(key, k -> new ArrayList<>()).add(binding);
    }
    byUnit.values().forEach(bindings -> units.add(new Unit(new AskedUnit(bindings))));
  }

  @Override
  public void begin() {
    turns = new Turns();
    long now = System.nanoTime();
    lastByteNanos = now;
    for (Unit unit : units) {
      AskedUnit asked = unit.asked;
      unit.party = turns.join(asked.periodNanos(), costNanos(asked), asked.tries(), now);
    }
  }

  private long costNanos(AskedUnit asked) {
    long onWire = 0;
    for (Question question : asked.questions()) {
      onWire += line.nanosFor(question.bytes().length + question.answerBytes());
    }
    return onWire + 2 * asked.timeoutNanos() + asked.turnaroundNanos();
  }

  @Override
  public void turn(ByteLink link) throws PortException {
    long now = System.nanoTime();
    Turns.Party party = turns.next(now);
    if (party == null) {
      sleep(Math.max(1_000_000, turns.waitNanos(now, IDLE_NANOS)));
      return;
    }
    for (Unit unit : units) {
      if (unit.party == party) {
        poll(unit, link);
      }
    }
  }

  /** Asks all the questions of one unit; its values go on together, or a fault in their place. */
  private void poll(Unit unit, ByteLink link) throws PortException {
    Map<String, Decoded> values = new LinkedHashMap<>();
    for (Question question : unit.asked.questions()) {
      Result result = ask(question, unit.asked, link);
      if (result instanceof Result.Values answer) {
        values.putAll(answer.values());
      } else if (result instanceof Result.Refusal refusal) {
        refused(unit, refusal);
        return;
      } else if (result instanceof Result.Failure failure) {
        failed(unit, failure, link);
        return;
      }
    }
    fouled = false;
    turns.answered(unit.party, System.nanoTime());
    desk.values(values, unit.asked.bindings());
  }

  private void refused(Unit unit, Result.Refusal refusal) {
    turns.answered(unit.party, System.nanoTime());
    desk.tally().trouble(Trouble.REFUSAL, refusal.words(), desk.now());
    if (!unit.asked.humbled(refusal)) {
      desk.faults(unit.asked.bindings(), refusal.quality(), refusal.words());
    }
  }

  private void failed(Unit unit, Result.Failure failure, ByteLink link) throws PortException {
    fouled = failure.quality() != Quality.NO_ANSWER;
    desk.tally().trouble(trouble(failure.quality()), failure.detail(), desk.now());
    drain(unit.asked.timeoutNanos(), link);
    turns.failed(unit.party, System.nanoTime());
    if (unit.party.isSilent()) {
      desk.faults(unit.asked.bindings(), failure.quality(), failure.detail());
    }
  }

  private static Trouble trouble(Quality quality) {
    return switch (quality) {
      case NO_ANSWER -> Trouble.NO_ANSWER;
      case CHECKSUM -> Trouble.CHECKSUM;
      default -> Trouble.BROKEN;
    };
  }

  private Result ask(Question question, AskedUnit unit, ByteLink link) throws PortException {
    long silence = Math.max(LEAST_SILENCE_NANOS, line.nanosFor(7) / 2);
    sleep(lastByteNanos + Math.max(silence, unit.turnaroundNanos()) - System.nanoTime());
    discard(link);
    byte[] bytes = question.bytes();
    link.write(bytes);
    long onWire = line.nanosFor(bytes.length + question.answerBytes());
    long deadline = System.nanoTime() + onWire + unit.timeoutNanos();
    Question.Ear ear = question.listen();
    while (true) {
      long left = deadline - System.nanoTime();
      int count = link.read(buffer, (int) Math.max(0, left / 1_000_000));
      if (count > 0) {
        heard(count);
        Result result = ear.accept(buffer, count);
        if (result != null) {
          return result;
        }
      }
      if (System.nanoTime() - deadline >= 0) {
        return Objects.requireNonNull(ear.late());
      }
    }
  }

  private void heard(int count) {
    lastByteNanos = System.nanoTime();
    desk.tally().received(buffer, count, desk.now());
  }

  private void discard(ByteLink link) throws PortException {
    for (int count = link.read(buffer, 0); count > 0; count = link.read(buffer, 0)) {
      heard(count);
      desk.tally().dropped(count);
      if (count < buffer.length) {
        return;
      }
    }
  }

  /** Waits until nothing has come for {@code quietNanos}, but not for ever on a noisy line. */
  private void drain(long quietNanos, ByteLink link) throws PortException {
    long end = System.nanoTime() + LONGEST_DRAIN_NANOS;
    long quietSince = System.nanoTime();
    while (System.nanoTime() - quietSince < quietNanos && System.nanoTime() - end < 0) {
      int count = link.read(buffer, (int) Math.max(1, quietNanos / 1_000_000));
      if (count > 0) {
        heard(count);
        desk.tally().dropped(count);
        quietSince = System.nanoTime();
      }
    }
  }

  private static void sleep(long nanos) {
    if (nanos <= 0) {
      return;
    }
    try {
      Thread.sleep(nanos / 1_000_000, (int) (nanos % 1_000_000));
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  @Override
  public LinkState state() {
    return fouled ? LinkState.GARBLED : LinkState.OPEN;
  }
}

package tunwarden.alarm;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import tunwarden.alarm.Transition.Change;

/**
 * Everything remembered about one alarm; what is saved across restarts.
 *
 * @param kind the condition
 * @param vessel identity of the vessel; empty for the station itself
 * @param signal the condition after its delays
 * @param handling what people and rules did about it
 * @param text the latest sentence
 */
public record AlarmMemory(
    AlarmKind kind, String vessel, Signal signal, Handling handling, String text) {

  static AlarmMemory fresh(AlarmKind kind, String vessel, Instant at) {
    return new AlarmMemory(kind, vessel, Signal.quiet(at), Handling.untouched(at), "");
  }

  /** State as ISA-18.2 names it; the stronger word first where several hold. */
  public AlarmState state() {
    if (handling.outOfService().isPresent()) {
      return AlarmState.OUT_OF_SERVICE;
    }
    if (handling.suppressed()) {
      return AlarmState.SUPPRESSED;
    }
    if (handling.shelf().isPresent()) {
      return AlarmState.SHELVED;
    }
    if (signal.active()) {
      return handling.acknowledged() ? AlarmState.ACKNOWLEDGED : AlarmState.UNACKNOWLEDGED;
    }
    return handling.acknowledged() ? AlarmState.NORMAL : AlarmState.RETURNED_UNACKNOWLEDGED;
  }

  /** The alarm as people see it. */
  public Alarm alarm() {
    String held = signal.active() && signal.blind() ? " Last known: the instrument is silent." : "";
    return new Alarm(
        kind,
        vessel,
        state(),
        signal.since(),
        handling.changed(),
        handling.shelf().map(Handling.Shelf::until),
        text + held,
        kind.action(),
        handling.remark(),
        signal.isChattering());
  }

  /** Nothing here that must be remembered. */
  boolean isIdle() {
    return signal.isQuiet() && handling.isUntouched();
  }

  /** Takes in what an assessment says; adds the transitions to {@code out}. */
  AlarmMemory take(Condition condition, AlarmSettings settings, Instant at, List<Transition> out) {
    AlarmMemory before = expireShelf(at, out);
    if (condition.truth() == Condition.Truth.SUPPRESSED) {
      return before.suppress(at, out);
    }
    boolean back = before.handling.suppressed();
    AlarmSettings.Delays delays =
        back ? AlarmSettings.Delays.NONE : settings.delays(condition.kind());
    Signal.Stepped stepped = before.signal.step(condition, delays, at);
    String words = condition.text().isEmpty() ? before.text : condition.text();
    AlarmMemory next = new AlarmMemory(kind, vessel, stepped.next(), before.handling, words);
    if (back) {
      return next.unsuppress(at, out);
    }
    return next.follow(stepped.effect(), before.state(), at, out);
  }

  private AlarmMemory follow(
      Signal.Effect effect, AlarmState from, Instant at, List<Transition> out) {
    return switch (effect) {
      case RAISED -> with(handling.seen(false).remark("")).tell(Change.RAISED, from, at, out);
      case RAISED_AGAIN -> with(handling.seen(false)).tell(Change.RAISED_AGAIN, from, at, out);
      case PASSED -> passed(from, at, out);
      case RETURNED -> returned().tell(Change.RETURNED, from, at, out);
      default -> this;
    };
  }

  /** An event that was over when it was reported still shows both steps. */
  private AlarmMemory passed(AlarmState from, Instant at, List<Transition> out) {
    Signal during =
        new Signal(true, false, signal.pending(), signal.causes(), signal.since(), signal.raised());
    AlarmMemory raised =
        new AlarmMemory(kind, vessel, during, handling.seen(false).remark(""), text)
            .tell(Change.RAISED, from, at, out);
    return new AlarmMemory(kind, vessel, signal, raised.handling, text)
        .returned()
        .tell(Change.RETURNED, raised.state(), at, out);
  }

  private AlarmMemory returned() {
    return kind.latches() ? this : with(handling.seen(true));
  }

  AlarmMemory acknowledge(String word, Instant at, List<Transition> out) {
    return state().wantsAcknowledging()
        ? with(handling.seen(true).remark(word)).tell(Change.ACKNOWLEDGED, state(), at, out)
        : this;
  }

  AlarmMemory shelve(Handling.Shelf shelf, Instant at, List<Transition> out) {
    return with(handling.shelf(Optional.of(shelf)).remark(shelf.reason()))
        .tell(Change.SHELVED, state(), at, out);
  }

  AlarmMemory unshelve(Instant at, List<Transition> out) {
    return handling.shelf().isEmpty()
        ? this
        : with(handling.shelf(Optional.empty())).reopen().tell(Change.UNSHELVED, state(), at, out);
  }

  AlarmMemory expireShelf(Instant at, List<Transition> out) {
    boolean over = handling.shelf().filter(shelf -> !shelf.until().isAfter(at)).isPresent();
    return over ? unshelve(at, out) : this;
  }

  AlarmMemory takeOutOfService(String reason, Instant at, List<Transition> out) {
    return with(handling.outOfService(Optional.of(reason)).remark(reason))
        .tell(Change.OUT_OF_SERVICE, state(), at, out);
  }

  AlarmMemory putBackInService(Instant at, List<Transition> out) {
    return handling.outOfService().isEmpty()
        ? this
        : with(handling.outOfService(Optional.empty()))
            .reopen()
            .tell(Change.IN_SERVICE, state(), at, out);
  }

  private AlarmMemory suppress(Instant at, List<Transition> out) {
    if (handling.suppressed() || !signal.active()) {
      return this;
    }
    return with(handling.suppressed(true)).tell(Change.SUPPRESSED, state(), at, out);
  }

  private AlarmMemory unsuppress(Instant at, List<Transition> out) {
    return with(handling.suppressed(false)).reopen().tell(Change.UNSUPPRESSED, state(), at, out);
  }

  /** What is still the case when it comes back must be seen afresh. */
  private AlarmMemory reopen() {
    return signal.active() ? with(handling.seen(false)) : this;
  }

  private AlarmMemory with(Handling other) {
    return new AlarmMemory(kind, vessel, signal, other, text);
  }

  private AlarmMemory tell(Change change, AlarmState from, Instant at, List<Transition> out) {
    AlarmMemory stamped = with(handling.changed(at));
    out.add(new Transition(change, from, stamped.alarm(), at, handling.remark()));
    return stamped;
  }
}

package tunwarden.notice;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmState;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.JournalLines;

/**
 * Decides when word is sent: alarms that come together go in one message, and no more messages an
 * hour than a person will read; what comes above that waits and is folded into the next. Time is an
 * argument.
 */
final class Gatherer {
  private final NoticeRules rules;
  private final List<JournalLines.Numbered> waiting = new ArrayList<>();
  private final Deque<Instant> sent = new ArrayDeque<>();
  private Optional<Instant> firstWaits = Optional.empty();
  private long lastNumber;

  /** Changes after which a person must look, as the journal words them. */
  private static final Set<String> NEWS =
      Set.of(
          "raised", "raised again", "no longer shelved", "no longer suppressed", "back in service");

  Gatherer(NoticeRules rules) {
    this.rules = rules;
  }

  void add(JournalLines.Numbered numbered, Instant now) {
    if (isWorthSending(numbered.entry())) {
      waiting.add(numbered);
      lastNumber = numbered.number();
      firstWaits = Optional.of(firstWaits.orElse(now));
    }
  }

  /** The message that is due, if there is one. */
  Optional<Message> due(Instant now) {
    // A clock that stepped back must neither hold up word nor forget what was sent.
    sent.removeIf(at -> at.isAfter(now) || !at.isAfter(now.minus(Duration.ofHours(1))));
    boolean ripe =
        firstWaits.isPresent()
            && (firstWaits.get().isAfter(now)
                || !firstWaits.get().plus(rules.together()).isAfter(now));
    if (!ripe || sent.size() >= rules.perHour()) {
      return Optional.empty();
    }
    return flush(now);
  }

  /** All that waits, whether due or not. */
  Optional<Message> flush(Instant now) {
    if (waiting.isEmpty()) {
      return Optional.empty();
    }
    Message message = Message.of(waiting, now);
    waiting.clear();
    firstWaits = Optional.empty();
    sent.add(now);
    return Optional.of(message);
  }

  /** The number of the newest entry taken in; all of it is in a message once none waits. */
  long lastNumber() {
    return lastNumber;
  }

  private boolean isWorthSending(JournalEntry entry) {
    if (!entry.kind().equals(JournalEntry.ALARM)) {
      return false;
    }
    String change = String.valueOf(entry.values().get("change"));
    String state = String.valueOf(entry.values().get("state"));
    Optional<AlarmKind> kind = AlarmKind.ofId(String.valueOf(entry.values().get("alarm")));
    // Word that word does not get through would only pile up.
    return NEWS.contains(change)
        && state.equals(AlarmState.UNACKNOWLEDGED.word())
        && kind.filter(k -> k != AlarmKind.NOTICE && k.priority().compareTo(rules.least()) >= 0)
            .isPresent();
  }
}

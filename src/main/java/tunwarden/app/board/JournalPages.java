package tunwarden.app.board;

import java.time.Instant;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.Transition;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Event;
import tunwarden.screen.model.JournalEntry;
import tunwarden.station.Sink;

/** The newest journal entries, for the screen; the journal on disk is another sink. */
final class JournalPages implements Sink {
  private static final int KEPT = 2_000;

  private final Deque<JournalEntry> entries = new ArrayDeque<>();
  private List<JournalEntry> shown = List.of();

  @Override
  public void assessed(Assessment assessment) {
    for (Event event : assessment.events()) {
      if (!event.open()) {
        add(new JournalEntry(event.time(), event.vessel(), event.kind().word(), event.why()));
      }
    }
  }

  void changed(Transition transition) {
    Alarm alarm = transition.alarm();
    String remark = transition.remark().isEmpty() ? "" : " (" + transition.remark() + ")";
    String text =
        alarm.kind().word() + " " + transition.change().word() + remark + ": " + alarm.text();
    add(new JournalEntry(transition.at(), alarm.vessel(), "alarm", text));
  }

  synchronized void add(JournalEntry entry) {
    entries.addLast(entry);
    if (entries.size() > KEPT) {
      entries.removeFirst();
    }
    shown = null;
  }

  /** Oldest first; the same list as long as nothing was added. */
  synchronized List<JournalEntry> shown() {
    if (shown == null) {
      shown = List.copyOf(entries);
    }
    return shown;
  }

  synchronized void forgetAfter(Instant time) {
    entries.removeIf(entry -> entry.time().isAfter(time));
    shown = null;
  }
}

package tunwarden.journal;

import java.util.Map;
import java.util.TreeMap;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.Transition;
import tunwarden.estimate.Event;
import tunwarden.reading.Mark;

/** Journal entries for what can happen. */
public final class Entries {
  private static final double PA_PER_BAR = 1e5;

  private Entries() {}

  /** An alarm transition, complete enough to tell its story without the alarm book. */
  public static JournalEntry of(Transition transition) {
    Alarm alarm = transition.alarm();
    Map<String, Object> values = new TreeMap<>();
    values.put("alarm", alarm.kind().id());
    values.put("priority", alarm.priority().word());
    values.put("change", transition.change().word());
    values.put("from", transition.from().word());
    values.put("state", alarm.state().word());
    values.put("since", alarm.since().toString());
    alarm.shelvedUntil().ifPresent(until -> values.put("shelved_until", until.toString()));
    if (!transition.remark().isEmpty()) {
      values.put("remark", transition.remark());
    }
    String text = alarm.kind().word() + " " + transition.change().word() + ": " + alarm.text();
    return new JournalEntry(
        transition.at(), alarm.vessel(), JournalEntry.ALARM, text.strip(), values);
  }

  /** An event found in the readings; it is told when it begins and when it has ended. */
  public static JournalEntry of(Event event) {
    Map<String, Object> values = new TreeMap<>();
    values.put("open", event.open());
    values.put("began", event.time().toString());
    values.put("until", event.until().toString());
    values.put("from_bar_g", event.fromPaGauge() / PA_PER_BAR);
    values.put("to_bar_g", event.toPaGauge() / PA_PER_BAR);
    values.put("gas_g", event.gasKg() * 1000);
    values.put("confidence", event.confidence());
    return new JournalEntry(
        event.until(), event.vessel(), event.kind().word(), event.why(), values);
  }

  /** A remark from a log or an instrument. */
  public static JournalEntry of(Mark mark) {
    return new JournalEntry(mark.time(), mark.vessel(), "mark", mark.text(), Map.of());
  }
}

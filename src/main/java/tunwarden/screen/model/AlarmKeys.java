package tunwarden.screen.model;

import java.util.Optional;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmState;
import tunwarden.alarm.Priority;

/** Acknowledging and shelving. */
final class AlarmKeys {
  private AlarmKeys() {}

  /** The alarm meant: the chosen one in the journal, elsewhere the one on the strip. */
  private static Optional<Alarm> meant(Model model) {
    if (model.page() == Page.JOURNAL) {
      JournalRows rows = JournalRows.of(model.board(), model.journal().filter());
      Optional<Alarm> chosen = rows.alarm(model.journal().row());
      if (chosen.isPresent()) {
        return chosen;
      }
    }
    return AlarmList.worstUnacknowledged(model.board());
  }

  /** Acknowledges; a high alarm asks for a word first. */
  static Optional<Turn> acknowledge(Model model) {
    Optional<Alarm> meant = meant(model).filter(alarm -> alarm.state().wantsAcknowledging());
    if (meant.isEmpty()) {
      return Optional.of(Turn.to(model.withSaid("No alarm waits to be acknowledged.")));
    }
    Alarm alarm = meant.get();
    if (alarm.priority() == Priority.HIGH) {
      Prompt prompt =
          Prompt.about(alarm, Prompt.Purpose.ACKNOWLEDGE, name(alarm) + ": what is done");
      return Optional.of(Turn.to(model.edit().ask(prompt).done()));
    }
    return Optional.of(Turn.asking(model, desk -> desk.acknowledge(alarm, "")));
  }

  /** Shelves the alarm meant, or brings a shelved one back. */
  static Optional<Turn> shelve(Model model) {
    Optional<Alarm> meant = meant(model);
    if (meant.isEmpty()) {
      return Optional.of(
          Turn.to(model.withSaid("No alarm to shelve; choose one on the journal page.")));
    }
    Alarm alarm = meant.get();
    if (alarm.state() == AlarmState.SHELVED) {
      return Optional.of(Turn.asking(model, desk -> desk.unshelve(alarm)));
    }
    Prompt prompt =
        Prompt.about(alarm, Prompt.Purpose.SHELVE_REASON, "Shelve " + name(alarm) + ": reason");
    return Optional.of(Turn.to(model.edit().ask(prompt).done()));
  }

  static String name(Alarm alarm) {
    return (alarm.vessel().isEmpty() ? "station" : alarm.vessel()) + " " + alarm.kind().word();
  }
}

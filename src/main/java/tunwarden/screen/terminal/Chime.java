package tunwarden.screen.terminal;

import java.util.HashSet;
import java.util.Set;
import java.util.stream.Collectors;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.Priority;
import tunwarden.screen.model.AlarmList;
import tunwarden.screen.model.Board;

/** Decides when the bell is due: once for each alarm of warning or high priority. */
final class Chime {
  private Set<String> known = new HashSet<>();

  /** Whether an alarm is on this board that was not on the one before. */
  boolean isDue(Board board) {
    Set<String> now =
        AlarmList.of(board).stream()
            .filter(a -> a.state().wantsAcknowledging())
            .filter(a -> a.priority().compareTo(Priority.WARNING) >= 0)
            .map(Chime::name)
            .collect(Collectors.toSet());
    boolean due = !known.containsAll(now);
    known = now;
    return due;
  }

  private static String name(Alarm alarm) {
    return alarm.vessel() + "/" + alarm.kind() + "/" + alarm.since();
  }
}

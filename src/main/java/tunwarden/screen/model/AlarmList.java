package tunwarden.screen.model;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import tunwarden.alarm.Alarm;
import tunwarden.alarm.AlarmState;

/** The alarms of a board in the order in which a person should see to them. */
public final class AlarmList {
  private static final Comparator<Alarm> WORST_FIRST =
      Comparator.comparing((Alarm alarm) -> rank(alarm.state()))
          .thenComparing(Alarm::priority, Comparator.reverseOrder())
          .thenComparing(Alarm::since, Comparator.reverseOrder())
          .thenComparing(Alarm::vessel);

  private AlarmList() {}

  /** All alarms, those wanting acknowledgement first, worst first among them. */
  public static List<Alarm> of(Board board) {
    return Stream.concat(
            board.stationAlarms().stream(),
            board.vessels().stream().flatMap(vessel -> vessel.alarms().stream()))
        .filter(alarm -> alarm.state() != AlarmState.NORMAL)
        .sorted(WORST_FIRST)
        .toList();
  }

  /** The worst alarm nobody has acknowledged, if any. */
  public static Optional<Alarm> worstUnacknowledged(Board board) {
    return of(board).stream().filter(alarm -> alarm.state().wantsAcknowledging()).findFirst();
  }

  /** The worst alarm of one vessel that is not put aside, if any. */
  public static Optional<Alarm> worstOf(VesselBoard vessel) {
    return vessel.alarms().stream()
        .filter(alarm -> rank(alarm.state()) <= rank(AlarmState.ACKNOWLEDGED))
        .max(Comparator.comparing(Alarm::priority));
  }

  private static int rank(AlarmState state) {
    return switch (state) {
      case UNACKNOWLEDGED -> 0;
      case RETURNED_UNACKNOWLEDGED -> 1;
      case ACKNOWLEDGED -> 2;
      case SHELVED -> 3;
      case SUPPRESSED, OUT_OF_SERVICE, NORMAL -> 4;
    };
  }
}

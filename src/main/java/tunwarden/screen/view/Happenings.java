package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.List;
import tunwarden.estimate.Event;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.JournalEntry;
import tunwarden.screen.model.ReplayStatus.TimeMark;
import tunwarden.screen.model.VesselBoard;
import tunwarden.units.Display;

/** What happened to a vessel, for the ticks under a chart and on the time bar. */
final class Happenings {
  private Happenings() {}

  /** What goes on with a vessel at this moment: {@code leak since 09:14, from 0.62 bar g}. */
  static List<String> goingOn(VesselBoard vessel, Board board, Display units) {
    return vessel.goingOn().stream().map(event -> words(event, board, units)).toList();
  }

  private static String words(Event event, Board board, Display units) {
    String what = event.kind().word().replace('-', ' ');
    String since = what + " since " + Words.when(event.time(), board);
    return since + ", from " + units.gauge(event.fromPaGauge());
  }

  /** Events of a vessel from the replay and from the journal, in no order. */
  static List<TimeMark> of(Board board, String vessel) {
    List<TimeMark> all = new ArrayList<>();
    board
        .replay()
        .ifPresent(
            replay ->
                replay.events().stream().filter(e -> e.vessel().equals(vessel)).forEach(all::add));
    for (JournalEntry entry : board.journal()) {
      if (entry.vessel().equals(vessel)) {
        all.add(new TimeMark(entry.time(), vessel, entry.kind()));
      }
    }
    return all;
  }
}

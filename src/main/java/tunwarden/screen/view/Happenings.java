package tunwarden.screen.view;

import java.util.ArrayList;
import java.util.List;
import tunwarden.screen.model.Board;
import tunwarden.screen.model.JournalEntry;
import tunwarden.screen.model.ReplayStatus.TimeMark;

/** What happened to a vessel, for the ticks under a chart and on the time bar. */
final class Happenings {
  private Happenings() {}

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

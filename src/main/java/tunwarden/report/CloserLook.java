package tunwarden.report;

import java.io.IOException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.replay.LogRow;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.EventWindow;

/** The readings around the gravest events, for the plots of a page. */
final class CloserLook {
  private static final int WINDOWS = 8;

  /** Kinds worth a closer look, the gravest first. */
  private static final List<EventKind> CLOSER =
      List.of(
          EventKind.OVER_RELIEF,
          EventKind.LIFT,
          EventKind.VENT,
          EventKind.CHARGE,
          EventKind.LEAK,
          EventKind.FROZEN,
          EventKind.SPIKE,
          EventKind.GAP);

  private CloserLook() {}

  /** A second pass over the logs; it ends with the last window. */
  static List<EventWindow> at(Reporter.Source source, Analysis analysis) throws IOException {
    List<Event> chosen =
        analysis.events().stream()
            .filter(event -> CLOSER.contains(event.kind()))
            .sorted(
                Comparator.comparingInt((Event e) -> CLOSER.indexOf(e.kind()))
                    .thenComparing(Event::time))
            .toList();
    List<EventWindow> windows = new ArrayList<>();
    for (Event event : spread(chosen)) {
      windows.add(new EventWindow(event));
    }
    if (windows.isEmpty()) {
      return windows;
    }
    try (VesselRows rows = new VesselRows(source.logs(), source.vessel().id(), false)) {
      Instant until = windows.stream().map(EventWindow::until).max(Instant::compareTo).get();
      LogRow row = rows.next();
      for (; row != null && !row.time().isAfter(until); row = rows.next()) {
        for (EventWindow window : windows) {
          window.take(row);
        }
      }
    }
    return windows;
  }

  /** At most two of each kind, the first and the last, and no more than fit a page or two. */
  private static List<Event> spread(List<Event> events) {
    List<Event> spread = new ArrayList<>();
    for (EventKind kind : CLOSER) {
      List<Event> same = events.stream().filter(event -> event.kind() == kind).toList();
      if (!same.isEmpty()) {
        spread.add(same.get(0));
      }
      if (same.size() > 1) {
        spread.add(same.get(same.size() - 1));
      }
    }
    List<Event> few = new ArrayList<>(spread.subList(0, Math.min(WINDOWS, spread.size())));
    few.sort(Comparator.comparing(Event::time));
    return few;
  }
}

package tunwarden.report;

import java.io.IOException;
import java.time.Instant;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import tunwarden.estimate.Event;
import tunwarden.replay.LogWriter;
import tunwarden.replay.text.Decimals;
import tunwarden.report.analysis.ReportRow;
import tunwarden.units.Unit;

/** Writes the course of everything as CSV, one line per row it is given. */
final class SeriesWriter {
  /** The line of names. */
  static final String HEADER =
      "time,pressure_bar_g,temperature_c,dissolved_g_per_l,dissolved_u95_g_per_l,"
          + "equilibrium_g_per_l,settled,relief_margin_bar,quality,event";

  private final Appendable out;
  private final ArrayDeque<Event> ahead = new ArrayDeque<>();
  private final List<Event> present = new ArrayList<>();
  private final StringBuilder line = new StringBuilder();

  /** A writer for one vessel. */
  SeriesWriter(Appendable out, List<Event> events) throws IOException {
    this.out = out;
    events.stream().sorted(Comparator.comparing(Event::time)).forEach(ahead::add);
    out.append(HEADER).append('\n');
  }

  void write(ReportRow row) throws IOException {
    follow(row.time());
    line.setLength(0);
    line.append(LogWriter.timeText(row.time()));
    cell(Unit.BAR.fromSi(row.paGauge()), 5);
    cell(Unit.CELSIUS.fromSi(row.temperatureK()), 3);
    cell(row.dissolvedKgPerM3(), 4);
    cell(row.u95KgPerM3(), 4);
    cell(row.equilibriumKgPerM3(), 4);
    cell(row.settled(), 3);
    cell(Unit.BAR.fromSi(row.marginPa()), 5);
    line.append(',').append(word(row)).append(',');
    for (int i = 0; i < present.size(); i++) {
      line.append(i == 0 ? "" : " ").append(present.get(i).kind().word());
    }
    out.append(line.append('\n'));
    present.removeIf(event -> !event.until().isAfter(row.time()));
  }

  /** Brings in what has begun; what ended between two lines stays for one, so that it is seen. */
  private void follow(Instant now) {
    while (!ahead.isEmpty() && !ahead.peek().time().isAfter(now)) {
      present.add(ahead.poll());
    }
  }

  private static String word(ReportRow row) {
    return row.quality().name().toLowerCase(Locale.ROOT).replace('_', '-');
  }

  private void cell(double value, int decimals) {
    line.append(',');
    if (Double.isFinite(value)) {
      Decimals.append(line, value, decimals);
    }
  }
}

package tunwarden.app;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import tunwarden.estimate.EventKind;
import tunwarden.replay.LogWriter;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.Extremes;
import tunwarden.units.Unit;

/**
 * One vessel's line in the table of a fleet.
 *
 * @param name what it is called
 * @param analysis what its logs say; nothing where they could not be used
 * @param failure why not, in a sentence; empty where they could
 */
record FleetLine(String name, Optional<Analysis> analysis, String failure) {
  /** The least margin first, then vessels without a relief setting, then what failed. */
  static final Comparator<FleetLine> WORST_FIRST =
      Comparator.comparing((FleetLine line) -> line.analysis().isEmpty())
          .thenComparingDouble(FleetLine::marginBar)
          .thenComparing(FleetLine::name);

  static FleetLine of(String name, Analysis analysis) {
    return new FleetLine(name, Optional.of(analysis), "");
  }

  static FleetLine failed(String name, String why) {
    return new FleetLine(name, Optional.empty(), why);
  }

  /** Least relief margin, bar; NaN, which is sorted last, without a relief setting. */
  private double marginBar() {
    return analysis
        .map(Analysis::extremes)
        .map(Extremes::closest)
        .map(row -> Unit.BAR.fromSi(row.marginPa()))
        .orElse(Double.NaN);
  }

  /** The table, ready to print. */
  static String table(List<FleetLine> lines) {
    int wide = Math.max(6, lines.stream().mapToInt(line -> line.name().length()).max().orElse(0));
    StringBuilder text = new StringBuilder();
    text.append(
        String.format(
            Locale.ROOT,
            "%-" + wide + "s  %10s  %-20s  %10s  %5s  %5s  %9s  %12s%n",
            "vessel",
            "margin bar",
            "at",
            "peak bar g",
            "lifts",
            "vents",
            "gas out g",
            "rows"));
    for (FleetLine line : lines.stream().sorted(WORST_FIRST).toList()) {
      text.append(line.text(wide)).append(System.lineSeparator());
    }
    return text.toString();
  }

  private String text(int wide) {
    String head = String.format(Locale.ROOT, "%-" + wide + "s  ", name);
    return head + analysis.map(FleetLine::figures).orElseGet(() -> "! " + failure);
  }

  private static String figures(Analysis analysis) {
    Extremes extremes = analysis.extremes();
    boolean known = extremes.closest() != null;
    return String.format(
        Locale.ROOT,
        "%10s  %-20s  %10.2f  %5d  %5d  %9.0f  %,12d",
        known
            ? String.format(Locale.ROOT, "%.2f", Unit.BAR.fromSi(extremes.closest().marginPa()))
            : "-",
        LogWriter.timeText(known ? extremes.closest().time() : extremes.peak().time()),
        Unit.BAR.fromSi(extremes.peak().paGauge()),
        analysis.events(EventKind.LIFT).size(),
        analysis.events(EventKind.VENT).size(),
        1000 * analysis.gasLostKg(),
        analysis.rows());
  }
}

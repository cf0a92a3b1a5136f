package tunwarden.report;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeMap;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.report.analysis.Analyst;

/** Events over many days: found within 90 s of the truth, by kind, with the gas they moved. */
final class DayScore {
  private static final double CLOSE_S = 90;

  /** What shows only after a while: when it began is not known to a minute. Told apart. */
  private static final Set<String> SLOW = Set.of("leak", "drift", "unexplained", "over-relief");

  /** True positives, false alarms and misses of one kind. */
  private static final class Tally {
    int hits;
    int alarms;
    int misses;
    final List<Double> gasErrors = new ArrayList<>();
    final List<String> faults = new ArrayList<>();

    double f1() {
      return hits + alarms + misses == 0 ? 1 : 2.0 * hits / (2.0 * hits + alarms + misses);
    }

    double gas() {
      double[] sorted = gasErrors.stream().mapToDouble(e -> e).sorted().toArray();
      return sorted.length == 0 ? Double.NaN : sorted[sorted.length / 2];
    }
  }

  private final TreeMap<String, Tally> tallies = new TreeMap<>();

  void add(Day day) {
    Analyst analyst = new Analyst(day.vessel(), Estimators.standard());
    day.rows().forEach(analyst::take);
    List<Event> events = new ArrayList<>(analyst.finish().events());
    events.removeIf(e -> e.kind() == EventKind.MARK);
    for (Day.Truth truth : day.truth()) {
      match(day, truth, events);
    }
    for (Event event : events) {
      Tally tally = tally(event.kind().word());
      tally.alarms++;
      tally.faults.add(
          String.format(
              Locale.ROOT,
              "%s invented %s at %.0f until %.0f from %.0f to %.0f",
              day.about(),
              event.kind(),
              seconds(event.time()),
              seconds(event.until()),
              event.fromPaGauge(),
              event.toPaGauge()));
    }
  }

  private void match(Day day, Day.Truth truth, List<Event> events) {
    Tally tally = tally(truth.kind());
    Event match = null;
    double apart = CLOSE_S;
    for (Event event : events) {
      double off = Math.abs(seconds(event.time()) - truth.from());
      if (event.kind().word().equals(truth.kind()) && off <= apart) {
        match = event;
        apart = off;
      }
    }
    if (match == null) {
      tally.misses++;
      tally.faults.add(day.about() + " missed " + truth);
      return;
    }
    tally.hits++;
    events.remove(match);
    if (Math.abs(truth.gasKg()) > 1e-6) {
      tally.gasErrors.add(Math.abs(match.gasKg() - truth.gasKg()) / Math.abs(truth.gasKg()));
    }
  }

  private static double seconds(java.time.Instant time) {
    return Duration.between(IncidentDay.START, time).toMillis() / 1000.0;
  }

  private Tally tally(String kind) {
    return tallies.computeIfAbsent(kind, k -> new Tally());
  }

  private Tally all() {
    Tally all = new Tally();
    tallies.forEach(
        (kind, t) -> {
          if (!SLOW.contains(kind)) {
            all.hits += t.hits;
            all.alarms += t.alarms;
            all.misses += t.misses;
            all.gasErrors.addAll(kind.equals("charge") ? List.of() : t.gasErrors);
          }
        });
    return all;
  }

  /** Over all kinds but those whose begin cannot be known to a minute. */
  double f1() {
    return all().f1();
  }

  /** Median relative error of vented and lifted gas. */
  double medianGasError() {
    return all().gas();
  }

  /** The table of the pages on reports, a row for each kind. */
  String table() {
    StringBuilder text = new StringBuilder("| kind | happened | found | invented | F1 | gas |\n");
    text.append("| --- | --- | --- | --- | --- | --- |\n");
    tallies.forEach((kind, t) -> text.append(row(kind, t)));
    return text.append(row("all but leak, drift, unexplained, over-relief", all())).toString();
  }

  private static String row(String kind, Tally t) {
    String gas = t.gasErrors.isEmpty() ? "" : String.format(Locale.ROOT, "%.1f %%", 100 * t.gas());
    return String.format(
        Locale.ROOT,
        "| %s | %d | %d | %d | %.3f | %s |%n",
        kind,
        t.hits + t.misses,
        t.hits,
        t.alarms,
        t.f1(),
        gas);
  }

  /** What went wrong, some of each kind. */
  String faults(int most) {
    StringBuilder text = new StringBuilder();
    tallies.forEach(
        (kind, t) -> t.faults.stream().limit(most).forEach(f -> text.append("  " + f + "\n")));
    return text.toString();
  }
}

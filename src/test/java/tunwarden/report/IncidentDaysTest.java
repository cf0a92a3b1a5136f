package tunwarden.report;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.report.analysis.Analyst;

/**
 * Events over many drawn days: found within 90 s of the truth, by kind, with the gas they moved.
 */
class IncidentDaysTest {
  private static final double CLOSE_S = 90;

  /** True positives, false alarms and misses of one kind. */
  private static final class Tally {
    int hits;
    int alarms;
    int misses;
    final List<String> faults = new ArrayList<>();
  }

  private final TreeMap<String, Tally> tallies = new TreeMap<>();
  private final List<Double> gasErrors = new ArrayList<>();

  @Test
  void eventsAreFoundOnAFewDays() {
    judge(4);
  }

  @Test
  @Tag("long")
  void eventsAreFoundOnManyDays() {
    judge(60);
  }

  private void judge(int days) {
    for (long seed = 1; seed <= days; seed++) {
      day(seed);
    }
    Tally all = new Tally();
    tallies
        .values()
        .forEach(
            t -> {
              all.hits += t.hits;
              all.alarms += t.alarms;
              all.misses += t.misses;
            });
    double[] errors = gasErrors.stream().mapToDouble(e -> e).sorted().toArray();
    double median = errors[errors.length / 2];
    assertTrue(f1(all) >= 0.95, report());
    assertTrue(median <= 0.15, "median error of the gas " + median);
  }

  private void day(long seed) {
    IncidentDay day = new IncidentDay(seed).run();
    Analyst analyst = new Analyst(day.described(), Estimators.standard());
    day.rows().forEach(analyst::take);
    List<Event> events = new ArrayList<>(analyst.finish().events());
    events.removeIf(e -> e.kind() == EventKind.MARK);
    for (IncidentDay.Truth truth : day.truth()) {
      Tally tally = tallies.computeIfAbsent(truth.kind(), k -> new Tally());
      Event match = null;
      for (Event event : events) {
        double apart =
            Duration.between(IncidentDay.START, event.time()).toMillis() / 1000.0 - truth.from();
        if (match == null
            && event.kind().word().equals(truth.kind())
            && Math.abs(apart) <= CLOSE_S) {
          match = event;
        }
      }
      if (match == null) {
        tally.misses++;
        tally.faults.add("day " + seed + " (rows every " + day.interval() + " s) missed " + truth);
      } else {
        tally.hits++;
        events.remove(match);
        if (Math.abs(truth.gasKg()) > 1e-6) {
          gasErrors.add(Math.abs(match.gasKg() - truth.gasKg()) / Math.abs(truth.gasKg()));
        }
      }
    }
    for (Event event : events) {
      Tally tally = tallies.computeIfAbsent(event.kind().word(), k -> new Tally());
      tally.alarms++;
      tally.faults.add(
          "day "
              + seed
              + " (rows every "
              + day.interval()
              + " s) invented "
              + event.kind()
              + " at "
              + Duration.between(IncidentDay.START, event.time()).toSeconds()
              + " until "
              + Duration.between(IncidentDay.START, event.until()).toSeconds()
              + " from "
              + event.fromPaGauge()
              + " to "
              + event.toPaGauge());
    }
  }

  private static double f1(Tally tally) {
    return 2.0 * tally.hits / (2.0 * tally.hits + tally.alarms + tally.misses);
  }

  private String report() {
    StringBuilder text = new StringBuilder();
    tallies.forEach(
        (kind, t) ->
            text.append(
                String.format(
                    java.util.Locale.ROOT,
                    "%n%-16s F1 %.3f hits %d alarms %d misses %d",
                    kind,
                    f1(t),
                    t.hits,
                    t.alarms,
                    t.misses)));
    tallies.forEach(
        (kind, t) -> t.faults.stream().limit(12).forEach(f -> text.append("\n  ").append(f)));
    double[] errors = gasErrors.stream().mapToDouble(e -> e).sorted().toArray();
    text.append("\nmedian gas error ")
        .append(errors.length == 0 ? "none" : errors[errors.length / 2]);
    return text.toString();
  }
}

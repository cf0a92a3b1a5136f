package tunwarden.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.rehearse.Rehearsal;
import tunwarden.rehearse.RehearsalLog;
import tunwarden.rehearse.Scenario;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogOptions;
import tunwarden.report.otherwise.WhatIf;
import tunwarden.report.story.Chapter;

/** Reports on the logs that ship with the program, against what the rehearsal knows. */
class ReporterTest {
  private static final Path COOLING_LOST = Path.of("replay-logs/cooling-lost.csv");
  private static final Path SEALED_TOO_EARLY = Path.of("replay-logs/sealed-too-early.csv");

  private static Chapter read(Path log, Scenario scenario, Optional<WhatIf> whatIf, Appendable out)
      throws IOException {
    Reporter.Settings settings =
        new Reporter.Settings(
            false,
            Duration.ofMinutes(1),
            whatIf,
            Optional.empty(),
            "the command",
            "the program",
            true);
    Rehearsal rehearsal = Rehearsal.logged(scenario, 1, RehearsalLog.START);
    Reporter.Source source =
        new Reporter.Source(
            "a tank", rehearsal.vessel(), List.of(LogFile.open(log, LogOptions.NONE)));
    return new Reporter(Estimators.standard(), settings)
        .read(source, Optional.ofNullable(out), rows -> {});
  }

  @Test
  void lostCoolingIsToldWithItsBeginningItsLiftsAndItsGas() throws IOException {
    Chapter chapter = read(COOLING_LOST, Scenario.COOLING_LOST, Optional.empty(), null);
    Event warming =
        chapter.analysis().events().stream()
            .filter(e -> e.kind() == EventKind.WARMING || e.kind() == EventKind.COOLING_FAILURE)
            .findFirst()
            .orElseThrow();
    Instant tripped = Instant.parse("2026-03-02T07:30:00Z");
    assertTrue(Duration.between(warming.time(), tripped).abs().toSeconds() <= 90);
    Rehearsal truth = Rehearsal.logged(Scenario.COOLING_LOST, 1, RehearsalLog.START);
    while (truth.next() != null) {
      assertTrue(truth.truth().paGauge() < 1.5e5);
    }
    double lostKg = truth.truth().lostKg();
    assertEquals(lostKg, chapter.analysis().gasLostKg(), 0.15 * lostKg);
    String summary = String.join(" ", chapter.story().summary());
    assertTrue(summary.contains("relief valve almost certainly lifted"), summary);
    assertTrue(summary.contains("vessel limit of 2.00 bar g was not passed"), summary);
  }

  @Test
  void aFermenterClosedTooEarlyIsNotTakenForWarming() throws IOException {
    Chapter chapter = read(SEALED_TOO_EARLY, Scenario.SEALED_TOO_EARLY, Optional.empty(), null);
    assertFalse(chapter.analysis().events(EventKind.LIFT).isEmpty());
    assertTrue(chapter.analysis().events(EventKind.WARMING).isEmpty());
    assertEquals(
        List.of("unlikely"),
        chapter.story().hypotheses().stream()
            .filter(h -> h.cause().startsWith("warming"))
            .map(h -> h.standing())
            .toList());
  }

  @Test
  void theSameLogGivesTheSameBytes() throws IOException {
    StringBuilder firstSeries = new StringBuilder();
    StringBuilder secondSeries = new StringBuilder();
    List<Chapter> first =
        List.of(read(COOLING_LOST, Scenario.COOLING_LOST, Optional.empty(), firstSeries));
    List<Chapter> second =
        List.of(read(COOLING_LOST, Scenario.COOLING_LOST, Optional.empty(), secondSeries));
    assertEquals(Reporter.json(first), Reporter.json(second));
    assertEquals(Reporter.html(first), Reporter.html(second));
    assertEquals(firstSeries.toString(), secondSeries.toString());
    assertEquals(1 + 24 * 60 + 1, firstSeries.toString().lines().count());
  }

  @Test
  void thePageNeedsNothingFromElsewhere() throws IOException {
    String html =
        Reporter.html(List.of(read(COOLING_LOST, Scenario.COOLING_LOST, Optional.empty(), null)));
    for (String reference :
        List.of("http:", "https:", "src=", "href=", "url(", "<script", "@import")) {
      assertFalse(html.contains(reference), reference);
    }
    for (String part :
        List.of(
            "Timeline",
            "Dissolved gas",
            "What may have driven it",
            "Instruments",
            "Assumed, and not known",
            "How to make this again",
            "SHA-256",
            "Before acting")) {
      assertTrue(html.contains(part), part);
    }
  }

  @Test
  void anotherReliefSettingWouldHaveLiftedEarlier() throws IOException {
    WhatIf whatIf = WhatIf.parse("relief=1.2bar", 101_325);
    Chapter chapter = read(COOLING_LOST, Scenario.COOLING_LOST, Optional.of(whatIf), null);
    var course = chapter.otherwise().orElseThrow();
    double peak = course.points().values().stream().mapToDouble(p -> p).max().orElseThrow();
    assertTrue(peak < 1.21e5 && peak > 1.1e5, "peak " + peak);
    assertTrue(String.join(" ", course.sentences()).contains("lifted"));
    assertTrue(Reporter.html(List.of(chapter)).contains("What if: relief=1.2bar"));
  }

  @Test
  void twoLogsStandSideBySide() throws IOException {
    List<Chapter> both =
        List.of(
            read(COOLING_LOST, Scenario.COOLING_LOST, Optional.empty(), null),
            read(SEALED_TOO_EARLY, Scenario.SEALED_TOO_EARLY, Optional.empty(), null));
    assertTrue(Reporter.html(both).contains("Side by side"));
    assertTrue(Reporter.json(both).contains("\"compared\""));
  }
}

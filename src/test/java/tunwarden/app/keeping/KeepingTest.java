package tunwarden.app.keeping;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.alarm.AlarmKind;
import tunwarden.app.board.Assembly;
import tunwarden.config.Cellar;
import tunwarden.config.CellarFile;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Estimators;
import tunwarden.journal.Recorder;
import tunwarden.journal.disk.RealDisk;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.station.AlarmKeeper;
import tunwarden.station.Station;
import tunwarden.station.StationSettings;

/** What a restart finds again, and what it says about it. */
class KeepingTest {
  private static final Instant BEGIN = Instant.parse("2026-03-02T06:00:00Z");
  private static final String CELLAR =
      """
      [vessel.FV2]
      volume = "2000 L"
      fill = "1800 L"
      liquid = { kind = "beer" }
      limits = { relief = "1.5 bar" }
      [vessel.FV2.readings]
      pressure = { device = "text-line", port = "/dev/none", field = "P" }
      temperature = { device = "text-line", port = "/dev/none", field = "T" }
      [recording]
      resume-within = "2 h"
      """;

  @TempDir private Path folder;
  private Path file;
  private Path data;
  private Instant now = BEGIN;

  @BeforeEach
  void describe() throws IOException {
    file = folder.resolve("cellar.toml");
    data = folder.resolve("data");
    Files.writeString(file, CELLAR);
  }

  /** One life of the program. */
  private final class Life implements AutoCloseable {
    private final List<String> said = new ArrayList<>();
    private final Recorder recorder;
    private final Keeping keeping;
    private final AlarmKeeper alarms;
    private final Station station;

    Life() throws IOException {
      Cellar cellar = CellarFile.read(file);
      recorder = Recorder.open(data, new RealDisk(), cellar.recording(), () -> now);
      keeping = new Keeping(recorder, new RealDisk(), () -> now, said::add);
      alarms = new AlarmKeeper(keeping.book(cellar), List.of(keeping));
      station = over(cellar);
      keeping.resume(cellar, station, alarms);
      recorder.start();
    }

    Station over(Cellar cellar) {
      return new Station(
          cellar.vessels(),
          Estimators.standard(),
          Assembly.FORECASTS,
          StationSettings.USUAL,
          List.of(alarms, recorder, keeping));
    }

    /** Readings every ten seconds, rising. */
    void watch(int count) {
      for (int i = 0; i < count; i++) {
        now = now.plusSeconds(10);
        double rise = Duration.between(BEGIN, now).toSeconds() * 0.05;
        station.accept(Reading.good(now, "FV2", Quantity.TEMPERATURE, 278.15));
        station.accept(Reading.good(now, "FV2", Quantity.PRESSURE, 0.9e5 + rise));
      }
    }

    Estimate estimate() {
      return station.checkpoint().states().get("FV2").estimate().orElseThrow();
    }

    String said() {
      return String.join("\n", said);
    }

    @Override
    public void close() throws IOException {
      recorder.close();
    }
  }

  /** Watches for a while and ends in good order. */
  private Estimate live() throws IOException {
    try (Life life = new Life()) {
      life.watch(60);
      life.keeping.keep();
      return life.estimate();
    }
  }

  @Test
  void theEstimateGoesOnDigitForDigit() throws IOException {
    Estimate before = live();
    now = now.plusSeconds(5);
    try (Life again = new Life()) {
      assertEquals(before, again.estimate());
      assertTrue(again.said().contains("FV2: the estimate goes on from its state of"), again::said);
      assertTrue(again.said().contains("with 0 row(s) recorded since"), again::said);
    }
    String journal = Files.readString(data.resolve("journal/2026-03.jsonl"));
    assertTrue(journal.contains("FV2: the estimate goes on from its state of"), journal);
  }

  @Test
  void whatWasRecordedAfterTheStateIsTakenInAfterACrash() throws IOException {
    live();
    Estimate last;
    try (Life crashing = new Life()) {
      crashing.watch(20);
      last = crashing.estimate();
      // Nothing is kept at its end, as after a kill.
    }
    try (Life again = new Life()) {
      assertTrue(again.said().contains("with 20 row(s) recorded since"), again::said);
      // The record is rounded to a pascal.
      assertEquals(last.dissolvedKgPerM3(), again.estimate().dissolvedKgPerM3(), 1e-3);
      assertEquals(last.at(), again.estimate().at());
    }
  }

  @Test
  void anOldStateIsLeftAlone() throws IOException {
    live();
    now = now.plus(Duration.ofHours(3));
    try (Life again = new Life()) {
      assertTrue(
          again.said().contains("starts afresh; its saved state is 3 h old, more than 2 h."),
          again::said);
      assertTrue(again.station.checkpoint().states().get("FV2").estimate().isEmpty());
    }
  }

  @Test
  void aStateOfTheFutureIsLeftAlone() throws IOException {
    live();
    now = now.minus(Duration.ofHours(1));
    try (Life again = new Life()) {
      assertTrue(again.said().contains("later than now"), again::said);
    }
  }

  @Test
  void aVesselDescribedOtherwiseStartsAfreshButNewLimitsAloneDoNot() throws IOException {
    Estimate before = live();
    Files.writeString(file, CELLAR.replace("1.5 bar", "1.8 bar"));
    try (Life again = new Life()) {
      assertEquals(before, again.estimate());
    }
    Files.writeString(file, CELLAR.replace("1800 L", "1700 L"));
    try (Life again = new Life()) {
      assertTrue(again.said().contains("starts afresh; its description has changed."), again::said);
    }
  }

  @Test
  void aChangedFileKeepsWhatIsKnownUnlessTheEstimateRestsOnTheChange() throws IOException {
    try (Life life = new Life()) {
      life.watch(60);
      Estimate before = life.estimate();
      Cellar old = CellarFile.read(file);
      Files.writeString(file, CELLAR.replace("1.5 bar", "1.8 bar"));
      Cellar limits = CellarFile.read(file);
      Station second = life.over(limits);
      life.keeping.goOver(old, life.station, limits, second);
      assertEquals(before, second.checkpoint().states().get("FV2").estimate().orElseThrow());
      assertFalse(life.said().contains("afresh; its description"), life::said);
      Files.writeString(file, CELLAR.replace("1800 L", "1700 L"));
      Cellar fill = CellarFile.read(file);
      Station third = life.over(fill);
      life.keeping.goOver(limits, second, fill, third);
      assertTrue(third.checkpoint().states().get("FV2").estimate().isEmpty());
      assertTrue(life.said().contains("afresh; its description has changed"), life::said);
    }
  }

  @Test
  void aStateThatCannotBeUnderstoodIsMadeAgainFromTheRecord() throws IOException {
    Estimate before = live();
    Path state = data.resolve("estimates.state");
    byte[] bytes = Files.readAllBytes(state);
    bytes[bytes.length / 2] ^= 1;
    Files.write(state, bytes);
    try (Life again = new Life()) {
      assertTrue(
          again
              .said()
              .contains(
                  "FV2: the kept state is damaged, so the estimate is made again from 60 recorded"
                      + " row(s)."),
          again::said);
      assertEquals(before.dissolvedKgPerM3(), again.estimate().dissolvedKgPerM3(), 0.02);
    }
    Files.writeString(state, "something else");
    try (Life again = new Life()) {
      assertTrue(again.said().contains("estimates.state is not of this version"), again::said);
      assertTrue(again.said().contains("made again from 60 recorded row(s)"), again::said);
    }
  }

  @Test
  void alarmsShelvesAndRemarksOutliveACrash() throws IOException {
    try (Life life = new Life()) {
      life.watch(3);
      Instant at = now;
      life.alarms.change(b -> b.shelve(AlarmKind.LEAK, "FV2", "known", at.plusSeconds(3600), at));
      life.alarms.change(b -> b.report(AlarmKind.DISK, true, "Full.", at));
      life.alarms.change(b -> b.acknowledge(AlarmKind.DISK, "", "ordered one", at));
    }
    try (Life again = new Life()) {
      assertEquals(2, again.alarms.book().alarms().size());
      assertTrue(
          again.alarms.book().alarms().stream().anyMatch(a -> a.remark().equals("ordered one")));
    }
  }
}

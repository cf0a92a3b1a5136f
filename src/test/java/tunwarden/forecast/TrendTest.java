package tunwarden.forecast;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Estimators;
import tunwarden.estimate.ForwardPoint;
import tunwarden.estimate.ForwardRun;
import tunwarden.estimate.State;
import tunwarden.forecast.whatif.Foresight;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.LogFile;
import tunwarden.replay.LogOptions;
import tunwarden.replay.LogReader;
import tunwarden.replay.LogRow;
import tunwarden.simulate.Row;
import tunwarden.simulate.Scenario;
import tunwarden.simulate.Simulation;
import tunwarden.vessel.Vessel;

class TrendTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");

  private static Trend straight(double from, double perHour, double band) {
    List<ForwardPoint> run = new ArrayList<>();
    for (int i = 0; i <= 96; i++) {
      double pa = from + perHour * i / 2;
      run.add(new ForwardPoint(Trend.STEP.multipliedBy(i), pa, pa - band, pa + band));
    }
    return new Trend(START, run);
  }

  @Test
  void aStraightRiseIsReachedWhereTheLinesCross() {
    TimeRange range = straight(1e5, 2_000, 3_000).until(1.2e5).orElseThrow();
    assertEquals(Duration.ofHours(10), range.middle());
    assertEquals(Duration.ofMinutes(8 * 60 + 30), range.low());
    assertEquals(Optional.of(Duration.ofMinutes(11 * 60 + 30)), range.high());
  }

  @Test
  void aBandThatReachesFurtherThanTheHorizonHasNoLatestTime() {
    TimeRange range = straight(1e5, 2_000, 20_000).until(1.8e5).orElseThrow();
    assertTrue(range.high().isEmpty());
    assertTrue(straight(1e5, 0, 3_000).until(1.8e5).isEmpty());
    assertEquals(Duration.ZERO, straight(1e5, 0, 3_000).until(1e5).orElseThrow().middle());
  }

  @Test
  void theOutlookOfAWatchedVesselCarriesTheEstimatorsOwnRun() {
    Simulation log = Scenario.SETTLED.run(3);
    State state = stateAt(log, 6 * 3600);
    Outlook outlook = Foresight.outlook(log.vessel(), state, Hindsight.NONE);
    List<ForwardPoint> run = ForwardRun.run(state, Trend.HORIZON, Trend.STEP);
    assertEquals(run.size(), outlook.trend().size());
    for (int i = 0; i < run.size(); i++) {
      assertEquals(run.get(i).paGauge(), outlook.trend().get(i).paGauge());
      assertEquals(run.get(i).highPaGauge(), outlook.trend().get(i).highPaGauge());
    }
  }

  @Test
  void nothingIsForecastBeforeAnythingIsBelieved() {
    Vessel vessel = Scenario.SETTLED.run(3).vessel();
    assertEquals(
        Outlook.NONE,
        Foresight.outlook(vessel, Estimators.standard().begin(vessel), Hindsight.NONE));
  }

  /**
   * The shipped day of cooling lost, two hours into the warming and nearly an hour before the
   * valve's earliest opening: with the ambient stated and without, the time it is reached in the
   * log lies between the earliest and the latest time forecast.
   */
  @ParameterizedTest
  @CsvSource({"09:30,297.15", "09:30,", "12:00,297.15", "12:00,"})
  void aWarmingVesselIsForecastToWarmOn(String asked, Double ambientK) throws IOException {
    double earliestLift = 1.4e5;
    Instant from = Instant.parse("2026-03-02T" + asked + ":00Z");
    Estimator estimator = Estimators.standard();
    State state = estimator.begin(warming(ambientK));
    State then = null;
    Instant reached = null;
    try (LogReader log =
        LogFile.open(Path.of("replay-logs/cooling-lost.csv"), LogOptions.NONE).open()) {
      for (LogRow row = log.next(); row != null && reached == null; row = log.next()) {
        if (then == null && !row.time().isBefore(from)) {
          then = state;
        }
        for (Sample sample : row.samples()) {
          boolean pressure =
              sample instanceof Reading reading && reading.quantity() == Quantity.PRESSURE;
          if (pressure && ((Reading) sample).value() >= earliestLift) {
            reached = row.time();
          }
          state = estimator.step(state, sample).next();
        }
      }
    }
    Trend trend = new Trend(from, ForwardRun.run(then, Trend.HORIZON, Trend.STEP));
    double truth = Duration.between(from, reached).toSeconds();
    double earliest = seconds(trend.soonest(earliestLift));
    double latest = seconds(trend.until(earliestLift).flatMap(TimeRange::high));
    assertTrue(earliest <= truth && truth <= latest, truth + ": " + earliest + " to " + latest);
    assertTrue(trend.until(earliestLift).isPresent(), "the likely path reaches the valve");
  }

  private static Vessel warming(Double ambientK) {
    Vessel plain = Vessel.plain("FV2", 2, 1.8, Liquid.of(LiquidKind.BEER));
    return new Vessel(
        plain.id(),
        "",
        2,
        1.8,
        plain.contents(),
        plain.closure(),
        plain.limits(),
        Optional.empty(),
        plain.site(),
        ambientK == null ? OptionalDouble.empty() : OptionalDouble.of(ambientK),
        plain.accuracy(),
        plain.prospects());
  }

  @Test
  void timeToLiftHoldsOnSealedFermenters() {
    liftsAsForecast(5);
  }

  @Test
  @Tag("long")
  void timeToLiftHoldsOnManySealedFermenters() {
    liftsAsForecast(100);
  }

  /** Half-way between sealing and lifting, the time to lift lies in its stated range. */
  private static void liftsAsForecast(int trials) {
    int held = 0;
    int tried = 0;
    StringBuilder missed = new StringBuilder();
    for (int seed = 0; seed < trials; seed++) {
      Simulation log = Scenario.FERMENTING.run(seed);
      double lift = log.vessel().limits().relief().orElseThrow().earliestLiftPaGauge();
      double reached = reached(log, lift);
      double asked = (log.judgedFrom() + reached) / 2;
      if (Double.isNaN(reached) || reached - log.judgedFrom() < 3600) {
        continue;
      }
      Trend trend = trendAt(log, asked);
      double truth = reached - asked;
      double earliest = seconds(trend.soonest(lift));
      double latest = seconds(trend.until(lift).flatMap(TimeRange::high));
      boolean inside = truth >= Math.min(earliest, Trend.HORIZON.toSeconds()) && truth <= latest;
      tried++;
      held += inside ? 1 : 0;
      missed.append(
          inside ? "" : " seed " + seed + ": " + truth + " s, said " + earliest + " to " + latest);
    }
    assertTrue(tried >= 0.4 * trials, "only " + tried + " of " + trials + " lifted");
    assertTrue(held >= 0.9 * tried, held + " of " + tried + missed);
  }

  private static double seconds(Optional<Duration> time) {
    return time.map(Duration::toSeconds).map(Long::doubleValue).orElse(Double.POSITIVE_INFINITY);
  }

  private static Trend trendAt(Simulation log, double asked) {
    RecentRise rise = RecentRise.NONE;
    for (Row row : log.rows()) {
      if (row.seconds() <= asked) {
        rise = rise.seen(START.plusMillis(Math.round(1000 * row.seconds())), row.paGauge());
      }
    }
    List<ForwardPoint> run = ForwardRun.run(stateAt(log, asked), Trend.HORIZON, Trend.STEP);
    double rising = rise.paPerS().orElse(0);
    boolean contradicted = Contradiction.isThere(run, rising);
    return new Trend(START, contradicted ? Contradiction.resolved(run, rising) : run);
  }

  private static double reached(Simulation log, double paGauge) {
    return log.rows().stream()
        .filter(row -> row.seconds() > log.judgedFrom() && row.paGauge() >= paGauge)
        .mapToDouble(Row::seconds)
        .findFirst()
        .orElse(Double.NaN);
  }

  private static State stateAt(Simulation log, double seconds) {
    Estimator estimator = Estimators.standard();
    State state = estimator.begin(log.vessel());
    for (Row row : log.rows()) {
      if (row.seconds() > seconds) {
        break;
      }
      Instant at = START.plusMillis(Math.round(1000 * row.seconds()));
      String id = log.vessel().id();
      state =
          estimator.step(state, Reading.good(at, id, Quantity.TEMPERATURE, row.kelvin())).next();
      state = estimator.step(state, Reading.good(at, id, Quantity.PRESSURE, row.paGauge())).next();
    }
    return state;
  }
}

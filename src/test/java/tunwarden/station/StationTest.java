package tunwarden.station;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Outcome;
import tunwarden.estimate.State;
import tunwarden.estimate.Step;
import tunwarden.forecast.Outlook;
import tunwarden.physics.liquid.Liquid;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.vessel.Vessel;

class StationTest {
  private static final Instant START = Instant.parse("2026-03-02T08:00:00Z");
  private static final Vessel KEG = Vessel.plain("K1", 0.05, 0.045, Liquid.WATER);

  private final List<Assessment> seen = new ArrayList<>();
  private final Sink keeper =
      new Sink() {
        @Override
        public void assessed(Assessment assessment) {
          seen.add(assessment);
        }
      };

  /** Counts steps and can be told to throw. */
  private static final class CountingEstimator implements Estimator {
    private record Count(int steps) implements State {
      @Override
      public Optional<tunwarden.estimate.Estimate> estimate() {
        return Optional.empty();
      }
    }

    private boolean failing;

    @Override
    public State begin(Vessel vessel) {
      return new Count(0);
    }

    @Override
    public Step step(State previous, Sample sample) {
      if (failing) {
        throw new ArithmeticException("injected");
      }
      State next = new Count(((Count) previous).steps() + 1);
      return new Step(Outcome.ACCEPTED, Quality.GOOD, "", next, List.of());
    }

    @Override
    public Step idle(State previous, Instant now) {
      return new Step(Outcome.AGED, Quality.GOOD, "", previous, List.of());
    }
  }

  private final CountingEstimator estimator = new CountingEstimator();

  private Station station(Sink... sinks) {
    return new Station(
        List.of(KEG),
        estimator,
        (vessel, state, rise) -> Outlook.NONE,
        StationSettings.USUAL,
        List.of(sinks));
  }

  private static Reading pressure(int second, double pa) {
    return Reading.good(START.plusSeconds(second), "K1", Quantity.PRESSURE, pa);
  }

  @Test
  void aPressureEndsTheRowAndGivesOneAssessment() {
    Station station = station(keeper);
    station.accept(Reading.good(START, "K1", Quantity.TEMPERATURE, 277.15));
    assertEquals(0, seen.size());
    station.accept(pressure(0, 1e5));
    assertEquals(1, seen.size());
    assertEquals(277.15, seen.get(0).temperature().value().getAsDouble());
    assertEquals(1e5, seen.get(0).pressure().value().getAsDouble());
  }

  @Test
  void silenceIsAssessedWithItsAgeAndTurnsStale() {
    Station station = station(keeper);
    station.accept(pressure(0, 1e5));
    station.tick(START.plusSeconds(10));
    station.tick(START.plusSeconds(31));
    Assessment fresh = seen.get(1);
    Assessment stale = seen.get(2);
    assertEquals(10, fresh.pressure().age().toSeconds());
    assertEquals(Quality.GOOD, fresh.pressure().quality());
    assertEquals(Quality.STALE, stale.pressure().quality());
    assertEquals(1e5, stale.pressure().value().getAsDouble());
    assertFalse(stale.pressure().isUsable());
  }

  @Test
  void aVesselJustAssessedIsNotAssessedAgainByTheTick() {
    Station station = station(keeper);
    station.accept(pressure(0, 1e5));
    station.tick(START.plusMillis(400));
    assertEquals(1, seen.size());
  }

  @Test
  void aFaultMarksTheLastValue() {
    Station station = station(keeper);
    station.accept(pressure(0, 1e5));
    station.accept(
        new Fault(START.plusSeconds(1), "K1", Quantity.PRESSURE, Quality.LOOP_FAULT, "3.5 mA"));
    assertEquals(Quality.LOOP_FAULT, seen.get(1).pressure().quality());
    assertFalse(seen.get(1).pressure().isUsable());
  }

  @Test
  void aThrowingModelLeavesTheStateAsItWas() {
    Station station = station(keeper);
    station.accept(pressure(0, 1e5));
    estimator.failing = true;
    station.accept(pressure(1, 1e5));
    estimator.failing = false;
    Station.Checkpoint afterFailure = station.checkpoint();
    station.accept(pressure(2, 1e5));
    station.restore(afterFailure);
    station.accept(pressure(2, 1e5));
    assertEquals(4, seen.size());
  }

  @Test
  void oneFailingSinkDoesNotSilenceTheNext() {
    Sink failing =
        new Sink() {
          @Override
          public void assessed(Assessment assessment) {
            throw new IllegalStateException("injected");
          }
        };
    station(failing, keeper).accept(pressure(0, 1e5));
    assertEquals(1, seen.size());
  }

  @Test
  void aStrangerIsNotFollowed() {
    Station station = station(keeper);
    station.accept(Reading.good(START, "nobody", Quantity.PRESSURE, 1e5));
    assertTrue(seen.isEmpty());
  }
}

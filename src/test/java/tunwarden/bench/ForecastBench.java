package tunwarden.bench;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import tunwarden.estimate.Mode;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.Hindsight;
import tunwarden.forecast.Outlook;
import tunwarden.forecast.Present;
import tunwarden.forecast.Uncertain;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.forecast.seal.Seal;
import tunwarden.forecast.seal.SealAnswer;
import tunwarden.forecast.seal.SealQuestion;
import tunwarden.forecast.vent.Vent;
import tunwarden.forecast.vent.VentAnswer;
import tunwarden.forecast.vent.VentQuestion;
import tunwarden.forecast.whatif.Foresight;
import tunwarden.physics.liquid.Liquid;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.units.Constants;
import tunwarden.vessel.Limits;
import tunwarden.vessel.Prospects;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Room;
import tunwarden.vessel.Vessel;

/**
 * Speed of the forecasts: everything for one vessel within 5 ms, so that it is live on the page.
 * How to run it stands in src/site/markdown/forecasts.md.
 */
@State(Scope.Thread)
@BenchmarkMode(org.openjdk.jmh.annotations.Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class ForecastBench {
  private static final double COLD_K = 4 + Constants.ZERO_CELSIUS_K;

  @Param({"0", "20000"})
  public double airPa;

  private Present present;
  private VentQuestion vent;
  private SealQuestion seal;

  /** A vessel of 2 m³ of which everything is told. */
  static Vessel described() {
    Vessel plain = Vessel.plain("FV2", 2, 1.8, Liquid.of(LiquidKind.BEER));
    return new Vessel(
        "FV2",
        "",
        2,
        1.8,
        plain.contents(),
        plain.closure(),
        new Limits(
            Optional.of(ReliefSetting.iso4126(1.5e5)),
            OptionalDouble.of(2e5),
            OptionalDouble.empty()),
        Optional.of(new ReliefOrifice(0.015, 0.6)),
        plain.site(),
        OptionalDouble.of(COLD_K + 20),
        plain.accuracy(),
        new Prospects(
            Optional.of(
                new Prospects.Ferment(
                    OptionalDouble.of(12), OptionalDouble.of(3.2), 2.8, OptionalDouble.empty())),
            Optional.of(new Prospects.Target(5, OptionalDouble.of(COLD_K))),
            Optional.of(
                new Prospects.Supply(
                    8e5, Optional.of(new ReliefOrifice(0.003, 0.6)), OptionalDouble.empty())),
            OptionalDouble.of(40 * 3600),
            OptionalDouble.of(12)));
  }

  static Hindsight hindsight() {
    return Hindsight.NONE.gravity(Instant.EPOCH.minusSeconds(7200), 3.1);
  }

  /** The vessel with a laboratory-like value of its gas. */
  @Setup
  public void fill() {
    Vessel vessel = described();
    present =
        new Present(
            vessel,
            Instant.EPOCH,
            0.9e5,
            COLD_K,
            COLD_K,
            Optional.of(new Uncertain(5.1, 0.3)),
            new Uncertain(airPa, airPa / 2),
            new Present.Activity(Mode.SEALED, Present.usualTransfer(1.8), 0));
    vent =
        new VentQuestion(
            0.2e5,
            Optional.of(new ReliefOrifice(0.015, 0.6)),
            Optional.of(new Room(180, 2.0 / 3600)),
            VentQuestion.USUAL_BOUND);
    seal =
        new SealQuestion(
            3.2, 2.8, OptionalDouble.of(12), FermentationRate.UNKNOWN, Optional.empty());
  }

  /** All that is worked out of a vessel, but for the estimator's forward run. */
  @Benchmark
  public Outlook outlook() {
    return Foresight.outlook(present, List.of(), hindsight());
  }

  /** One position of the vent bench. */
  @Benchmark
  public VentAnswer vent() {
    return Vent.of(Ensemble.of(present), vent);
  }

  /** Closing a fermenting vessel. */
  @Benchmark
  public SealAnswer seal() {
    return Seal.of(Ensemble.of(present), seal);
  }
}

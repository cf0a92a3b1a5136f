package tunwarden.forecast;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoublePredicate;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.estimate.ForwardPoint;
import tunwarden.estimate.ForwardRun;
import tunwarden.estimate.Mode;
import tunwarden.estimate.State;
import tunwarden.units.Constants;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefSetting;

/** Everything that is forecast for every vessel all the time. Pure. */
public final class Forecaster {
  private static final double COLD_K = Constants.ZERO_CELSIUS_K;
  private static final double HOTTEST_K = 60 + Constants.ZERO_CELSIUS_K;
  private static final double COLDEST_K = -3 + Constants.ZERO_CELSIUS_K;
  private static final double CLOSE_K = 0.005;
  private static final double WORTH_CHILLING_K = 2;
  private static final double WORTH_VENTING_PA = 0.05e5;
  private static final double ABSURD_PA = 10e5;
  private static final Duration LATER = Duration.ofHours(8);

  private static final int REST = 0;
  private static final int HOLD = 1;
  private static final int REBOUND = 2;
  private static final int CHILL = 3;
  private static final int WARM = 4;

  private Forecaster() {}

  /** The futures of a vessel; {@link Outlook#NONE} where its state makes no sense to the model. */
  public static Outlook outlook(Present present) {
    return isSensible(present)
        ? outlook(Ensemble.of(present), List.of(), RecentRise.NONE)
        : Outlook.NONE;
  }

  /** The estimator's own forward run; empty where its state holds no belief. */
  public static List<ForwardPoint> ahead(State state) {
    return ForwardRun.run(state, Trend.HORIZON, Trend.STEP);
  }

  /** Whether the model can say anything of a vessel: there is gas, and there is liquid. */
  public static boolean isSensible(Present present) {
    return present.pressurePaAbsolute() > 0 && present.vessel().fillM3() > 0;
  }

  /**
   * The futures of a vessel.
   *
   * @param ensemble the vessel
   * @param ahead the estimator's own forward run, half-hourly over {@link Trend#HORIZON}; empty
   *     where there is none
   * @param rise how the gauge itself has been rising
   */
  public static Outlook outlook(Ensemble ensemble, List<ForwardPoint> ahead, RecentRise rise) {
    Present present = ensemble.present();
    double warmK = present.vessel().warmToK().orElse(present.temperatureK());
    Spread[] at = ensemble.ranges(world -> futures(world, warmK));
    List<ForwardPoint> run = ahead.isEmpty() ? Drift.run(ensemble, at[REST]) : ahead;
    double rising = rise.paPerS().orElse(0);
    boolean contradicted = Contradiction.isThere(run, rising);
    Trend trend = new Trend(present.at(), contradicted ? Contradiction.resolved(run, rising) : run);
    Cautions cautions = new Cautions(present);
    cautions.contradiction(contradicted, rising);
    List<Projection> projections = new ArrayList<>();
    projections.add(soon(trend));
    addWarm(projections, cautions, ensemble, at[WARM]);
    addChill(projections, cautions, present, at[CHILL]);
    if (present.pressurePaGauge() > WORTH_VENTING_PA) {
      projections.add(projection(Scenario.REBOUND, "vented to 0, shut", at[REBOUND]));
    }
    if (present.activity().mode() != Mode.SEALED) {
      projections.add(projection(Scenario.HOLD, "keeps the gas as it is", at[HOLD]));
    }
    Optional<ReliefSetting> relief = present.vessel().limits().relief();
    Optional<TimeRange> toLift = relief.flatMap(r -> trend.until(r.earliestLiftPaGauge()));
    Optional<Duration> soonest = relief.flatMap(r -> trend.soonest(r.earliestLiftPaGauge()));
    cautions.soonest(toLift, soonest);
    OptionalDouble full = liquidFullK(ensemble.middle());
    cautions.liquidFull(full);
    cautions.supersaturation(ensemble.middle());
    return new Outlook(
        projections,
        toLift,
        soonest,
        Trend.HORIZON,
        relief.map(r -> liftK(ensemble.middle(), r)).orElse(OptionalDouble.empty()),
        full,
        trend.points(),
        cautions.list(),
        List.of());
  }

  private static double[] futures(World world, double warmK) {
    return new double[] {
      world.restPaGauge(world.temperatureK()),
      world.holdPaGauge(),
      world.vented(0).restPaGauge(world.temperatureK()),
      world.restPaGauge(COLD_K),
      world.restPaGauge(warmK)
    };
  }

  private static Projection soon(Trend trend) {
    Spread later = trend.at(LATER);
    TimeRange when = new TimeRange(LATER, LATER, Optional.of(LATER));
    return new Projection(
        Scenario.TREND,
        "in " + LATER.toHours() + " h",
        later.middle(),
        later.low(),
        later.high(),
        Optional.of(when));
  }

  private static void addWarm(
      List<Projection> projections, Cautions cautions, Ensemble ensemble, Spread paGauge) {
    Present present = ensemble.present();
    if (present.vessel().warmToK().isEmpty()) {
      return;
    }
    double toK = present.vessel().warmToK().getAsDouble();
    if (toK <= present.temperatureK()) {
      return;
    }
    boolean full = ensemble.middle().isFullAt(toK);
    String words = "warmed to " + celsius(toK) + (full ? ", full: over" : "");
    projections.add(projection(Scenario.WARM, words, capped(paGauge, present)));
    double unmixed = ensemble.middle().unmixedPaGauge(toK);
    cautions.warm(
        toK,
        capped(paGauge, present),
        Double.isFinite(unmixed) ? OptionalDouble.of(unmixed) : OptionalDouble.empty());
  }

  /**
   * A vessel full of liquid runs to thousands of bar on paper; far above every limit the number
   * says nothing more and would only spoil scales.
   */
  private static Spread capped(Spread paGauge, Present present) {
    Limits limits = present.vessel().limits();
    double highest =
        Math.max(
            limits.vesselPaGauge().orElse(0),
            limits.relief().map(ReliefSetting::setPaGauge).orElse(0.0));
    double cap = Math.max(ABSURD_PA, 2 * highest);
    return new Spread(
        Math.min(paGauge.low(), cap),
        Math.min(paGauge.middle(), cap),
        Math.min(paGauge.high(), cap));
  }

  private static void addChill(
      List<Projection> projections, Cautions cautions, Present present, Spread paGauge) {
    if (present.temperatureK() < COLD_K + WORTH_CHILLING_K) {
      return;
    }
    projections.add(projection(Scenario.CHILL, "cooled to " + celsius(COLD_K), paGauge));
    cautions.chill(COLD_K, paGauge);
  }

  private static Projection projection(Scenario scenario, String words, Spread paGauge) {
    return new Projection(
        scenario, words, paGauge.middle(), paGauge.low(), paGauge.high(), Optional.empty());
  }

  private static String celsius(double kelvin) {
    return String.format(Locale.ROOT, "%.0f °C", kelvin - Constants.ZERO_CELSIUS_K);
  }

  /**
   * Temperature at which the closed vessel, at rest, reaches the valve's earliest opening, K; below
   * the present one if it stands above it already, −3 °C at least; empty if not below 60 °C.
   */
  public static OptionalDouble liftK(World world, ReliefSetting relief) {
    double lift = relief.earliestLiftPaGauge();
    return rising(k -> world.isFullAt(k) || world.restPaGauge(k) >= lift);
  }

  /** Temperature at which the liquid takes the whole vessel, K; empty if not below 60 °C. */
  public static OptionalDouble liquidFullK(World world) {
    return rising(world::isFullAt);
  }

  /** Where a condition that holds from some temperature on begins to hold. */
  private static OptionalDouble rising(DoublePredicate holds) {
    double low = COLDEST_K;
    double high = HOTTEST_K;
    if (!holds.test(high)) {
      return OptionalDouble.empty();
    }
    if (holds.test(low)) {
      return OptionalDouble.of(low);
    }
    while (high - low > CLOSE_K) {
      double middle = (low + high) / 2;
      if (holds.test(middle)) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return OptionalDouble.of(high);
  }
}

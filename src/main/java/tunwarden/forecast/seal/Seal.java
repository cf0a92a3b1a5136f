package tunwarden.forecast.seal;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.TimeRange;
import tunwarden.forecast.World;
import tunwarden.forecast.ferment.Balling;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.units.Display;
import tunwarden.vessel.ReliefSetting;

/** Closes a fermenting vessel on paper. */
public final class Seal {
  /** Reading error of a hydrometer or refractometer, 95 %, degrees Plato: common practice. */
  private static final double GRAVITY_U95_PLATO = 0.15;

  private static final double HIGHEST_HOLD_PA = 10e5;
  private static final double CLOSE_PA = 10;
  private static final double LEAST_RATE = 1e-12;

  private Seal() {}

  /**
   * The answer.
   *
   * @throws IllegalArgumentException when {@link SealQuestion#fault} finds something
   */
  public static SealAnswer of(Ensemble ensemble, SealQuestion question) {
    question
        .fault()
        .ifPresent(
            sentence -> {
              throw new IllegalArgumentException(sentence);
            });
    Spread toCome = toCome(question);
    World world = ensemble.middle();
    double kelvin = world.temperatureK();
    Spread vessel = ensemble.range(w -> w.restPaGauge(kelvin, toCome.middle()));
    Spread pressure =
        widened(
            vessel,
            world.restPaGauge(kelvin, toCome.low()),
            world.restPaGauge(kelvin, toCome.high()));
    Spread dissolved =
        widened(
            ensemble.range(w -> w.restDissolvedKgPerM3(kelvin, toCome.middle())),
            world.restDissolvedKgPerM3(kelvin, toCome.low()),
            world.restDissolvedKgPerM3(kelvin, toCome.high()));
    Optional<ReliefSetting> relief = ensemble.present().vessel().limits().relief();
    Optional<TimeRange> until =
        relief.flatMap(r -> untilLift(world, r.earliestLiftPaGauge(), toCome, question.rate()));
    Optional<Spread> hold = question.wanted().map(wanted -> hold(ensemble, wanted));
    Optional<Boolean> enough =
        question
            .wanted()
            .map(w -> world.restDissolvedKgPerM3(w.atK(), toCome.middle()) >= w.kgPerM3());
    return new SealAnswer(
        toCome,
        pressure,
        dissolved,
        relief.map(r -> pressure.middle() >= r.earliestLiftPaGauge()),
        until,
        hold,
        enough,
        cautions(ensemble, pressure, toCome, enough));
  }

  private static Spread toCome(SealQuestion question) {
    double original = question.originalPlato().orElse(question.nowPlato());
    double middle = Balling.co2ToCome(original, question.nowPlato(), question.finalPlato());
    double perPlato = Balling.co2ToCome(original, question.nowPlato(), question.nowPlato() - 1);
    double u95 =
        Math.hypot(Balling.RELATIVE_U95 * middle, Math.sqrt(2) * GRAVITY_U95_PLATO * perPlato);
    return new Spread(Math.max(0, middle - u95), middle, middle + u95);
  }

  private static Spread widened(Spread spread, double low, double high) {
    return new Spread(
        spread.middle() - Math.hypot(spread.middle() - spread.low(), spread.middle() - low),
        spread.middle(),
        spread.middle() + Math.hypot(spread.high() - spread.middle(), high - spread.middle()));
  }

  /** Gas that has to be made until the lift, over the rate. */
  private static Optional<TimeRange> untilLift(
      World world, double liftPaGauge, Spread toCome, FermentationRate rate) {
    double kelvin = world.temperatureK();
    if (world.restPaGauge(kelvin, toCome.middle()) < liftPaGauge) {
      return Optional.empty();
    }
    double low = 0;
    double high = toCome.middle();
    for (int i = 0; i < 40; i++) {
      double middle = (low + high) / 2;
      if (world.restPaGauge(kelvin, middle) >= liftPaGauge) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return Optional.of(
        new TimeRange(
            after(high, rate.middleKgPerM3PerS()),
            after(high, rate.highKgPerM3PerS()),
            Optional.of(after(high, rate.lowKgPerM3PerS()))));
  }

  private static Duration after(double kgPerM3, double ratePerS) {
    return Duration.ofSeconds(Math.round(kgPerM3 / Math.max(LEAST_RATE, ratePerS)));
  }

  /**
   * Level at which the liquid ferments out so that, shut and brought to a temperature, it comes to
   * hold what is wanted.
   */
  public static Spread hold(Ensemble ensemble, SealQuestion.Wanted wanted) {
    return ensemble.range(world -> hold(world, wanted));
  }

  private static double hold(World world, SealQuestion.Wanted wanted) {
    double low = -0.9 * world.ambientPa();
    double high = HIGHEST_HOLD_PA;
    while (high - low > CLOSE_PA) {
      double middle = (low + high) / 2;
      double reached = world.restedUnderCo2(middle).restDissolvedKgPerM3(wanted.atK());
      if (reached >= wanted.kgPerM3()) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return high;
  }

  private static List<Caution> cautions(
      Ensemble ensemble, Spread pressure, Spread toCome, Optional<Boolean> enough) {
    List<Caution> cautions = new ArrayList<>();
    var limits = ensemble.present().vessel().limits();
    boolean lifts =
        limits.relief().isPresent()
            && pressure.high() >= limits.relief().get().earliestLiftPaGauge();
    boolean bursts =
        limits.vesselPaGauge().isPresent()
            && pressure.high() > limits.vesselPaGauge().getAsDouble();
    if (lifts || bursts) {
      cautions.add(
          new Caution(
              true,
              String.format(
                  Locale.ROOT,
                  "Shut now it heads for %s (up to %s), above %s: leave it a way out, a relief valve"
                      + " is not a pressure regulator and foam can block it.",
                  Display.METRIC.gauge(pressure.middle()),
                  Display.METRIC.gauge(pressure.high()),
                  bursts ? "the vessel's limit" : "the valve's earliest opening")));
    }
    if (limits.relief().isEmpty() && toCome.middle() > 0) {
      cautions.add(
          new Caution(
              true,
              "No relief setting is stated: never close a fermenting vessel without a valve."));
    }
    if (enough.isPresent() && !enough.get()) {
      cautions.add(
          new Caution(
              false,
              "The extract left does not give the carbonation wanted; the rest must come from a supply."));
    }
    return cautions;
  }
}

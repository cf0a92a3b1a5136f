package tunwarden.forecast.whatif;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import tunwarden.estimate.Estimate.Spread;
import tunwarden.estimate.Mode;
import tunwarden.forecast.Caution;
import tunwarden.forecast.Ensemble;
import tunwarden.forecast.GravityTrack;
import tunwarden.forecast.Present;
import tunwarden.forecast.WhatIf;
import tunwarden.forecast.Words;
import tunwarden.forecast.ferment.FermentationRate;
import tunwarden.forecast.seal.Seal;
import tunwarden.forecast.seal.SealAnswer;
import tunwarden.forecast.seal.SealQuestion;
import tunwarden.units.Display;
import tunwarden.units.Extract;
import tunwarden.vessel.Prospects;
import tunwarden.vessel.Prospects.Ferment;
import tunwarden.vessel.Prospects.Target;
import tunwarden.vessel.ReliefSetting;

/** A fermentation that is shut in, and the level to hold for the carbonation wanted. */
final class Ferments {
  /** How far gas being made, as the estimator sees it, strays over a day; judgement. */
  private static final double OBSERVED_FACTOR = 2;

  /** Less gas than this is not told from none, kg/m³/s: 0.01 g/L an hour. */
  private static final double LEAST_MADE = 0.01 / 3600;

  private Ferments() {}

  /** Fermented out in the shut vessel; empty without a present and a final gravity. */
  static Optional<WhatIf> closed(Ensemble ensemble, GravityTrack track) {
    Prospects told = ensemble.present().vessel().prospects();
    return told.ferment()
        .filter(f -> f.nowPlato().isPresent() || track.newest().isPresent())
        .map(f -> closed(ensemble, track, f));
  }

  private static WhatIf closed(Ensemble ensemble, GravityTrack track, Ferment ferment) {
    Present present = ensemble.present();
    double read = track.newest().map(GravityTrack.Extract::plato).orElse(Double.NaN);
    double now = Double.isNaN(read) ? ferment.nowPlato().orElseThrow() : read;
    double kept = Math.max(now, ferment.finalPlato()); // at its end a hydrometer may read lower
    Pace pace = Pace.of(present, track, ferment);
    SealAnswer answer =
        Seal.of(
            ensemble,
            new SealQuestion(
                kept, ferment.finalPlato(), original(ferment, kept), pace.rate, Optional.empty()));
    Spread come = answer.toComeKgPerM3();
    boolean shut = present.activity().mode() == Mode.SEALED;
    String detail =
        Display.METRIC.gasContent(come.middle())
            + " of gas to come ("
            + Words.ends(come, 1, 2)
            + " g/L), "
            + gravity(now)
            + age(track, present.at())
            + ", "
            + pace.words;
    return new WhatIf(
        WhatIf.Kind.SEAL,
        shut ? "stays shut, ferments out" : "shut now, ferments out",
        Optional.of(answer.paGauge()),
        answer.untilLift(),
        detail,
        "all extract left ferments (Balling), at this temperature, liquid and gas at rest",
        answer.cautions());
  }

  private static OptionalDouble original(Ferment ferment, double nowPlato) {
    return ferment.originalPlato().orElse(Double.NEGATIVE_INFINITY) >= nowPlato
        ? ferment.originalPlato()
        : OptionalDouble.empty();
  }

  private static String gravity(double plato) {
    return String.format(Locale.ROOT, "%.3f SG", Extract.gravityFromPlato(plato));
  }

  private static String age(GravityTrack track, Instant at) {
    return track
        .newest()
        .map(
            newest -> " read " + Words.time(Duration.between(newest.at(), at).toSeconds()) + " ago")
        .orElse(" as stated");
  }

  /**
   * How fast gas comes.
   *
   * @param rate the rate
   * @param words where it is from
   */
  private record Pace(FermentationRate rate, String words) {
    static Pace of(Present present, GravityTrack track, Ferment ferment) {
      OptionalDouble falling = track.dropPlatoPerDay();
      if (falling.isPresent()) {
        return falling(falling.getAsDouble(), "as it falls");
      }
      if (ferment.dropPlatoPerDay().isPresent()) {
        return falling(ferment.dropPlatoPerDay().getAsDouble(), "as stated");
      }
      double made = present.activity().gasMadeKgPerM3PerS();
      if (made > LEAST_MADE) {
        String words = String.format(Locale.ROOT, "%.2f g/L/h as the gauge tells", 3600 * made);
        return new Pace(
            new FermentationRate(made / OBSERVED_FACTOR, made, made * OBSERVED_FACTOR), words);
      }
      return new Pace(FermentationRate.UNKNOWN, "at a pace not known");
    }

    private static Pace falling(double platoPerDay, String from) {
      String words = String.format(Locale.ROOT, "%.1f P a day %s", platoPerDay, from);
      return new Pace(FermentationRate.stated(platoPerDay), words);
    }
  }

  /** The level to hold; empty without a carbonation wanted. */
  static Optional<WhatIf> held(Ensemble ensemble) {
    return ensemble.present().vessel().prospects().target().map(t -> held(ensemble, t));
  }

  private static WhatIf held(Ensemble ensemble, Target target) {
    double hereK = ensemble.present().temperatureK();
    double atK = target.atK().orElse(hereK);
    Spread hold = Seal.hold(ensemble, new SealQuestion.Wanted(target.kgPerM3(), atK));
    double there = ensemble.middle().holdPaGauge(target.kgPerM3(), atK);
    String wanted = Display.METRIC.gasContent(target.kgPerM3());
    String detail =
        target.atK().isPresent()
            ? "until it has ended, then shut and brought to "
                + Words.celsius(atK)
                + "; on a supply at "
                + Words.celsius(atK)
                + " hold "
                + Words.gauge(there)
            : "at this temperature";
    return new WhatIf(
        WhatIf.Kind.HOLD,
        "hold for " + wanted,
        Optional.of(hold),
        Optional.empty(),
        detail,
        "under CO2 alone and given the time to come to rest; a still liquid takes days to weeks",
        cautions(ensemble.present(), hold));
  }

  private static List<Caution> cautions(Present present, Spread hold) {
    List<Caution> cautions = new ArrayList<>();
    Optional<ReliefSetting> relief = present.vessel().limits().relief();
    if (relief.isPresent() && hold.high() >= relief.get().earliestLiftPaGauge()) {
      cautions.add(
          new Caution(
              true,
              "That is within the valve's opening range: bring it colder or want less; never"
                  + " reset the valve."));
    }
    return cautions;
  }
}

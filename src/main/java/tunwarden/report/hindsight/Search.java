package tunwarden.report.hindsight;

import java.util.ArrayList;
import java.util.List;
import tunwarden.estimate.Estimate;
import tunwarden.forecast.Present;
import tunwarden.physics.liquid.LiquidKind;
import tunwarden.vessel.Vessel;

/** Tries rates, headspaces, air and fermentation, ever closer around what explains the log. */
final class Search {
  private static final double SIGMA_TO_U95 = 1.96;
  private static final double DAY_S = 86_400;
  private static final int RATES = 17;
  private static final int PASSES = 3;

  /** Log-weight below which a rate is not looked at again. */
  private static final double FAINT = -7;

  /** Headspaces tried, in standard deviations of the stated fill. */
  private static final double[] ROOMS = {-2.2, -1.1, 0, 1.1, 2.2};

  /** Classes of air beyond what was stated, Pa: middle, spread and chance. Judgement. */
  private static final double[] AIR_PA = {500, 25_000, 65_000};

  private static final double[] AIR_SD_PA = {800, 12_000, 20_000};
  private static final double[] AIR_CHANCE = {0.96, 0.02, 0.02};

  /** Gas made where something ferments and where nothing does, kg/m³ a day. Judgement. */
  private static final double MADE = 1;

  private static final double LITTLE_MADE = 0.02;
  private static final double FERMENTS_CHANCE = 0.03;

  /** What a liquid holds at first, of what it would at rest; a richer one is possible. */
  private static final double START_SHARE = 0.6;

  private static final double START_SD_SHARE = 0.4;
  private static final double LEAST_ROOM_SHARE = 0.005;

  private final Vessel vessel;
  private final Course course;
  private final boolean ferments;
  private final double usualLnRate;
  private final double lnRateSigma;
  private final double roomSigma;

  Search(Vessel vessel, Course course) {
    this.vessel = vessel;
    this.course = course;
    LiquidKind kind = vessel.liquid().kind();
    ferments =
        kind != LiquidKind.WATER
            && kind != LiquidKind.MINERAL_WATER
            && kind != LiquidKind.SOFT_DRINK;
    Estimate.Spread usual = Present.usualTransfer(vessel.fillM3());
    usualLnRate = Math.log(usual.middle());
    lnRateSigma = Math.log(usual.high() / usual.middle()) / 1.5;
    double roomM3 =
        Math.max(LEAST_ROOM_SHARE * vessel.volumeM3(), vessel.volumeM3() - vessel.fillM3());
    roomSigma = Math.min(0.5, vessel.accuracy().fillU95M3() / SIGMA_TO_U95 / roomM3);
  }

  /** A liquid richer than this at first is made so by fermentation, kg/m³. */
  double richest() {
    double most = 0;
    for (double rest : course.rest) {
      most = Math.max(most, rest);
    }
    return Math.max(1.3 * most, 1.8 * course.rest[0]);
  }

  Band band() {
    HeadspaceFilter filter = new HeadspaceFilter(course, shutAtFirst());
    double from = usualLnRate - 3 * lnRateSigma;
    double to = usualLnRate + 3 * lnRateSigma;
    List<Outcome> outcomes = List.of();
    for (int pass = 0; pass < PASSES; pass++) {
      outcomes = assumptions(from, to).stream().map(filter::run).toList();
      double best = Band.best(outcomes);
      double gap = (to - from) / (RATES - 1);
      double low = to;
      double high = from;
      for (Outcome outcome : outcomes) {
        if (outcome.log() - best > FAINT) {
          double lnRate = Math.log(outcome.assumption().transferPerS());
          low = Math.min(low, lnRate);
          high = Math.max(high, lnRate);
        }
      }
      from = Math.max(from, low - gap);
      to = Math.min(to, high + gap);
    }
    return new Band(course, outcomes);
  }

  /** The best that any rate makes of a headspace, given as the logarithm of its share. */
  double best(double lnRoom) {
    HeadspaceFilter filter = new HeadspaceFilter(course, shutAtFirst());
    double best = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < RATES; i++) {
      double lnRate = usualLnRate + 3 * lnRateSigma * (2.0 * i / (RATES - 1) - 1);
      best = Math.max(best, filter.run(assumption(lnRate, lnRoom, 0, 0, false)).log());
    }
    return best;
  }

  /** Standard deviation of the headspace by the accuracy of the fill, in logarithms. */
  double roomSigma() {
    return roomSigma;
  }

  /** Chance that the headspace is shut where nothing is known. Judgement. */
  private double shutAtFirst() {
    return switch (vessel.closure()) {
      case SEALED -> 0.93;
      case INFER -> 0.5;
      default -> 0.3;
    };
  }

  private List<Assumption> assumptions(double from, double to) {
    List<Assumption> assumptions = new ArrayList<>();
    for (int i = 0; i < RATES; i++) {
      double lnRate = from + (to - from) * i / (RATES - 1);
      for (double room : ROOMS) {
        for (int air = 0; air < AIR_PA.length; air++) {
          assumptions.add(assumption(lnRate, roomSigma * room, room, air, false));
          if (ferments) {
            assumptions.add(assumption(lnRate, roomSigma * room, room, air, true));
          }
        }
      }
    }
    return assumptions;
  }

  private Assumption assumption(
      double lnRate, double lnRoom, double room, int air, boolean making) {
    double rate = (lnRate - usualLnRate) / lnRateSigma;
    double madePerStep = course.stepS / DAY_S * (making ? MADE : LITTLE_MADE);
    double startSd = START_SD_SHARE * course.rest[0];
    double start = START_SHARE * (course.rest[0] - course.slope[0] * AIR_PA[air]);
    double logPrior =
        -(rate * rate + room * room) / 2
            + Math.log(AIR_CHANCE[air])
            + Math.log(making ? FERMENTS_CHANCE : 1 - FERMENTS_CHANCE);
    return new Assumption(
        Math.exp(lnRate),
        Math.exp(lnRoom),
        new double[] {0, start, start, AIR_PA[air], making ? madePerStep : 0},
        new double[] {0, sq(startSd), sq(startSd), sq(AIR_SD_PA[air]), sq(madePerStep)},
        logPrior,
        air > 0 || making);
  }

  private static double sq(double a) {
    return a * a;
  }
}

package tunwarden.report.hindsight;

import java.time.Instant;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.IntToDoubleFunction;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.physics.gas.Gas;
import tunwarden.physics.gas.RealGas;
import tunwarden.physics.liquid.LiquidDensity;
import tunwarden.physics.solubility.LiquidSolubility;
import tunwarden.reading.Reading;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.Bins;
import tunwarden.units.Constants;
import tunwarden.vessel.Vessel;

/**
 * The readings of a whole log in at most {@link #MOST} equal steps, as the look back needs them:
 * what the liquid would hold at rest, and what the headspace holds for every pascal. Where nothing
 * was read, the last values stand.
 */
final class Course {
  /** Most steps looked at. */
  static final int MOST = 500;

  /** Gas that has just been moved is colder or warmer than the liquid for so long. */
  private static final long SETTLING_S = 600;

  private static final double LEAST_NOISE_PA = 17;
  private static final double LEAST_LABORATORY_SHARE = 0.005;
  private static final double SIGMA_TO_U95 = 1.96;

  final int size;
  final double stepS;

  /** Whether pressure and temperature were read. */
  final boolean[] read;

  /** What the liquid would hold at rest, kg/m³. */
  final double[] rest;

  /** Dissolved at rest for every pascal of CO2, kg/(m³ Pa). */
  final double[] slope;

  /** CO2 in the headspace for every pascal of it, kg per m³ of liquid. */
  final double[] perPa;

  /** Pressure that is not CO2, Pa absolute, less the atmosphere. */
  final double[] otherPa;

  /** Pressure of air for every pascal of it at first. */
  final double[] airShare;

  /** Variance of the mean pressure, Pa². */
  final double[] variance;

  /** Where somebody or a valve moved gas, or the signal cannot be believed. */
  final boolean[] disturbed;

  /** Laboratory value of the liquid, kg/m³; NaN for none. */
  final double[] laboratory;

  final double[] laboratoryVariance;
  private final double[] paGauge;
  private final int binsEach;
  private final Bins bins;

  private Course(Bins bins) {
    this.bins = bins;
    binsEach = (bins.size() + MOST - 1) / MOST;
    size = (bins.size() + binsEach - 1) / binsEach;
    stepS = binsEach * bins.widthMs() / 1000.0;
    read = new boolean[size];
    rest = new double[size];
    slope = new double[size];
    perPa = new double[size];
    otherPa = new double[size];
    airShare = new double[size];
    variance = new double[size];
    disturbed = new boolean[size];
    laboratory = new double[size];
    laboratoryVariance = new double[size];
    paGauge = new double[size];
    Arrays.fill(laboratory, Double.NaN);
  }

  /** The course of a log; empty where pressure and temperature were never read together. */
  static Optional<Course> of(Analysis analysis) {
    Course course = new Course(analysis.bins());
    if (!course.fill(analysis.vessel())) {
      return Optional.empty();
    }
    course.judgeNoise(analysis.signals());
    analysis.events().forEach(course::disturb);
    course.dilute(analysis.events(), analysis.vessel().site().ambientPaAbsolute());
    analysis.laboratory().forEach(course::note);
    return Optional.of(course);
  }

  private boolean fill(Vessel vessel) {
    LiquidSolubility solubility = LiquidSolubility.of(vessel.liquid());
    LiquidDensity density = LiquidDensity.of(vessel.liquid());
    double filledAt = Double.NaN;
    int first = -1;
    for (int k = 0; k < size; k++) {
      double kelvin = mean(k, bins::temperatureK);
      paGauge[k] = mean(k, bins::pressurePa);
      read[k] = !Double.isNaN(kelvin) && !Double.isNaN(paGauge[k]);
      if (!read[k]) {
        repeat(k, k - 1);
        continue;
      }
      filledAt = Double.isNaN(filledAt) ? density.kgPerM3(kelvin) : filledAt;
      fill(k, kelvin, vessel, solubility, filledAt / density.kgPerM3(kelvin));
      first = first < 0 ? k : first;
    }
    for (int k = 0; k < first; k++) {
      repeat(k, first);
    }
    return first >= 0 && size >= 2;
  }

  private void fill(
      int k, double kelvin, Vessel vessel, LiquidSolubility solubility, double swell) {
    double total = paGauge[k] + vessel.site().ambientPaAbsolute();
    double other = solubility.vapourPressurePa(kelvin) + vessel.contents().airPaAbsolute();
    double partial = Math.max(1, total - other);
    double roomM3 = Math.max(1e-4 * vessel.volumeM3(), vessel.volumeM3() - vessel.fillM3() * swell);
    double z = RealGas.z(Gas.CO2, total, kelvin);
    double kgPerM3Pa = Gas.CO2.molarMass() / (z * Constants.GAS_CONSTANT * kelvin);
    perPa[k] = roomM3 * kgPerM3Pa / vessel.fillM3();
    rest[k] = solubility.dissolvedKgPerM3(Gas.CO2, partial, total, kelvin);
    slope[k] = rest[k] / partial;
    otherPa[k] = other - vessel.site().ambientPaAbsolute();
    airShare[k] = kelvin;
  }

  private void repeat(int k, int from) {
    for (double[] each : List.of(paGauge, rest, slope, perPa, otherPa, airShare)) {
      each[k] = from < 0 ? Double.NaN : each[from];
    }
  }

  private double mean(int step, IntToDoubleFunction of) {
    double sum = 0;
    int count = 0;
    for (int bin = step * binsEach; bin < Math.min(bins.size(), (step + 1) * binsEach); bin++) {
      double value = of.applyAsDouble(bin);
      if (!Double.isNaN(value)) {
        sum += value;
        count++;
      }
    }
    return count == 0 ? Double.NaN : sum / count;
  }

  /**
   * Scatter averages out, a coarse last digit does not unless the scatter carries the value across
   * it: then neighbouring steps show the same digit and are one piece of news together.
   */
  private void judgeNoise(Analysis.Signals signals) {
    double digit = signals.pressureStepPa();
    double scatter = signals.pressureNoisePa();
    boolean coarse = scatter < digit / 2;
    int changes = 1;
    for (int k = 1; k < size; k++) {
      changes += Math.abs(paGauge[k] - paGauge[k - 1]) > digit / 4 ? 1 : 0;
    }
    double together = coarse ? Math.min(60, size / (double) changes) : 1;
    double byDigit = coarse ? digit * digit / 12 * together : 0;
    for (int k = 0; k < size; k++) {
      int rows = 0;
      for (int b = k * binsEach; b < Math.min(bins.size(), (k + 1) * binsEach); b++) {
        rows += bins.rows(b);
      }
      double byScatter = scatter * scatter / Math.max(1, rows);
      variance[k] = LEAST_NOISE_PA * LEAST_NOISE_PA + byScatter + byDigit;
    }
  }

  /** Air stays where it is, warms with the gas, and leaves with it in proportion. */
  private void dilute(List<Event> events, double ambientPa) {
    double first = airShare[0];
    for (int k = 0; k < size; k++) {
      airShare[k] /= first;
    }
    for (Event event : events) {
      if (event.gasKg() > 0 && event.toPaGauge() < event.fromPaGauge()) {
        double left = (event.toPaGauge() + ambientPa) / (event.fromPaGauge() + ambientPa);
        for (int k = Math.max(0, step(event.until())); k < size; k++) {
          airShare[k] *= Math.max(0.05, Math.min(1, left));
        }
      }
    }
  }

  private void disturb(Event event) {
    EventKind kind = event.kind();
    boolean signal = kind == EventKind.GAP || kind == EventKind.FROZEN || kind == EventKind.SPIKE;
    if (event.gasKg() == 0 && !signal || kind == EventKind.LEAK) {
      return;
    }
    Instant until = signal ? event.until() : event.until().plusSeconds(SETTLING_S);
    for (int k = Math.max(0, step(event.time())); k <= Math.min(size - 1, step(until)); k++) {
      disturbed[k] = true;
    }
  }

  private void note(Reading value) {
    int k = Math.max(0, Math.min(size - 1, step(value.time())));
    double sigma = Math.max(value.u95() / SIGMA_TO_U95, LEAST_LABORATORY_SHARE * value.value());
    laboratory[k] = value.value();
    laboratoryVariance[k] = sigma * sigma;
  }

  /** Pressure of CO2 and unstated air, Pa absolute. */
  double dryPa(int k) {
    return paGauge[k] - otherPa[k];
  }

  private int step(Instant time) {
    return (int) Math.floor(place(time.toEpochMilli()) + 0.5);
  }

  /** Place of a time among the steps' middles, in steps. */
  double place(long ms) {
    long origin = bins.middleMs(0) - bins.widthMs() / 2;
    return (ms - origin) / (1000 * stepS) - 0.5;
  }
}

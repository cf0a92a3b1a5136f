package tunwarden.report.otherwise;

import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import tunwarden.estimate.Estimate;
import tunwarden.forecast.Present;
import tunwarden.rehearse.SimulatedVessel;
import tunwarden.rehearse.Valves;
import tunwarden.report.analysis.Analysis;
import tunwarden.report.analysis.Bins;
import tunwarden.report.story.Belief;
import tunwarden.report.story.Course;
import tunwarden.report.story.Telling;
import tunwarden.units.BadInputException;
import tunwarden.vessel.Limits;
import tunwarden.vessel.ReliefOrifice;
import tunwarden.vessel.ReliefSetting;
import tunwarden.vessel.Vessel;

/**
 * Runs the vessel on from its estimated state, with the temperatures of the log and something
 * changed. What the log's own valves did after that moment is left out.
 */
public final class Rerun {
  private static final Duration LONGEST = Duration.ofDays(14);

  /** A valve of which only the setting is known: common sizes, no source. */
  private static final ReliefOrifice USUAL_VALVE = new ReliefOrifice(0.01, 0.6);

  private static final double RESEATS_AT = 0.93;
  private static final double VENT_M2 = 5e-5;
  private static final double FOLLOWS_AT_ONCE_S = 1;
  private static final double GAS_WARMING_S = 90;
  private static final double LOST_KG = 1e-9;

  private final Analysis analysis;
  private final Belief belief;
  private final WhatIf whatIf;
  private final Bins bins;
  private final Vessel vessel;
  private int lifts;
  private boolean wasLifting;
  private double lostKg;
  private double peakPa = Double.NEGATIVE_INFINITY;

  private Rerun(Analysis analysis, Belief belief, WhatIf whatIf) {
    this.analysis = analysis;
    this.belief = belief;
    this.whatIf = whatIf;
    this.bins = analysis.bins();
    this.vessel = analysis.vessel();
  }

  /**
   * The course with the change.
   *
   * @throws BadInputException when the log does not cover the moment, or holds no belief there
   */
  public static Course of(Analysis analysis, Belief belief, WhatIf whatIf, ZoneId zone) {
    return new Rerun(analysis, belief, whatIf).run(zone);
  }

  private Course run(ZoneId zone) {
    Instant begin = analysis.extremes().from();
    Optional<Instant> ventAt = whatIf.vent().map(vent -> vent.after(begin, zone));
    Instant from = begins(ventAt).orElse(begin);
    Instant until = analysis.extremes().until();
    if (ventAt.isPresent() && (ventAt.get().isBefore(begin) || ventAt.get().isAfter(until))) {
      throw new BadInputException(
          "--what-if: the log does not cover " + ventAt.get() + "; write a time inside it");
    }
    int start = firstKnown(from);
    Limits limits = limits();
    SimulatedVessel simulated = simulated(start, limits);
    TreeMap<Long, Double> points = new TreeMap<>();
    boolean venting = false;
    boolean vented = ventAt.isEmpty();
    double before = simulated.lostKg();
    double seconds = bins.widthMs() / 1000.0;
    long lastMs = Math.min(until.toEpochMilli(), bins.middleMs(start) + LONGEST.toMillis());
    for (int bin = start; bin < bins.size() && bins.middleMs(bin) <= lastMs; bin++) {
      set(simulated, bin);
      for (double done = 0; done < seconds; done += 1) {
        long ms = bins.middleMs(bin) + (long) (1000 * done);
        venting |= !vented && ms >= ventAt.get().toEpochMilli();
        vented |= venting;
        venting = venting && simulated.paGauge() > whatIf.vent().get().toPaGauge();
        simulated.valves().vent(venting ? VENT_M2 : 0);
        simulated.advance(Math.min(1, seconds - done));
        look(simulated, venting);
      }
      points.put(bins.middleMs(bin), simulated.paGauge());
    }
    return new Course(
        whatIf.words(), points, limits, sentences(simulated.lostKg() - before, points));
  }

  /** Until the log reaches the other setting, or the vent, nothing would have been different. */
  private Optional<Instant> begins(Optional<Instant> ventAt) {
    if (whatIf.reliefPaGauge().isEmpty()) {
      return ventAt;
    }
    double set = whatIf.reliefPaGauge().getAsDouble();
    for (int bin = 0; bin < bins.size(); bin++) {
      Instant at = Instant.ofEpochMilli(bins.middleMs(bin));
      boolean vented = ventAt.isPresent() && !at.isBefore(ventAt.get());
      if (bins.highPa(bin) >= set || vented) {
        return Optional.of(at.minusMillis(bins.widthMs()));
      }
    }
    return ventAt;
  }

  private int firstKnown(Instant from) {
    for (int bin = 0; bin < bins.size(); bin++) {
      boolean known =
          !Double.isNaN(belief.dissolved(bin))
              && !Double.isNaN(bins.pressurePa(bin))
              && !Double.isNaN(bins.temperatureK(bin));
      if (known && bins.middleMs(bin) >= from.toEpochMilli() - bins.widthMs()) {
        return bin;
      }
    }
    throw new BadInputException(
        "--what-if: nothing is known about the liquid from that time on; the log needs pressure and"
            + " temperature there");
  }

  private Limits limits() {
    Limits stated = vessel.limits();
    if (whatIf.reliefPaGauge().isEmpty()) {
      return stated;
    }
    ReliefSetting other = ReliefSetting.iso4126(whatIf.reliefPaGauge().getAsDouble());
    return new Limits(Optional.of(other), stated.vesselPaGauge(), stated.vacuumPaGauge());
  }

  private SimulatedVessel simulated(int bin, Limits limits) {
    double transfer =
        analysis
            .state()
            .estimate()
            .map(Estimate::transferPerS)
            .map(Estimate.Spread::middle)
            .filter(middle -> middle > 0)
            .orElse(Present.usualTransfer(vessel.fillM3()).middle());
    SimulatedVessel simulated =
        new SimulatedVessel(
            new SimulatedVessel.Build(
                vessel.volumeM3(),
                vessel.fillM3(),
                vessel.liquid(),
                vessel.site().ambientPaAbsolute(),
                transfer,
                FOLLOWS_AT_ONCE_S,
                GAS_WARMING_S),
            bins.temperatureK(bin));
    double share = belief.dissolved(bin) / Math.max(1e-9, bins.equilibrium(bin));
    simulated.fill(bins.pressurePa(bin), vessel.contents().airPaAbsolute(), share);
    ReliefOrifice orifice = vessel.orifice().orElse(USUAL_VALVE);
    limits
        .relief()
        .ifPresent(
            relief ->
                simulated
                    .valves()
                    .relief(
                        new Valves.Relief(
                            relief.setPaGauge(),
                            RESEATS_AT * relief.setPaGauge(),
                            orifice.areaM2() * orifice.dischargeCoefficient())));
    return simulated;
  }

  private void set(SimulatedVessel simulated, int bin) {
    if (!Double.isNaN(bins.temperatureK(bin))) {
      simulated.surroundings(bins.temperatureK(bin));
    }
    simulated.valves().making(bins.made(bin));
  }

  /** A wide valve may open and reseat within a step: what was lost tells. */
  private void look(SimulatedVessel simulated, boolean venting) {
    peakPa = Math.max(peakPa, simulated.paGauge());
    boolean blew = !venting && simulated.lostKg() - lostKg > LOST_KG;
    if (blew && !wasLifting) {
      lifts++;
    }
    wasLifting = blew;
    lostKg = simulated.lostKg();
  }

  private List<String> sentences(double lostKg, TreeMap<Long, Double> points) {
    List<String> sentences = new ArrayList<>();
    sentences.add(
        "The highest pressure would have been "
            + Telling.DISPLAY.gauge(peakPa)
            + ", at the end "
            + Telling.DISPLAY.gauge(points.lastEntry().getValue())
            + ".");
    sentences.add(
        "The relief valve, opening at its setting and reseating 7 % lower, would have lifted "
            + Telling.times(lifts)
            + "; about "
            + Telling.mass(lostKg)
            + " of gas would have left.");
    sentences.add(
        "Run on from the estimated state with the temperatures of the log; supplies, vents and"
            + " leaks of the log after that moment are left out"
            + (points.lastKey() - points.firstKey() >= LONGEST.toMillis() - bins.widthMs()
                ? ", and the run ends after 14 days."
                : "."));
    return sentences;
  }
}

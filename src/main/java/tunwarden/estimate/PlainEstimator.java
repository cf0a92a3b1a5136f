package tunwarden.estimate;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.bank.Medium;
import tunwarden.estimate.gate.Gates;
import tunwarden.estimate.gate.Track;
import tunwarden.estimate.gate.Verdict;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.vessel.Accuracy;
import tunwarden.vessel.Vessel;

/**
 * The plain reading: the solubility relation applied to pressure and temperature as if the liquid
 * were at rest with its headspace. Right when it is, and the yardstick for anything better.
 */
public final class PlainEstimator implements Estimator {
  private static final double KELVIN_STEP = 0.1;

  @Override
  public State begin(Vessel vessel) {
    return new PlainState(new Medium(vessel), Track.EMPTY, Track.EMPTY, Optional.empty());
  }

  @Override
  public Step step(State previous, Sample sample) {
    PlainState state = (PlainState) previous;
    if (!(sample instanceof Reading reading)) {
      Quality quality = sample instanceof Fault fault ? fault.quality() : Quality.GOOD;
      return new Step(Outcome.REJECTED, quality, quality.why(), state, List.of());
    }
    return switch (reading.quantity()) {
      case PRESSURE -> pressure(state, reading);
      case TEMPERATURE -> temperature(state, reading);
      default -> new Step(Outcome.ACCEPTED, reading.quality(), "", state, List.of());
    };
  }

  private static Step temperature(PlainState state, Reading reading) {
    Verdict verdict = Gates.judge(state.temperature(), reading);
    PlainState next = state.withTracks(state.pressure(), verdict.track());
    Outcome outcome = verdict.usable() ? Outcome.WAITING : Outcome.REJECTED;
    return new Step(outcome, verdict.quality(), verdict.reason(), next, List.of());
  }

  private static Step pressure(PlainState state, Reading reading) {
    Verdict verdict = Gates.judge(state.pressure(), reading);
    PlainState next = state.withTracks(verdict.track(), state.temperature());
    if (!verdict.usable()) {
      return new Step(Outcome.REJECTED, verdict.quality(), verdict.reason(), next, List.of());
    }
    if (!state.temperature().seen()) {
      return new Step(Outcome.WAITING, verdict.quality(), "no temperature yet", next, List.of());
    }
    Estimate estimate = estimate(state.medium(), reading, state.temperature().value());
    PlainState known =
        new PlainState(state.medium(), verdict.track(), state.temperature(), Optional.of(estimate));
    return new Step(Outcome.ACCEPTED, verdict.quality(), "", known, List.of());
  }

  /** The plain reading with its interval, first-order propagation (JCGM 100:2008, 5.1.2). */
  private static Estimate estimate(Medium medium, Reading reading, double kelvin) {
    Vessel vessel = medium.vessel();
    Accuracy accuracy = vessel.accuracy();
    double dissolved = plainDissolved(medium, reading.value(), kelvin);
    double perPa = plainDissolved(medium, reading.value() + 1000, kelvin) / 1000 - dissolved / 1000;
    double perKelvin =
        (plainDissolved(medium, reading.value(), kelvin + KELVIN_STEP) - dissolved) / KELVIN_STEP;
    double pressureU95 = Math.hypot(accuracy.pressureU95Pa(), vessel.site().ambientU95Pa());
    double u95 =
        Math.hypot(
            Math.hypot(perPa * pressureU95, perKelvin * accuracy.temperatureU95K()),
            2 * medium.relationU() * dissolved);
    return new Estimate(
        reading.time(),
        reading.value(),
        kelvin,
        dissolved,
        u95,
        dissolved,
        1,
        0,
        0,
        Mode.UNKNOWN,
        0,
        new Estimate.Spread(0, 0, 0),
        0,
        "Taken as settled: what the liquid really holds may differ.");
  }

  /** Equilibrium content by the plain reading, kg/m3. */
  static double plainDissolved(Medium medium, double paGauge, double kelvin) {
    Vessel vessel = medium.vessel();
    double total = paGauge + vessel.site().ambientPaAbsolute();
    double dry = total - medium.vapourPa(kelvin) - vessel.contents().airPaAbsolute();
    return medium.solubility(kelvin, total) * medium.co2Share() * Math.max(dry, 0);
  }

  @Override
  public Step idle(State previous, Instant now) {
    return new Step(Outcome.AGED, Quality.STALE, "nothing new", previous, List.of());
  }
}

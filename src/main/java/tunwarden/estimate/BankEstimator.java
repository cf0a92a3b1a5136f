package tunwarden.estimate;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.estimate.bank.Bank;
import tunwarden.estimate.bank.BankFilter;
import tunwarden.estimate.bank.Medium;
import tunwarden.estimate.gate.Gates;
import tunwarden.estimate.gate.Track;
import tunwarden.estimate.gate.Verdict;
import tunwarden.reading.Fault;
import tunwarden.reading.Mark;
import tunwarden.reading.Quality;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.vessel.Vessel;

/**
 * The estimator with hidden state: a bank of filters over what cannot be seen, a fast watch on
 * valves in front of it. Stateless; a step that fails leaves the previous state as it was.
 */
public final class BankEstimator implements Estimator {
  private static final double LAB_U95_SHARE = 0.05;

  private final Watch fresh;

  /** The usual one. */
  public BankEstimator() {
    this(Watch.NEW);
  }

  /** One whose slow watches begin with that memory. */
  BankEstimator(Watch fresh) {
    this.fresh = fresh;
  }

  @Override
  public State begin(Vessel vessel) {
    return new BankState(
        new Medium(vessel),
        Senses.fresh(vessel.accuracy().pressureU95Pa()),
        null,
        null,
        fresh,
        EventBook.EMPTY,
        Optional.empty());
  }

  @Override
  public Step step(State previous, Sample sample) {
    try {
      return digest((BankState) previous, sample);
    } catch (RuntimeException e) {
      String why = "the model could not digest it: " + e.getMessage();
      return new Step(Outcome.MODEL_FAILED, Quality.GOOD, why, previous, List.of());
    }
  }

  private static Step digest(BankState state, Sample sample) {
    if (sample instanceof Mark mark) {
      return mark(state, mark);
    }
    if (sample instanceof Fault fault) {
      return new Step(Outcome.REJECTED, fault.quality(), fault.quality().why(), state, List.of());
    }
    Reading reading = (Reading) sample;
    return switch (reading.quantity()) {
      case PRESSURE -> pressure(state, reading);
      case TEMPERATURE -> temperature(state, reading);
      case BAROMETER -> barometer(state, reading);
      case DISSOLVED -> laboratory(state, reading);
      default -> new Step(Outcome.ACCEPTED, reading.quality(), "", state, List.of());
    };
  }

  private static Step mark(BankState state, Mark mark) {
    double pa = state.estimate().map(Estimate::pressurePaGauge).orElse(0.0);
    Event event =
        new Event(
            EventKind.MARK,
            mark.vessel(),
            mark.time(),
            mark.time(),
            false,
            pa,
            pa,
            0,
            1,
            mark.text());
    return new Step(Outcome.ACCEPTED, Quality.GOOD, "", state, List.of(event));
  }

  private static Step temperature(BankState state, Reading reading) {
    Verdict verdict = Gates.judge(state.senses().temperature(), reading);
    List<Event> news = new ArrayList<>();
    if (!verdict.usable()) {
      BankState next = state.withSenses(state.senses().refused(verdict.track()));
      next = Freeze.check(next, reading, verdict, news);
      return new Step(Outcome.REJECTED, verdict.quality(), verdict.reason(), next, news);
    }
    double atS = seconds(reading.time());
    BankState next =
        state.withSenses(state.senses().withTemperature(verdict.track(), atS, reading.value()));
    next = Quarrel.check(WarmWatch.look(next, reading, news), reading, news);
    return new Step(Outcome.WAITING, verdict.quality(), "", next, news);
  }

  private static Step barometer(BankState state, Reading reading) {
    Verdict verdict = Gates.judge(state.senses().barometer(), reading);
    Track kept = verdict.usable() ? verdict.track() : state.senses().barometer();
    BankState next = state.withSenses(state.senses().withBarometer(kept));
    Outcome outcome = verdict.usable() ? Outcome.ACCEPTED : Outcome.REJECTED;
    return new Step(outcome, verdict.quality(), verdict.reason(), next, List.of());
  }

  private static Step laboratory(BankState state, Reading reading) {
    if (state.bank() == null) {
      return new Step(
          Outcome.REJECTED,
          reading.quality(),
          "came before the first pressure and temperature",
          state,
          List.of());
    }
    double u95 = reading.u95() > 0 ? reading.u95() : LAB_U95_SHARE * reading.value();
    Bank told = new BankFilter(state.medium()).tell(state.bank(), reading.value(), u95 / 2);
    Estimate estimate =
        Beliefs.of(
            state, told, reading.time(), state.front().last().paGauge(), state.watch().said());
    BankState next =
        new BankState(
            state.medium(),
            state.senses(),
            state.front(),
            told,
            state.watch(),
            state.book(),
            Optional.of(estimate));
    return new Step(Outcome.ACCEPTED, reading.quality(), "", next, List.of());
  }

  private static Step pressure(BankState state, Reading reading) {
    Verdict verdict = Gates.judge(state.senses().pressure(), reading);
    BankState judged = state.withSenses(state.senses().withPressure(verdict.track()));
    List<Event> news = new ArrayList<>();
    judged = Freeze.check(judged, reading, verdict, news);
    if (!verdict.usable()) {
      return new Step(Outcome.REJECTED, verdict.quality(), verdict.reason(), judged, news);
    }
    judged = Quarrel.check(judged, reading, news);
    if (!judged.senses().temperature().seen()) {
      return new Step(Outcome.WAITING, verdict.quality(), "no temperature yet", judged, news);
    }
    PressureStep work = new PressureStep(judged, reading, news);
    BankState next = work.run();
    return new Step(Outcome.ACCEPTED, verdict.quality(), work.remark(), next, news);
  }

  @Override
  public Step idle(State previous, Instant now) {
    BankState state = (BankState) previous;
    List<Event> news = new ArrayList<>();
    BankState next = GapWatch.idle(state, now, news);
    return new Step(Outcome.AGED, Quality.STALE, "nothing new", next, news);
  }

  static double seconds(Instant time) {
    return time.toEpochMilli() / 1000.0;
  }

  static Instant instant(double seconds) {
    return Instant.ofEpochMilli(Math.round(seconds * 1000));
  }
}

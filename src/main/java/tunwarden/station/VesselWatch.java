package tunwarden.station;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.assess.Assessment;
import tunwarden.assess.Assessor;
import tunwarden.assess.Assessor.Evidence;
import tunwarden.assess.Observed;
import tunwarden.estimate.Estimate;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Event;
import tunwarden.estimate.Outcome;
import tunwarden.estimate.Step;
import tunwarden.forecast.Outlook;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.vessel.Vessel;

/** Follows one vessel: sample in, step, assessment out. Not thread-safe: the station owns it. */
final class VesselWatch {
  private static final Logger LOG = LoggerFactory.getLogger(VesselWatch.class);

  private final Vessel vessel;
  private final Estimator estimator;
  private final Forecasts forecasts;
  private final StationSettings settings;
  private final List<Event> unreported = new ArrayList<>();
  private VesselMemory memory;

  VesselWatch(Vessel vessel, Estimator estimator, Forecasts forecasts, StationSettings settings) {
    this.vessel = vessel;
    this.estimator = estimator;
    this.forecasts = forecasts;
    this.settings = settings;
    this.memory = VesselMemory.fresh(estimator.begin(vessel));
  }

  VesselMemory memory() {
    return memory;
  }

  void restore(VesselMemory kept) {
    memory = kept;
    unreported.clear();
  }

  /** Digests the sample; the previous state stands if the model throws. */
  Step digest(Sample sample) {
    Step step;
    try {
      step = estimator.step(memory.state(), sample);
    } catch (RuntimeException e) {
      LOG.warn("{}: the estimator could not digest {}", vessel.id(), sample, e);
      step = new Step(Outcome.MODEL_FAILED, Quality.GOOD, e.toString(), memory.state(), List.of());
    }
    take(step);
    observe(sample, step);
    return step;
  }

  /** Whether this sample ends a row, so that an assessment is due. */
  static boolean endsRow(Sample sample) {
    return sample instanceof Reading reading && reading.quantity() == Quantity.PRESSURE
        || sample instanceof Fault fault && fault.quantity() == Quantity.PRESSURE;
  }

  /** Lets time pass without a sample. */
  void idle(Instant now) {
    try {
      take(estimator.idle(memory.state(), now));
    } catch (RuntimeException e) {
      LOG.warn("{}: the estimator could not idle until {}", vessel.id(), now, e);
    }
  }

  /** The snapshot as of {@code now}; events found since the one before go with it. */
  Assessment assess(Instant now) {
    Observed pressure = memory.pressure().observedAt(now, settings.stale());
    Observed temperature = memory.temperature().observedAt(now, settings.stale());
    Optional<Estimate> estimate = memory.state().estimate();
    PacedOutlook outlook = outlookAt(now, pressure);
    memory = memory.assessed(outlook, now);
    List<Event> events = List.copyOf(unreported);
    unreported.clear();
    return Assessor.assess(
        new Evidence(vessel, now, pressure, temperature, estimate, outlook.outlook(), events));
  }

  private void take(Step step) {
    memory = memory.withState(step.next());
    unreported.addAll(step.events());
  }

  private PacedOutlook outlookAt(Instant now, Observed pressure) {
    PacedOutlook kept = memory.outlook();
    if (!pressure.isUsable() || memory.state().estimate().isEmpty()) {
      return kept;
    }
    double paGauge = pressure.value().getAsDouble();
    if (!kept.isDue(now, paGauge, vessel.accuracy().pressureU95Pa(), settings)) {
      return kept;
    }
    try {
      return new PacedOutlook(
          now, paGauge, forecasts.outlook(vessel, memory.state(), memory.seen()));
    } catch (RuntimeException e) {
      LOG.warn("{}: the futures could not be computed", vessel.id(), e);
      return new PacedOutlook(now, paGauge, Outlook.NONE);
    }
  }

  private void observe(Sample sample, Step step) {
    if (sample instanceof Reading reading) {
      Quality quality = reading.quality().isBad() ? reading.quality() : step.quality();
      remember(reading, quality);
    } else if (sample instanceof Fault fault) {
      forget(fault);
    }
  }

  private void remember(Reading reading, Quality quality) {
    switch (reading.quantity()) {
      case PRESSURE -> {
        memory =
            memory.withPressure(memory.pressure().seen(reading.value(), reading.time(), quality));
        if (!quality.isBad()) {
          memory = memory.withSeen(memory.seen().pressure(reading.time(), reading.value()));
        }
      }
      case TEMPERATURE -> {
        memory =
            memory.withTemperature(
                memory.temperature().seen(reading.value(), reading.time(), quality));
        if (!quality.isBad()) {
          memory =
              memory.withSeen(
                  memory.seen().temperature(reading.time(), reading.value(), vessel.warmToK()));
        }
      }
      case GRAVITY -> {
        if (!quality.isBad()) {
          memory = memory.withSeen(memory.seen().gravity(reading.time(), reading.value()));
        }
      }
      default -> {
        // The estimator alone uses the other quantities.
      }
    }
  }

  private void forget(Fault fault) {
    switch (fault.quantity()) {
      case PRESSURE -> memory = memory.withPressure(memory.pressure().faulty(fault.quality()));
      case TEMPERATURE ->
          memory = memory.withTemperature(memory.temperature().faulty(fault.quality()));
      default -> {
        // Nothing is shown of the others.
      }
    }
  }
}

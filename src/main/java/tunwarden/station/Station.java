package tunwarden.station;

import java.time.Duration;
import java.time.Instant;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.State;
import tunwarden.estimate.Step;
import tunwarden.reading.Sample;
import tunwarden.vessel.Vessel;

/**
 * Samples in, assessments out, for all vessels of a cellar. Live and replay use the same code: time
 * enters only through samples and {@link #tick}. One thread at a time may call it; live, that is
 * the {@link StationLoop}.
 */
public final class Station {
  private static final Logger LOG = LoggerFactory.getLogger(Station.class);

  private final Map<String, VesselWatch> watches = new LinkedHashMap<>();
  private final List<Sink> sinks;
  private final Duration tickGap;

  /**
   * A station that has seen nothing yet.
   *
   * @param vessels the cellar, in the user's order
   * @param estimator turns samples into beliefs
   * @param forecasts computes the futures
   * @param settings pacing
   * @param sinks where assessments go, called in this order
   */
  public Station(
      List<Vessel> vessels,
      Estimator estimator,
      Forecasts forecasts,
      StationSettings settings,
      List<Sink> sinks) {
    for (Vessel vessel : vessels) {
      watches.put(vessel.id(), new VesselWatch(vessel, estimator, forecasts, settings));
    }
    this.sinks = List.copyOf(sinks);
    this.tickGap = Duration.ofSeconds(1);
  }

  /** Digests one sample; one of a vessel that is not in the cellar is dropped. */
  public void accept(Sample sample) {
    VesselWatch watch = watches.get(sample.vessel());
    if (watch == null) {
      return;
    }
    Step step = watch.digest(sample);
    for (Sink sink : sinks) {
      guard(sink, () -> sink.sampled(sample, step));
    }
    if (VesselWatch.endsRow(sample)) {
      publish(watch.assess(later(sample.time(), watch.memory().assessedAt())));
    }
  }

  /** Silence is data: every vessel not assessed within the last second is assessed now. */
  public void tick(Instant now) {
    for (VesselWatch watch : watches.values()) {
      Instant before = watch.memory().assessedAt();
      if (before.equals(Instant.MIN) || !before.plus(tickGap).isAfter(now)) {
        watch.idle(now);
        publish(watch.assess(now));
      }
    }
  }

  /** Everything remembered, to come back to with {@link #restore}. */
  public Checkpoint checkpoint() {
    Map<String, VesselMemory> memories = new LinkedHashMap<>();
    watches.forEach((id, watch) -> memories.put(id, watch.memory()));
    return new Checkpoint(memories);
  }

  /** Goes back to a state kept earlier; vessels that are not in this station are passed over. */
  public void restore(Checkpoint checkpoint) {
    checkpoint.memories.forEach(
        (id, memory) -> {
          VesselWatch watch = watches.get(id);
          if (watch != null) {
            watch.restore(memory);
          }
        });
  }

  /** Goes on with a vessel from what the estimator remembers of it; the rest begins afresh. */
  public void resume(String vessel, State state) {
    VesselWatch watch = watches.get(vessel);
    if (watch != null) {
      watch.restore(VesselMemory.fresh(state));
    }
  }

  /** The station's memory at one moment; opaque and immutable. */
  public static final class Checkpoint {
    private final Map<String, VesselMemory> memories;

    private Checkpoint(Map<String, VesselMemory> memories) {
      this.memories = memories;
    }

    /** The same moment, of these vessels only. */
    public Checkpoint only(Set<String> vessels) {
      Map<String, VesselMemory> kept = new LinkedHashMap<>(memories);
      kept.keySet().retainAll(vessels);
      return new Checkpoint(kept);
    }

    /** The same moment, with all futures to be computed afresh. */
    public Checkpoint withoutOutlooks() {
      Map<String, VesselMemory> blank = new LinkedHashMap<>();
      memories.forEach((id, memory) -> blank.put(id, memory.withoutOutlook()));
      return new Checkpoint(blank);
    }

    /** What the estimator remembers, by vessel. */
    public Map<String, State> states() {
      Map<String, State> states = new LinkedHashMap<>();
      memories.forEach((id, memory) -> states.put(id, memory.state()));
      return states;
    }

    /** Time of the newest reading of a vessel; empty before its first. */
    public Optional<Instant> seenUntil(String vessel) {
      return Optional.ofNullable(memories.get(vessel)).flatMap(VesselMemory::seenUntil);
    }
  }

  private void publish(Assessment assessment) {
    for (Sink sink : sinks) {
      guard(sink, () -> sink.assessed(assessment));
    }
  }

  /** One failing sink must not silence the others. */
  private static void guard(Sink sink, Runnable delivery) {
    try {
      delivery.run();
    } catch (RuntimeException e) {
      LOG.error("{} failed", sink.getClass().getSimpleName(), e);
    }
  }

  private static Instant later(Instant a, Instant b) {
    return a.isAfter(b) ? a : b;
  }
}

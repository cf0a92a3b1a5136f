package tunwarden.station;

import java.time.Instant;
import java.util.Comparator;
import java.util.Optional;
import java.util.stream.Stream;
import tunwarden.estimate.State;
import tunwarden.forecast.Hindsight;

/** All that the station remembers of one vessel; immutable, so that it can be kept and restored. */
record VesselMemory(
    State state,
    LatestReading pressure,
    LatestReading temperature,
    Hindsight seen,
    PacedOutlook outlook,
    Instant assessedAt) {

  static VesselMemory fresh(State state) {
    return new VesselMemory(
        state,
        LatestReading.NONE,
        LatestReading.NONE,
        Hindsight.NONE,
        PacedOutlook.NEVER,
        Instant.MIN);
  }

  VesselMemory withoutOutlook() {
    return new VesselMemory(state, pressure, temperature, seen, PacedOutlook.NEVER, assessedAt);
  }

  /** Time of the newest reading. */
  Optional<Instant> seenUntil() {
    return Stream.of(pressure.at(), temperature.at())
        .flatMap(Optional::stream)
        .max(Comparator.naturalOrder());
  }

  VesselMemory withState(State next) {
    return new VesselMemory(next, pressure, temperature, seen, outlook, assessedAt);
  }

  VesselMemory withPressure(LatestReading next) {
    return new VesselMemory(state, next, temperature, seen, outlook, assessedAt);
  }

  VesselMemory withTemperature(LatestReading next) {
    return new VesselMemory(state, pressure, next, seen, outlook, assessedAt);
  }

  VesselMemory withSeen(Hindsight next) {
    return new VesselMemory(state, pressure, temperature, next, outlook, assessedAt);
  }

  VesselMemory assessed(PacedOutlook next, Instant at) {
    return new VesselMemory(state, pressure, temperature, seen, next, at);
  }
}

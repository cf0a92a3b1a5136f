package tunwarden.report.analysis;

import java.util.List;
import tunwarden.estimate.Event;
import tunwarden.estimate.EventKind;
import tunwarden.estimate.Mode;
import tunwarden.estimate.State;
import tunwarden.reading.Reading;
import tunwarden.vessel.Vessel;

/**
 * Everything a report tells about one vessel's log.
 *
 * @param vessel its description
 * @param rows rows read
 * @param extremes first, last, highest, lowest and closest rows
 * @param events what happened, in order of time
 * @param bins the course of everything
 * @param signals how the instruments behaved
 * @param laboratory values of the dissolved gas that were entered, with their uncertainty
 * @param state the estimator's state at the end
 * @param secondsIn data time spent in each {@link Mode}, s
 */
public record Analysis(
    Vessel vessel,
    long rows,
    Extremes extremes,
    List<Event> events,
    Bins bins,
    Signals signals,
    List<Reading> laboratory,
    State state,
    long[] secondsIn) {

  /**
   * How the instruments behaved.
   *
   * @param pressure the gauge
   * @param temperature the thermometer
   * @param intervalS usual distance between rows, s
   * @param pressureNoisePa scatter of the pressure about its course, Pa
   * @param pressureStepPa step of its last digit, Pa; 0 while unknown
   */
  public record Signals(
      SignalHealth pressure,
      SignalHealth temperature,
      double intervalS,
      double pressureNoisePa,
      double pressureStepPa) {}

  /** Events of one kind. */
  public List<Event> events(EventKind kind) {
    return events.stream().filter(event -> event.kind() == kind).toList();
  }

  /** Gas that left in vents, lifts and leaks, kg. */
  public double gasLostKg() {
    return events.stream().mapToDouble(event -> Math.max(0, event.gasKg())).sum();
  }

  /** Share of the time spent in a mode, 0..1. */
  public double share(Mode mode) {
    long all = 0;
    for (long seconds : secondsIn) {
      all += seconds;
    }
    return all == 0 ? 0 : secondsIn[mode.ordinal()] / (double) all;
  }
}

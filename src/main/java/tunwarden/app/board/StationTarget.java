package tunwarden.app.board;

import java.time.Instant;
import java.util.List;
import java.util.Map;
import tunwarden.alarm.AlarmBook;
import tunwarden.estimate.Event;
import tunwarden.reading.Sample;
import tunwarden.replay.ReplayTarget;
import tunwarden.station.Station;

/**
 * Lets a replay feed a station. Whatever else changes the station goes through {@link #run}, so
 * that there is still one writer at a time.
 */
final class StationTarget implements ReplayTarget {
  private final Assembly assembly;
  private final int vessels;
  private volatile Instant reached = Instant.MIN;

  StationTarget(Assembly assembly, int vessels) {
    this.assembly = assembly;
    this.vessels = vessels;
  }

  private record Place(
      Station.Checkpoint station,
      AlarmBook alarms,
      Map<String, List<Event>> goingOn,
      Instant time) {}

  @Override
  public synchronized void accept(Sample sample) {
    reached = sample.time();
    assembly.station().accept(sample);
  }

  @Override
  public synchronized void tick(Instant now) {
    reached = now;
    assembly.station().tick(now);
  }

  @Override
  public int vessels() {
    return vessels;
  }

  @Override
  public synchronized Object checkpoint() {
    return new Place(
        assembly.station().checkpoint(),
        assembly.alarms().book(),
        assembly.board().goingOn(),
        reached);
  }

  @Override
  public synchronized void restore(Object checkpoint) {
    Place place = (Place) checkpoint;
    assembly.station().restore(place.station());
    assembly.alarms().restore(place.alarms());
    assembly.board().backTo(place.time(), place.goingOn());
    reached = place.time();
  }

  /** Stands at a time before anything was fed. */
  void begin(Instant start) {
    reached = start;
  }

  /** Data time reached, never behind the newest assessment; safe from any thread. */
  Instant reached() {
    return reached;
  }

  /** Does something to the station between two samples. */
  synchronized void run(Runnable deed) {
    deed.run();
  }
}

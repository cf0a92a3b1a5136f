package tunwarden.replay;

import java.io.Closeable;
import java.io.IOException;
import java.time.Duration;
import java.time.Instant;
import tunwarden.reading.Sample;

/**
 * Feeds rows to a target up to any data time, forwards or backwards. No thread and no clock of its
 * own: whoever drives it says how far to go.
 */
public final class ReplayPlayer implements Closeable {
  private final RowSource.Supplier log;
  private final ReplayTarget target;
  private final Duration tick;
  private final CheckpointTrail trail;
  private RowSource rows;
  private LogRow upcoming;
  private long fed;
  private Instant start;
  private Instant at;

  /**
   * Opens the log at its beginning.
   *
   * @param log rows that can be opened again
   * @param target what to feed
   * @param tick longest stretch of data time without a word to the target
   * @throws IOException when the log cannot be read
   * @throws BadLogException when it holds no rows
   */
  public ReplayPlayer(RowSource.Supplier log, ReplayTarget target, Duration tick)
      throws IOException {
    this.log = log;
    this.target = target;
    this.trail = new CheckpointTrail(target.vessels());
    this.tick = tick;
    this.rows = log.open();
    this.upcoming = rows.next();
    this.start = upcoming.time();
    this.at = start;
    trail.add(new CheckpointTrail.Place(0, start, target.checkpoint()));
  }

  /** Data time of the first row. */
  public Instant start() {
    return start;
  }

  /** Data time reached. */
  public Instant at() {
    return at;
  }

  /** Rows fed so far. */
  public long fed() {
    return fed;
  }

  /** Whether all rows have been fed. */
  public boolean isEnded() {
    return upcoming == null;
  }

  /** Data time of the row that comes next; the time reached when there is none. */
  public Instant due() {
    return upcoming == null ? at : upcoming.time();
  }

  /**
   * Feeds everything up to and including {@code until}, going back first when that lies behind.
   *
   * @param mostRows stop after this many rows, so that a driver can look up in between
   * @return whether {@code until} was reached or the log has ended
   */
  public boolean playTo(Instant until, long mostRows) throws IOException {
    if (until.isBefore(at)) {
      goBack(until);
    }
    long before = fed;
    while (upcoming != null && !upcoming.time().isAfter(until)) {
      if (fed - before >= mostRows) {
        return false;
      }
      feed();
    }
    if (upcoming != null && until.isAfter(at)) {
      tickUpTo(until);
      at = until;
    }
    return true;
  }

  /** Feeds every row that carries the next time; one step of a paused replay. */
  public void step() throws IOException {
    if (upcoming == null) {
      return;
    }
    Instant time = upcoming.time();
    while (upcoming != null && upcoming.time().equals(time)) {
      feed();
    }
  }

  private void feed() throws IOException {
    LogRow row = upcoming;
    tickUpTo(row.time());
    for (Sample sample : row.samples()) {
      target.accept(sample);
    }
    at = row.time();
    fed++;
    upcoming = rows.next();
    if (trail.wants(fed)) {
      trail.add(new CheckpointTrail.Place(fed, at, target.checkpoint()));
    }
  }

  /** Ticks at whole multiples of the tick, so that they fall on the same data times every time. */
  private void tickUpTo(Instant until) {
    long step = tick.toMillis();
    long next = Math.floorDiv(at.toEpochMilli(), step) * step + step;
    for (; next < until.toEpochMilli(); next += step) {
      target.tick(Instant.ofEpochMilli(next));
    }
  }

  private void goBack(Instant until) throws IOException {
    CheckpointTrail.Place place = trail.before(until);
    rows.close();
    rows = log.open();
    for (long i = 0; i < place.rows(); i++) {
      rows.next();
    }
    upcoming = rows.next();
    fed = place.rows();
    at = place.at();
    target.restore(place.state());
  }

  @Override
  public void close() throws IOException {
    rows.close();
  }
}

package tunwarden.report.analysis;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import tunwarden.estimate.Event;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.LogRow;

/** The readings around one event, thinned to what a small plot can show. */
public final class EventWindow {
  private static final long BEFORE_MS = 10 * 60_000;
  private static final long AFTER_MS = 20 * 60_000;
  private static final int MOST = 400;

  /**
   * One reading.
   *
   * @param ms milliseconds since 1970
   * @param paGauge pressure, Pa gauge
   * @param kelvin temperature, K
   */
  public record Seen(long ms, double paGauge, double kelvin) {}

  private final Event event;
  private final long fromMs;
  private final long untilMs;
  private final long leastMs;
  private final List<Seen> seen = new ArrayList<>();
  private double kelvin = Double.NaN;

  /** A window that holds nothing yet. */
  public EventWindow(Event event) {
    this.event = event;
    long half = (event.until().toEpochMilli() - event.time().toEpochMilli()) / 2;
    this.fromMs = event.time().toEpochMilli() - Math.max(BEFORE_MS, half);
    this.untilMs = event.until().toEpochMilli() + Math.max(AFTER_MS, half);
    this.leastMs = (untilMs - fromMs) / MOST;
  }

  /** Keeps the row if it lies in the window. */
  public void take(LogRow row) {
    long ms = row.time().toEpochMilli();
    if (ms < fromMs || ms > untilMs) {
      return;
    }
    for (Sample sample : row.samples()) {
      if (sample instanceof Reading reading && reading.quantity() == Quantity.TEMPERATURE) {
        kelvin = reading.value();
      } else if (sample instanceof Reading reading && reading.quantity() == Quantity.PRESSURE) {
        boolean spaced = seen.isEmpty() || ms - seen.get(seen.size() - 1).ms() >= leastMs;
        if (spaced) {
          seen.add(new Seen(ms, reading.value(), kelvin));
        }
      }
    }
  }

  /** The event it is about. */
  public Event event() {
    return event;
  }

  /** What was read, in order of time. */
  public List<Seen> seen() {
    return seen;
  }

  /** Time after which no row can lie in the window. */
  public Instant until() {
    return Instant.ofEpochMilli(untilMs);
  }

  /** Start of the window, milliseconds since 1970. */
  public long fromMs() {
    return fromMs;
  }

  /** End of the window, milliseconds since 1970. */
  public long untilMs() {
    return untilMs;
  }
}

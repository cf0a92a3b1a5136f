package tunwarden.estimate;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.EnumMap;
import java.util.Map;
import tunwarden.estimate.bank.Noise;
import tunwarden.estimate.gate.Track;

/** Reads the parts of a state; the mirror of {@link StateWriter}. */
final class StateReader {
  private final ByteBuffer in;

  StateReader(ByteBuffer in) {
    this.in = in;
  }

  boolean flag() {
    return in.get() != 0;
  }

  private double number() {
    return in.getDouble();
  }

  private String text() {
    int length = in.getInt();
    if (length < 0 || length > in.remaining()) {
      throw new IllegalArgumentException("the kept state holds a text of impossible length");
    }
    byte[] bytes = new byte[length];
    in.get(bytes);
    return new String(bytes, StandardCharsets.UTF_8);
  }

  private Instant instant() {
    long seconds = in.getLong();
    return Instant.ofEpochSecond(seconds, in.getInt());
  }

  private Track track() {
    boolean seen = flag();
    long time = in.getLong();
    double value = number();
    double earlier = number();
    double restless = number();
    int run = in.getInt();
    long since = in.getLong();
    long strayMs = in.getLong();
    double strayValue = number();
    return new Track(
        seen, time, value, earlier, restless, run, since, strayMs, strayValue, in.getInt());
  }

  Senses senses() {
    Track pressure = track();
    Track temperature = track();
    Track barometer = track();
    double smoothK = number();
    double smoothS = number();
    double slowK = number();
    Noise noise = new Noise(in.getInt(), in.getInt(), number(), number(), number(), number());
    return new Senses(pressure, temperature, barometer, smoothK, smoothS, slowK, noise);
  }

  Watch watch() {
    return new Watch(
        number(), number(), number(), number(), number(), number(), number(), number(), text());
  }

  EventBook book() {
    Map<EventKind, Event> open = new EnumMap<>(EventKind.class);
    int size = in.getInt();
    for (int i = 0; i < size; i++) {
      EventKind kind = EventKind.values()[in.getInt()];
      open.put(
          kind,
          new Event(
              kind, text(), instant(), instant(), flag(), number(), number(), number(), number(),
              text()));
    }
    return new EventBook(open);
  }

  private Front.Point point() {
    return flag() ? new Front.Point(number(), number()) : null;
  }

  Front front() {
    double bankS = number();
    double sum = number();
    double interval = number();
    double flowed = number();
    int count = in.getInt();
    Front.Point last = point();
    Front.Point doubt = point();
    Front.Flow flow = flag() ? new Front.Flow(point(), point(), point(), in.getInt()) : null;
    return new Front(bankS, sum, count, last, doubt, flow, interval, flowed);
  }

  Estimate estimate() {
    return new Estimate(
        instant(),
        number(),
        number(),
        number(),
        number(),
        number(),
        number(),
        number(),
        number(),
        Mode.values()[in.getInt()],
        number(),
        new Estimate.Spread(number(), number(), number()),
        number(),
        text());
  }
}

package tunwarden.assess;

import java.time.Instant;

/**
 * The pressures and temperatures of one vessel as far back as charts reach, in bounded memory: a
 * pyramid of rings, each holding the least, greatest and last value of ever wider bins, so that a
 * long view costs little and still shows every spike. One writer, any number of readers.
 */
public final class History {
  private static final long[] BIN_S = {1, 4, 16, 64, 256, 1024};
  private static final int BINS = 3072;

  private final HistoryRing[] pressure = rings();
  private final HistoryRing[] temperature = rings();

  private static HistoryRing[] rings() {
    HistoryRing[] rings = new HistoryRing[BIN_S.length];
    for (int i = 0; i < rings.length; i++) {
      rings[i] = new HistoryRing(BIN_S[i], BINS);
    }
    return rings;
  }

  /** Takes the usable values of an assessment; one seen before changes nothing. */
  public void add(Assessment assessment) {
    Observed p = assessment.pressure();
    Observed t = assessment.temperature();
    if (p.isUsable() && p.at().isPresent()) {
      addPressure(p.at().get(), p.value().getAsDouble());
    }
    if (t.isUsable() && t.at().isPresent()) {
      addTemperature(t.at().get(), t.value().getAsDouble());
    }
  }

  /**
   * One pressure, Pa gauge. A value older than what a ring still holds is left out of that ring.
   */
  public synchronized void addPressure(Instant time, double paGauge) {
    put(pressure, time, paGauge);
  }

  /** One temperature, K. */
  public synchronized void addTemperature(Instant time, double kelvin) {
    put(temperature, time, kelvin);
  }

  private static void put(HistoryRing[] rings, Instant time, double value) {
    if (!Double.isFinite(value)) {
      return;
    }
    for (HistoryRing ring : rings) {
      ring.put(time.getEpochSecond(), (float) value);
    }
  }

  /** Forgets what came after that time, as after going back in a replay. */
  public synchronized void forgetAfter(Instant time) {
    for (int i = 0; i < BIN_S.length; i++) {
      pressure[i].forgetAfter(time.getEpochSecond());
      temperature[i].forgetAfter(time.getEpochSecond());
    }
  }

  /**
   * What was seen from {@code from} until before {@code to}, in equal columns.
   *
   * @param columns number of columns, at least 1
   */
  public synchronized Window window(Instant from, Instant to, int columns) {
    if (columns < 1 || !from.isBefore(to)) {
      throw new IllegalArgumentException("a window needs at least one column and some time");
    }
    return new Window(
        from, to, trace(pressure, from, to, columns), trace(temperature, from, to, columns));
  }

  private static Trace trace(HistoryRing[] rings, Instant from, Instant to, int columns) {
    double fromS = seconds(from);
    double columnS = (seconds(to) - fromS) / columns;
    Trace trace = Trace.empty(columns);
    ringFor(rings, fromS, columnS).read(fromS, columnS, trace);
    return trace;
  }

  /** The coarsest ring still finer than a column, or the finest that reaches back far enough. */
  private static HistoryRing ringFor(HistoryRing[] rings, double fromS, double columnS) {
    HistoryRing best = null;
    for (HistoryRing ring : rings) {
      boolean reaches = ring.reachesBackTo(fromS);
      if (reaches && (best == null || ring.binS() <= columnS)) {
        best = ring;
      }
    }
    return best == null ? rings[rings.length - 1] : best;
  }

  private static double seconds(Instant time) {
    return time.getEpochSecond() + time.getNano() * 1e-9;
  }

  /**
   * A stretch of history in equal columns.
   *
   * @param from start
   * @param to end
   * @param pressure Pa gauge
   * @param temperature K
   */
  public record Window(Instant from, Instant to, Trace pressure, Trace temperature) {}

  /**
   * One quantity by column; NaN where nothing was seen.
   *
   * @param min least value in each column
   * @param max greatest value in each column
   * @param last newest value in each column
   */
  public record Trace(float[] min, float[] max, float[] last) {
    static Trace empty(int columns) {
      Trace trace = new Trace(new float[columns], new float[columns], new float[columns]);
      java.util.Arrays.fill(trace.min, Float.NaN);
      java.util.Arrays.fill(trace.max, Float.NaN);
      java.util.Arrays.fill(trace.last, Float.NaN);
      return trace;
    }

    public int columns() {
      return last.length;
    }

    /** Whether anything was seen in that column. */
    public boolean has(int column) {
      return !Float.isNaN(last[column]);
    }
  }
}

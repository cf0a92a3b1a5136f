package tunwarden.report.analysis;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;

/**
 * Stands before the estimator and lets through no more than the signals carry news: readings that
 * stay within their noise are averaged over a minute, or two while even the average rests; one that
 * leaves it goes through at once, and for a while after it the averages are short. Give it usable
 * readings only.
 */
final class Thinner {
  private static final long CALM_MS = 60_000;
  private static final long AT_REST_MS = 120_000;
  private static final long LIVELY_MS = 10_000;
  private static final long STAYS_LIVELY_MS = 180_000;
  private static final double TELLING_K = 0.5;

  /** Below these the estimator takes a change for the instruments' own lasting errors. */
  private static final double REST_PA = 40;

  private static final double REST_K = 0.05;

  private final Map<Quantity, Mean> besides = new EnumMap<>(Quantity.class);
  private final Mean pressure = new Mean();
  private List<Reading> through = new ArrayList<>();
  private boolean stirred;
  private long livelyUntilMs = Long.MIN_VALUE;

  /** Keeps what goes with the next pressure: temperature, barometer. */
  void beside(Reading reading) {
    Mean mean = besides.computeIfAbsent(reading.quantity(), quantity -> new Mean());
    stirred |=
        reading.quantity() == Quantity.TEMPERATURE && mean.isAway(reading.value(), TELLING_K);
    mean.add(reading);
    if (pressure.isEmpty() && mean.lengthMs() > 2 * CALM_MS) {
      through.add(mean.pass()); // nothing to go with
    }
  }

  /** Lets through at once what is rare and means much: a laboratory value. */
  void rare(Reading reading) {
    flush();
    through.add(reading);
  }

  /**
   * Takes a pressure.
   *
   * @param tellingPa smallest change that is told from noise, Pa
   */
  void pressure(Reading reading, double tellingPa) {
    long ms = reading.time().toEpochMilli();
    boolean isNews = stirred || pressure.isAway(reading.value(), tellingPa);
    if (isNews || pressure.isOtherQuality(reading)) {
      flush();
    }
    livelyUntilMs = isNews ? ms + STAYS_LIVELY_MS : livelyUntilMs;
    pressure.add(reading);
    if (isNews || pressure.lengthMs() >= (ms < livelyUntilMs ? LIVELY_MS : calmMs())) {
      flush();
    }
  }

  private long calmMs() {
    Mean temperature = besides.get(Quantity.TEMPERATURE);
    boolean level = temperature == null || temperature.isEmpty() || temperature.moved() <= REST_K;
    boolean rests = level && pressure.isOfMany() && pressure.moved() <= REST_PA;
    return rests ? AT_REST_MS : CALM_MS;
  }

  /** Lets through what is kept. */
  void flush() {
    if (pressure.isEmpty()) {
      return;
    }
    stirred = false;
    for (Mean mean : besides.values()) {
      if (!mean.isEmpty()) {
        through.add(mean.pass());
      }
    }
    through.add(pressure.pass());
  }

  /** What went through since this was last asked, in order. */
  List<Reading> take() {
    if (through.isEmpty()) {
      return List.of();
    }
    List<Reading> taken = through;
    through = new ArrayList<>();
    return taken;
  }
}

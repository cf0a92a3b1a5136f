package tunwarden.report.analysis;

import java.time.Instant;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import tunwarden.estimate.Estimator;
import tunwarden.estimate.Event;
import tunwarden.estimate.State;
import tunwarden.estimate.Step;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.vessel.Vessel;

/**
 * Stands before the estimator and steps it no more often than the signals carry news: readings that
 * stay within their noise are averaged over a minute, or five while even the average rests; one
 * that leaves it is passed on at once, and for a while after it the averages are short. Give it
 * usable readings only.
 */
final class Thinner {
  private static final long CALM_MS = 60_000;
  private static final long LIVELY_MS = 10_000;
  private static final long STAYS_LIVELY_MS = 180_000;
  private static final double TELLING_K = 0.5;

  private final Estimator estimator;
  private final Consumer<List<Event>> news;
  private final Map<Quantity, Mean> besides = new EnumMap<>(Quantity.class);
  private final Mean pressure = new Mean();
  private State state;
  private boolean stirred;
  private long livelyUntilMs = Long.MIN_VALUE;

  /** A thinner for one vessel; {@code news} takes what the estimator reports. */
  Thinner(Vessel vessel, Estimator estimator, Consumer<List<Event>> news) {
    this.estimator = estimator;
    this.news = news;
    this.state = estimator.begin(vessel);
  }

  /** The estimator's newest state. */
  State state() {
    return state;
  }

  /** Keeps what goes with the next pressure: temperature, barometer. */
  void beside(Reading reading) {
    Mean mean = besides.computeIfAbsent(reading.quantity(), quantity -> new Mean());
    stirred |=
        reading.quantity() == Quantity.TEMPERATURE && mean.isAway(reading.value(), TELLING_K);
    mean.add(reading);
    if (pressure.isEmpty() && mean.lengthMs() > 2 * CALM_MS) {
      step(mean.pass()); // nothing to go with
    }
  }

  /** Passes on at once what is rare and means much: a laboratory value. */
  void rare(Reading reading) {
    flush();
    step(reading);
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
    if (isNews || pressure.lengthMs() >= (ms < livelyUntilMs ? LIVELY_MS : CALM_MS)) {
      flush();
    }
  }

  /** Tells of a silence. */
  void idle(Instant now) {
    flush();
    take(estimator.idle(state, now));
  }

  /** Passes on what is kept. */
  void flush() {
    if (pressure.isEmpty()) {
      return;
    }
    stirred = false;
    for (Mean mean : besides.values()) {
      if (!mean.isEmpty()) {
        step(mean.pass());
      }
    }
    step(pressure.pass());
  }

  private void step(Sample sample) {
    take(estimator.step(state, sample));
  }

  private void take(Step step) {
    state = step.next();
    if (!step.events().isEmpty()) {
      news.accept(step.events());
    }
  }
}

package tunwarden.app.board;

import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import tunwarden.estimate.Step;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.screen.model.Instrument;
import tunwarden.station.Sink;

/** Counts what each instrument says, for the signals page. */
final class SignalTally implements Sink {
  private final Map<Key, Count> counts = new LinkedHashMap<>();
  private final BiFunction<String, Quantity, SignalSource> sources;

  SignalTally(BiFunction<String, Quantity, SignalSource> sources) {
    this.sources = sources;
  }

  private record Key(String vessel, Quantity quantity) {}

  private record Count(
      Quality quality, OptionalDouble value, Optional<Instant> heard, long good, long bad) {
    static final Count NONE =
        new Count(Quality.STALE, OptionalDouble.empty(), Optional.empty(), 0, 0);

    Count heard(Reading reading, Quality seen) {
      boolean refused = seen.isBad();
      return new Count(
          seen,
          OptionalDouble.of(reading.value()),
          Optional.of(reading.time()),
          good + (refused ? 0 : 1),
          bad + (refused ? 1 : 0));
    }

    Count faulty(Fault fault) {
      return new Count(fault.quality(), value, heard, good, bad + 1);
    }
  }

  @Override
  public synchronized void sampled(Sample sample, Step step) {
    if (sample instanceof Reading reading) {
      Quality seen = reading.quality().isBad() ? reading.quality() : step.quality();
      counts.merge(
          new Key(reading.vessel(), reading.quantity()),
          Count.NONE.heard(reading, seen),
          (old, unused) -> old.heard(reading, seen));
    } else if (sample instanceof Fault fault) {
      counts.merge(
          new Key(fault.vessel(), fault.quantity()),
          Count.NONE.faulty(fault),
          (old, unused) -> old.faulty(fault));
    }
  }

  /** One row for each quantity that has spoken or failed to. */
  synchronized List<Instrument> rows() {
    List<Instrument> rows = new ArrayList<>();
    counts.forEach(
        (key, count) -> {
          SignalSource source = sources.apply(key.vessel(), key.quantity());
          rows.add(
              new Instrument(
                  key.vessel(),
                  key.quantity(),
                  source.device(),
                  source.port(),
                  count.quality(),
                  count.value(),
                  count.heard(),
                  count.good(),
                  count.bad(),
                  source.words().get()));
        });
    return rows;
  }
}

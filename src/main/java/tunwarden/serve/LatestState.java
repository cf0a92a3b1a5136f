package tunwarden.serve;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentSkipListMap;
import java.util.concurrent.atomic.AtomicLong;
import tunwarden.assess.Assessment;
import tunwarden.estimate.Step;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.station.Sink;

/**
 * The newest assessment of each vessel, and how many readings of which quality came. Loss rule:
 * latest only. Written on the station's thread, read by any.
 */
public final class LatestState implements Sink {
  private final Map<String, Assessment> latest = new ConcurrentSkipListMap<>();
  private final Map<String, Map<Quality.Level, AtomicLong>> counts = new ConcurrentSkipListMap<>();

  @Override
  public void sampled(Sample sample, Step step) {
    if (sample instanceof Reading reading) {
      Quality quality = reading.quality().isBad() ? reading.quality() : step.quality();
      count(sample.vessel(), quality.level());
    } else if (sample instanceof Fault) {
      count(sample.vessel(), Quality.Level.BAD);
    }
  }

  private void count(String vessel, Quality.Level level) {
    counts.computeIfAbsent(vessel, v -> zeros()).get(level).incrementAndGet();
  }

  private static Map<Quality.Level, AtomicLong> zeros() {
    Map<Quality.Level, AtomicLong> zeros = new EnumMap<>(Quality.Level.class);
    for (Quality.Level level : Quality.Level.values()) {
      zeros.put(level, new AtomicLong());
    }
    return zeros;
  }

  @Override
  public void assessed(Assessment assessment) {
    latest.put(assessment.vessel().id(), assessment);
  }

  /** Forgets vessels that are no longer watched. */
  public void retain(Set<String> vessels) {
    latest.keySet().retainAll(vessels);
    counts.keySet().retainAll(vessels);
  }

  /** By name of vessel. */
  List<Assessment> assessments() {
    return List.copyOf(latest.values());
  }

  /** Readings so far by vessel and grade. */
  Map<String, Map<Quality.Level, Long>> counts() {
    Map<String, Map<Quality.Level, Long>> copy = new TreeMap<>();
    counts.forEach(
        (vessel, levels) -> {
          Map<Quality.Level, Long> numbers = new EnumMap<>(Quality.Level.class);
          levels.forEach((level, count) -> numbers.put(level, count.get()));
          copy.put(vessel, numbers);
        });
    return copy;
  }
}

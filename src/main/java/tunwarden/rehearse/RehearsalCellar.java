package tunwarden.rehearse;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayDeque;
import java.util.List;
import tunwarden.replay.LogRow;
import tunwarden.replay.RowSource;
import tunwarden.vessel.Vessel;

/**
 * Three simulated vessels in an invented place, for a start without a cellar file and for practice.
 * Whoever shows it must show {@link #NOTICE} with it.
 */
public final class RehearsalCellar implements RowSource.Supplier {
  /** Must stand on every page that shows these vessels. */
  public static final String NOTICE = "REHEARSAL: simulated vessels, no instruments";

  /** The invented place. */
  public static final String PLACE = "Withy Bottom cellar";

  private static final List<Scenario> SCENARIOS =
      List.of(Scenario.COOLING_LOST, Scenario.SEALED_TOO_EARLY, Scenario.REGULATOR_CREEP);

  private final long seed;
  private final Instant start;
  private final Duration interval;

  /**
   * A cellar that begins at a data time.
   *
   * @param seed same seed, same readings
   * @param start data time of the first rows
   * @param interval data time between the rows of each vessel, whole seconds
   */
  public RehearsalCellar(long seed, Instant start, Duration interval) {
    this.seed = seed;
    this.start = start;
    this.interval = interval;
  }

  /** The vessels as a user would describe them. */
  public List<Vessel> vessels() {
    return rehearsals().stream().map(Rehearsal::vessel).toList();
  }

  private List<Rehearsal> rehearsals() {
    return SCENARIOS.stream().map(s -> Rehearsal.endless(s, seed, start, interval)).toList();
  }

  /** The rows of all vessels in order of time, without end. */
  @Override
  public RowSource open() {
    List<Rehearsal> rehearsals = rehearsals();
    ArrayDeque<LogRow> ready = new ArrayDeque<>();
    return () -> {
      if (ready.isEmpty()) {
        rehearsals.forEach(rehearsal -> ready.add(rehearsal.next()));
      }
      return ready.poll();
    };
  }
}

package tunwarden.serial;

import java.time.Duration;
import java.time.Instant;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.wire.profile.Binding;

/**
 * Compares an instrument with the second one of its pair. Readings of the second are not passed on;
 * those of the first are marked when the two have differed by more than their accuracies together
 * for three comparisons in a row, so that a faster sensor in a changing vessel is no quarrel.
 * Neither is believed over the other. Safe for several port threads.
 */
public final class PairGate implements Consumer<Sample> {
  /** Behind the name of a vessel: samples of the second instrument of a pair. */
  public static final String CHECK = "+check";

  private static final int QUARREL = 3;
  private static final int STILL_FRESH = 3;

  private final Map<Key, Pair> pairs = new HashMap<>();
  private final Consumer<Sample> next;

  private record Key(String vessel, Quantity quantity) {}

  private static final class Pair {
    private final double allowed;
    private final Duration fresh;
    private double check;
    private Instant checkedAt;
    private int apart;

    Pair(Binding first, Binding second) {
      this.allowed = Math.hypot(first.trim().u95Si(), second.trim().u95Si());
      this.fresh = second.trim().period().multipliedBy(STILL_FRESH);
    }
  }

  private PairGate(Consumer<Sample> next) {
    this.next = next;
  }

  /** What port runners hand samples to: the gate, or {@code next} itself when there is no pair. */
  public static Consumer<Sample> over(List<PortPlan> plans, Consumer<Sample> next) {
    PairGate gate = new PairGate(next);
    List<Binding> all = plans.stream().flatMap(plan -> plan.bindings().stream()).toList();
    for (Binding second : all) {
      for (Binding first : all) {
        if (second.vessel().equals(first.vessel() + CHECK)
            && second.quantity() == first.quantity()) {
          gate.pairs.put(new Key(first.vessel(), first.quantity()), new Pair(first, second));
        }
      }
    }
    return gate.pairs.isEmpty() ? next : gate;
  }

  @Override
  public void accept(Sample sample) {
    if (sample.vessel().endsWith(CHECK)) {
      checked(sample);
    } else if (sample instanceof Reading reading) {
      next.accept(judged(reading));
    } else {
      next.accept(sample);
    }
  }

  private synchronized void checked(Sample sample) {
    if (sample instanceof Reading reading) {
      String vessel = reading.vessel().substring(0, reading.vessel().length() - CHECK.length());
      Pair pair = pairs.get(new Key(vessel, reading.quantity()));
      if (pair != null) {
        pair.check = reading.value();
        pair.checkedAt = reading.time();
      }
    }
  }

  private synchronized Reading judged(Reading reading) {
    Pair pair = pairs.get(new Key(reading.vessel(), reading.quantity()));
    boolean fresh =
        pair != null
            && pair.checkedAt != null
            && Duration.between(pair.checkedAt, reading.time()).abs().compareTo(pair.fresh) <= 0;
    if (!fresh) {
      return reading;
    }
    boolean agree = Math.abs(reading.value() - pair.check) <= pair.allowed;
    pair.apart = agree ? 0 : pair.apart + 1;
    boolean quarrel = pair.apart >= QUARREL && reading.quality() == Quality.GOOD;
    return quarrel ? reading.withQuality(Quality.DISAGREES) : reading;
  }
}

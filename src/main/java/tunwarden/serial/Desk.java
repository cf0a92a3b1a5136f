package tunwarden.serial;

import java.time.Duration;
import java.time.Instant;
import java.time.InstantSource;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.wire.measure.Measure;
import tunwarden.wire.measure.Samples;
import tunwarden.wire.profile.Binding;
import tunwarden.wire.signal.Decoded;

/**
 * Hands samples on and remembers the last of each channel; used by the port's thread alone. Within
 * one message pressure goes last, because that is what makes the estimator step.
 */
final class Desk {
  private static final Logger LOG = LoggerFactory.getLogger(Desk.class);
  private static final double SMOOTHING = 0.2;

  private final List<Slot> slots;
  private final Consumer<Sample> consumer;
  private final InstantSource clock;
  private final Tally tally;

  Desk(PortPlan plan, Consumer<Sample> consumer, InstantSource clock, Tally tally) {
    this.slots =
        plan.bindings().stream()
            .sorted(Comparator.comparing(b -> b.quantity() == Quantity.PRESSURE))
            .map(Slot::new)
            .toList();
    this.consumer = consumer;
    this.clock = clock;
    this.tally = tally;
  }

  private static final class Slot {
    private final Binding binding;
    private Sample latest;
    private String shown = "";
    private double periodS = Double.NaN;

    Slot(Binding binding) {
      this.binding = binding;
    }
  }

  Tally tally() {
    return tally;
  }

  Instant now() {
    return clock.instant();
  }

  /** Values of one message of one instrument, by field name. */
  void values(Map<String, Decoded> values, List<Binding> instrument) {
    Instant now = clock.instant();
    tally.message();
    for (Slot slot : slots) {
      Decoded decoded = values.get(slot.binding.field().name());
      if (decoded == null || !instrument.contains(slot.binding) || tooSoon(slot, now)) {
        continue;
      }
      slot.shown = decoded.isBad() ? "" : Measure.words(decoded.si(), slot.binding.field());
      if (decoded.quality() == Quality.UNREADABLE) {
        tally.trouble(Trouble.UNREADABLE, decoded.detail(), now);
      }
      emit(slot, Samples.of(decoded, slot.binding, now));
    }
  }

  /** The same fault in place of every value of an instrument. */
  void faults(List<Binding> instrument, Quality quality, String detail) {
    Instant now = clock.instant();
    for (Slot slot : slots) {
      if (instrument.contains(slot.binding)) {
        slot.shown = "";
        emit(slot, Samples.fault(slot.binding, now, quality, detail));
      }
    }
  }

  /** An instrument that talks faster than it is to be read is thinned to two values a period. */
  private static boolean tooSoon(Slot slot, Instant now) {
    if (slot.latest == null || now.isBefore(slot.latest.time())) {
      return false;
    }
    Duration half = slot.binding.trim().period().dividedBy(2);
    return Duration.between(slot.latest.time(), now).compareTo(half) < 0
        && slot.latest instanceof Reading;
  }

  private void emit(Slot slot, Sample sample) {
    if (slot.latest != null) {
      double gap = Duration.between(slot.latest.time(), sample.time()).toNanos() * 1e-9;
      slot.periodS =
          Double.isNaN(slot.periodS) ? gap : slot.periodS + SMOOTHING * (gap - slot.periodS);
    }
    slot.latest = sample;
    try {
      consumer.accept(sample);
    } catch (RuntimeException e) {
      tally.trouble(Trouble.CONSUMER, String.valueOf(e.getMessage()), sample.time());
      LOG.error("a sample was not taken", e);
    }
  }

  List<LinkHealth.Channel> channels() {
    List<LinkHealth.Channel> channels = new ArrayList<>();
    for (Slot slot : slots) {
      channels.add(new LinkHealth.Channel(slot.binding, slot.latest, slot.shown, slot.periodS));
    }
    return List.copyOf(channels);
  }
}

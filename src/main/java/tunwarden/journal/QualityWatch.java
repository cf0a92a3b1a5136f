package tunwarden.journal;

import java.util.EnumMap;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import tunwarden.estimate.Step;
import tunwarden.reading.Fault;
import tunwarden.reading.Quality;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;

/** Notices when the quality of an instrument's readings changes. Used by the station's thread. */
final class QualityWatch {
  private final Map<String, Map<Quantity, Quality>> last = new HashMap<>();

  /** The entry to write when the quality is another than before; none for a good beginning. */
  Optional<JournalEntry> change(Sample sample, Step step) {
    if (sample instanceof Fault fault) {
      return change(sample, fault.quantity(), fault.quality(), fault.detail());
    }
    if (sample instanceof Reading reading) {
      Quality quality = reading.quality().isBad() ? reading.quality() : step.quality();
      return change(sample, reading.quantity(), quality, step.reason());
    }
    return Optional.empty();
  }

  private Optional<JournalEntry> change(
      Sample sample, Quantity quantity, Quality now, String detail) {
    Map<Quantity, Quality> vessel =
        last.computeIfAbsent(sample.vessel(), v -> new EnumMap<>(Quantity.class));
    Quality before = vessel.put(quantity, now);
    if (now == before || (before == null && now == Quality.GOOD)) {
      return Optional.empty();
    }
    String text = "The " + quantity.word() + " reading: " + now.why();
    String more = detail.isBlank() ? "." : " (" + detail + ").";
    Map<String, Object> values =
        Map.of("quantity", quantity.word(), "quality", now.level().name().toLowerCase(Locale.ROOT));
    return Optional.of(
        new JournalEntry(sample.time(), sample.vessel(), "quality", text + more, values));
  }
}

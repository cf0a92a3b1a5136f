package tunwarden.journal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tunwarden.reading.Mark;
import tunwarden.reading.Quantity;
import tunwarden.reading.Reading;
import tunwarden.reading.Sample;
import tunwarden.replay.LogRow;

/**
 * Puts the samples of one vessel into rows: those of one time stand in one row, and a pressure ends
 * it, as the log format has it.
 */
final class RowGatherer {
  private final String vessel;
  private final List<Sample> row = new ArrayList<>();

  RowGatherer(String vessel) {
    this.vessel = vessel;
  }

  /** Takes a sample; hands back the rows that are complete with it, at most two. */
  List<LogRow> add(Sample sample) {
    if (!isWorthARow(sample)) {
      return List.of();
    }
    List<LogRow> done = new ArrayList<>(2);
    if (!row.isEmpty() && (!row.get(0).time().equals(sample.time()) || isTaken(sample))) {
      finish().ifPresent(done::add);
    }
    row.add(sample);
    if (sample instanceof Reading reading && reading.quantity() == Quantity.PRESSURE) {
      finish().ifPresent(done::add);
    }
    return done;
  }

  /** The row begun, if there is one. */
  Optional<LogRow> finish() {
    if (row.isEmpty()) {
      return Optional.empty();
    }
    LogRow done = new LogRow(0, row.get(0).time(), vessel, List.copyOf(row));
    row.clear();
    return Optional.of(done);
  }

  /** A bad value has no place in a log; why it is missing stands in the journal. */
  private static boolean isWorthARow(Sample sample) {
    if (sample instanceof Reading reading) {
      return !reading.quality().isBad();
    }
    return sample instanceof Mark;
  }

  private boolean isTaken(Sample sample) {
    return sample instanceof Reading reading
        && row.stream().anyMatch(s -> s instanceof Reading r && r.quantity() == reading.quantity());
  }
}

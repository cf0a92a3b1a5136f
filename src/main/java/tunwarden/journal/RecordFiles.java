package tunwarden.journal;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.locks.ReentrantLock;
import tunwarden.assess.Assessment;
import tunwarden.journal.disk.Disk;
import tunwarden.reading.Mark;
import tunwarden.reading.Quantity;
import tunwarden.reading.Sample;
import tunwarden.replay.LogRow;
import tunwarden.replay.LogWriter;

/** The day files of readings and estimates. */
final class RecordFiles {
  /** Every quantity has its column, so that one that appears at noon finds its place. */
  static final LogWriter.Columns COLUMNS =
      new LogWriter.Columns(List.of(Quantity.values()), false, true);

  private final ReentrantLock closedDays = new ReentrantLock();
  private final DayFiles readings;
  private final DayFiles estimates;
  private final LogWriter writer = new LogWriter(new StringBuilder(), COLUMNS);
  private final Map<String, RowGatherer> rows = new HashMap<>();

  RecordFiles(Disk disk, DataFolder folder) {
    this.readings = new DayFiles(disk, folder::readings, COLUMNS.header(), closedDays);
    this.estimates = new DayFiles(disk, folder::estimates, EstimateRow.HEADER, closedDays);
  }

  ReentrantLock closedDays() {
    return closedDays;
  }

  boolean isOpen(Path file) {
    return readings.isOpen(file) || estimates.isOpen(file);
  }

  void add(Recorder.Recordable recordable) throws IOException {
    if (recordable instanceof Recorder.Recordable.OfSample sample) {
      add(sample.sample());
    } else if (recordable instanceof Recorder.Recordable.OfEstimate estimate) {
      Assessment assessment = estimate.assessment();
      estimates.add(assessment.vessel().id(), assessment.time(), EstimateRow.of(assessment));
    }
  }

  private void add(Sample sample) throws IOException {
    RowGatherer gatherer = rows.computeIfAbsent(sample.vessel(), RowGatherer::new);
    for (LogRow row : gatherer.add(harmless(sample))) {
      write(row);
    }
  }

  private void write(LogRow row) throws IOException {
    readings.add(row.vessel(), row.time(), writer.line(row));
  }

  /** Writes and forces everything, begun rows included, and closes the days that are over. */
  void flush(LocalDate today) throws IOException {
    for (RowGatherer gatherer : rows.values()) {
      var begun = gatherer.finish();
      if (begun.isPresent()) {
        write(begun.get());
      }
    }
    readings.flush();
    estimates.flush();
    readings.closeBefore(today);
    estimates.closeBefore(today);
  }

  void close() throws IOException {
    try {
      readings.close();
    } finally {
      estimates.close();
    }
  }

  private static Sample harmless(Sample sample) {
    return sample instanceof Mark mark
        ? new Mark(mark.time(), mark.vessel(), Harmless.cell(mark.text()))
        : sample;
  }
}

package tunwarden.journal;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.time.YearMonth;
import java.time.ZoneOffset;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import tunwarden.journal.disk.Disk;
import tunwarden.journal.disk.LineFile;

/**
 * The journal of a data folder: a file a month, one line an event. Used by one thread. Lines that
 * cannot be written wait, the oldest being given up only beyond {@link #MOST_WAITING}.
 */
final class JournalFile {
  private static final int MOST_WAITING = 20_000;

  private final Disk disk;
  private final DataFolder folder;
  private final Deque<JournalLines.Numbered> waiting = new ArrayDeque<>();
  private LineFile open;
  private YearMonth month;
  private long next;
  private long lost;

  JournalFile(Disk disk, DataFolder folder) throws IOException {
    this.disk = disk;
    this.folder = folder;
    this.next = lastNumber() + 1;
  }

  /** Gives an entry its number and puts it in line. */
  JournalLines.Numbered add(JournalEntry entry) {
    JournalLines.Numbered numbered = new JournalLines.Numbered(next++, entry);
    waiting.add(numbered);
    if (waiting.size() > MOST_WAITING) {
      waiting.removeFirst();
      lost++;
    }
    return numbered;
  }

  /** Entries that are not on the disk yet, oldest first. */
  List<JournalLines.Numbered> waiting() {
    return List.copyOf(waiting);
  }

  /** The number the next entry gets. */
  long next() {
    return next;
  }

  /** Lines given up for good. */
  long lost() {
    return lost;
  }

  /**
   * Writes everything that waits and returns once it is on the disk. The month of {@code now}
   * decides the file, not that of the entry, so that lines stay in the order of their numbers.
   */
  void flush(Instant now) throws IOException {
    if (waiting.isEmpty()) {
      return;
    }
    YearMonth wanted = YearMonth.from(now.atOffset(ZoneOffset.UTC));
    if (open == null || !wanted.equals(month)) {
      close();
      open = LineFile.open(disk, folder.journal(wanted), "");
      month = wanted;
    }
    open.dropWaiting();
    waiting.forEach(numbered -> open.add(JournalLines.line(numbered)));
    try {
      open.flush();
    } catch (IOException failed) {
      open.dropWaiting();
      open.takeBack();
      throw failed;
    }
    waiting.clear();
  }

  void close() throws IOException {
    if (open != null) {
      LineFile closing = open;
      open = null;
      closing.close();
    }
  }

  private long lastNumber() throws IOException {
    long last = 0;
    List<Path> months = new ArrayList<>(disk.list(folder.journal()));
    for (int i = months.size() - 1; i >= 0 && last == 0; i--) {
      last = lastNumber(months.get(i));
    }
    return last;
  }

  private long lastNumber(Path file) throws IOException {
    long last = 0;
    if (!file.toString().endsWith(".jsonl")) {
      return last;
    }
    try (BufferedReader lines =
        new BufferedReader(new InputStreamReader(disk.read(file), StandardCharsets.UTF_8))) {
      for (String line = lines.readLine(); line != null; line = lines.readLine()) {
        Optional<JournalLines.Numbered> read = JournalLines.read(line);
        last = Math.max(last, read.map(JournalLines.Numbered::number).orElse(0L));
      }
    }
    return last;
  }
}

package tunwarden.journal;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.time.YearMonth;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import tunwarden.journal.disk.Disk;

/** Reads the journal back, also while it is being written. */
public final class JournalReader {
  private final Disk disk;
  private final Path directory;

  /** A reader of {@code DATA/journal}. */
  public JournalReader(Disk disk, Path directory) {
    this.disk = disk;
    this.directory = directory;
  }

  /**
   * The entries that pass, oldest first.
   *
   * @param wanted which
   * @param most how many at most
   * @throws IOException when a file cannot be read; a file deleted meanwhile is none of those
   */
  public List<JournalLines.Numbered> find(Predicate<JournalLines.Numbered> wanted, int most)
      throws IOException {
    return find(Instant.EPOCH, wanted, most);
  }

  /** The same, looking only into files of the month of that moment and later ones. */
  public List<JournalLines.Numbered> find(
      Instant from, Predicate<JournalLines.Numbered> wanted, int most) throws IOException {
    String earliest = YearMonth.from(from.atOffset(ZoneOffset.UTC)) + ".jsonl";
    List<JournalLines.Numbered> found = new ArrayList<>();
    for (Path month : disk.list(directory)) {
      String name = month.getFileName().toString();
      if (name.endsWith(".jsonl") && name.compareTo(earliest) >= 0 && disk.exists(month)) {
        read(month, wanted, most, found);
      }
    }
    return found;
  }

  private void read(
      Path month,
      Predicate<JournalLines.Numbered> wanted,
      int most,
      List<JournalLines.Numbered> found)
      throws IOException {
    try (BufferedReader lines =
        new BufferedReader(new InputStreamReader(disk.read(month), StandardCharsets.UTF_8))) {
      String line = lines.readLine();
      while (line != null && found.size() < most) {
        Optional<JournalLines.Numbered> entry = JournalLines.read(line);
        entry.filter(wanted).ifPresent(found::add);
        line = lines.readLine();
      }
    }
  }
}

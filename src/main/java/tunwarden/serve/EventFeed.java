package tunwarden.serve;

import java.io.IOException;
import java.time.Instant;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import tunwarden.journal.JournalLines;
import tunwarden.journal.JournalReader;
import tunwarden.journal.Recorder;

/** The journal as it is asked for: the newest entries from memory, older ones from the files. */
public final class EventFeed implements Recorder.Listener {
  /** Most entries in one answer. */
  static final int MOST = 1000;

  private final Deque<JournalLines.Numbered> recent = new ArrayDeque<>();
  private final Optional<JournalReader> files;

  /** A feed that finds older entries with a reader, if there is one. */
  public EventFeed(Optional<JournalReader> files) {
    this.files = files;
  }

  @Override
  public synchronized void recorded(List<JournalLines.Numbered> entries, boolean durable) {
    recent.addAll(entries);
    while (recent.size() > MOST) {
      recent.removeFirst();
    }
  }

  /** Entries with a greater number, oldest first, at most {@link #MOST}. */
  List<JournalLines.Numbered> after(long number) throws IOException {
    return find(entry -> entry.number() > number, number + 1);
  }

  /** Entries later than that time. */
  List<JournalLines.Numbered> after(Instant time) throws IOException {
    return find(entry -> entry.entry().time().isAfter(time), 0);
  }

  /** The newest entries. */
  synchronized List<JournalLines.Numbered> newest() {
    return List.copyOf(recent);
  }

  private List<JournalLines.Numbered> find(
      Predicate<JournalLines.Numbered> wanted, long firstNumber) throws IOException {
    List<JournalLines.Numbered> memory = newest();
    boolean reachesBack = !memory.isEmpty() && memory.get(0).number() <= firstNumber;
    if (reachesBack || files.isEmpty()) {
      return memory.stream().filter(wanted).limit(MOST).toList();
    }
    return files.get().find(wanted, MOST);
  }
}

package tunwarden.notice;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.time.Instant;
import java.util.concurrent.Callable;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmSettings;
import tunwarden.alarm.Assessments;
import tunwarden.journal.Entries;
import tunwarden.journal.JournalLines;
import tunwarden.reading.Quality;

/** Alarm entries as the journal hands them on, and patience. */
final class Notices {
  static final Instant NOON = Instant.parse("2026-03-02T12:00:00Z");

  private Notices() {}

  /** A vessel's pressure gauge has gone silent. */
  static JournalLines.Numbered silent(String vessel, long number) {
    var folded =
        AlarmBook.empty(AlarmSettings.DEFAULT)
            .fold(Assessments.of(vessel).pressure(Quality.PORT_GONE).build());
    return new JournalLines.Numbered(number, Entries.of(folded.transitions().get(0)));
  }

  static JournalLines.Numbered station(AlarmKind kind, boolean active, long number) {
    AlarmBook book = AlarmBook.empty(AlarmSettings.DEFAULT);
    var raised = book.report(kind, true, "It is so.", NOON);
    var folded = active ? raised : raised.book().report(kind, false, "", NOON.plusSeconds(3600));
    if (folded.transitions().isEmpty()) {
      folded = folded.book().report(kind, false, "", NOON.plusSeconds(7200));
    }
    return new JournalLines.Numbered(number, Entries.of(folded.transitions().get(0)));
  }

  static void await(String what, Callable<Boolean> condition) throws Exception {
    long end = System.nanoTime() + Duration.ofSeconds(20).toNanos();
    while (!condition.call()) {
      assertTrue(System.nanoTime() < end, "waited in vain: " + what);
      Thread.sleep(10);
    }
  }
}

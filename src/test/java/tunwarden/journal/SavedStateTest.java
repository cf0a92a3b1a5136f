package tunwarden.journal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmSettings;
import tunwarden.alarm.Assessments;
import tunwarden.estimate.EventKind;
import tunwarden.journal.disk.AtomicFile;
import tunwarden.journal.disk.RealDisk;
import tunwarden.reading.Quality;

/** What a restart begins with. */
class SavedStateTest {
  @TempDir private Path folder;

  @Test
  void alarmsShelvesAndRemarksComeBack() throws IOException {
    AlarmBook book = AlarmBook.empty(AlarmSettings.DEFAULT);
    var at = Assessments.START;
    book = book.fold(Assessments.of("FV2").pressure(Quality.PORT_GONE).build()).book();
    book = book.fold(Assessments.of("FV2").event(EventKind.LIFT, -5, true).build()).book();
    book = book.acknowledge(AlarmKind.LIFT_SEEN, "FV2", "\u00e4ye \"so\"", at).book();
    book = book.shelve(AlarmKind.LEAK, "FV2", "known", at.plusSeconds(900), at).book();
    book = book.outOfService(AlarmKind.VACUUM, "BT1", "broken", at).book();
    Path file = folder.resolve("state.json");
    AtomicFile.write(
        new RealDisk(), file, new SavedState(at, book, Map.of("FV2", "2000 L")).bytes(List.of()));
    SavedState back = SavedState.read(new RealDisk(), file, AlarmSettings.DEFAULT).orElseThrow();
    assertEquals(book.alarms(), back.book().alarms());
    assertEquals(book.memories(), back.book().memories());
    assertEquals(book.counts(), back.book().counts());
    assertEquals(Map.of("FV2", "2000 L"), back.descriptions());
    assertEquals(4, back.book().alarms().size());
  }

  @Test
  void entriesKeptWithTheStateAreWrittenIfTheJournalLacksThem() throws IOException {
    Path file = folder.resolve("state.json");
    AlarmBook book = AlarmBook.empty(AlarmSettings.DEFAULT);
    List<JournalLines.Numbered> kept = new ArrayList<>();
    for (int n = 1; n <= 3; n++) {
      kept.add(
          new JournalLines.Numbered(
              n, JournalEntry.station(Assessments.START, JournalEntry.ALARM, "alarm " + n)));
    }
    byte[] state = new SavedState(Assessments.START, book, Map.of()).bytes(kept);
    // The first reached the journal, the others not: a kill between the two files.
    Path journal = folder.resolve("journal/2026-03.jsonl");
    Files.createDirectories(journal.getParent());
    Files.writeString(journal, JournalLines.line(kept.get(0)) + "\n");
    AtomicFile.write(new RealDisk(), file, state);
    for (int start = 0; start < 2; start++) {
      List<String> told = new ArrayList<>();
      try (Recorder recorder =
          Recorder.open(folder, new RealDisk(), RecorderSettings.USUAL, () -> Assessments.START)) {
        recorder.listen(
            (entries, durable) ->
                entries.stream()
                    .filter(n -> n.entry().kind().equals(JournalEntry.ALARM))
                    .forEach(n -> told.add(n.number() + " " + n.entry().text())));
        recorder.start();
      }
      assertEquals(start == 0 ? List.of("2 alarm 2", "3 alarm 3") : List.of(), told);
    }
    String lines = Files.readString(journal);
    assertTrue(lines.contains("2 journal line(s) were kept with the state"), lines);
    assertEquals(3, lines.split("\"kind\":\"alarm\"", -1).length - 1, lines);
  }

  @Test
  void aFileThatIsNotOursIsRefusedInWords() throws IOException {
    Path file = folder.resolve("state.json");
    assertTrue(SavedState.read(new RealDisk(), file, AlarmSettings.DEFAULT).isEmpty());
    for (String content : new String[] {"", "{", "[1]", "{\"format\": 9}", "[".repeat(5000)}) {
      Files.writeString(file, content);
      String words =
          assertThrows(
                  IOException.class,
                  () -> SavedState.read(new RealDisk(), file, AlarmSettings.DEFAULT))
              .getMessage();
      assertTrue(words.startsWith("state.json"), words);
    }
  }
}

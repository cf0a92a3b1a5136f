package tunwarden.journal;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmSettings;
import tunwarden.journal.disk.Disk;

/**
 * What a restart begins with: the alarm book, and how each vessel was described when its readings
 * were taken in. The journal entries that led to the book stand in the same file until they are in
 * the journal, so that book and journal agree wherever the power fails. What the estimator
 * remembers is in {@link SavedEstimates}.
 *
 * @param savedAt when it was saved
 * @param book the alarms
 * @param descriptions the whole description of each vessel as text; a memory made under another one
 *     is of no use
 */
public record SavedState(Instant savedAt, AlarmBook book, Map<String, String> descriptions) {
  private static final ObjectMapper JSON = JsonMapper.builder().build();
  private static final int FORMAT = 1;

  /** Keeps its own copy. */
  public SavedState {
    descriptions = Map.copyOf(descriptions);
  }

  /**
   * As bytes of JSON.
   *
   * @param unwritten journal entries up to this state that are not known to be on the disk
   */
  public byte[] bytes(List<JournalLines.Numbered> unwritten) {
    ObjectNode node = JSON.createObjectNode();
    node.put("format", FORMAT);
    node.put("saved_at", savedAt.toString());
    node.set("alarms", AlarmBookJson.write(book));
    ObjectNode all = node.putObject("vessels");
    new TreeMap<>(descriptions).forEach(all::put);
    ArrayNode lines = node.putArray("unwritten");
    unwritten.forEach(entry -> lines.add(JournalLines.line(entry)));
    return node.toPrettyString().getBytes(StandardCharsets.UTF_8);
  }

  /** The journal entries that stand in the file; none when it cannot be understood. */
  static List<JournalLines.Numbered> unwritten(Disk disk, Path file) throws IOException {
    List<JournalLines.Numbered> entries = new ArrayList<>();
    if (disk.exists(file)) {
      try (InputStream in = disk.read(file)) {
        for (JsonNode line : JSON.readTree(in).path("unwritten")) {
          JournalLines.read(line.asText()).ifPresent(entries::add);
        }
      } catch (JsonProcessingException notOurs) {
        return List.of();
      }
    }
    return entries;
  }

  /**
   * Reads what was saved.
   *
   * @return empty when nothing was saved
   * @throws IOException when the file cannot be read or is not ours; the message says so plainly
   */
  public static Optional<SavedState> read(Disk disk, Path file, AlarmSettings settings)
      throws IOException {
    if (!disk.exists(file)) {
      return Optional.empty();
    }
    try (InputStream in = disk.read(file)) {
      JsonNode node = JSON.readTree(in);
      if (node == null || node.path("format").asInt() != FORMAT) {
        throw new IOException(file.getFileName() + " is not a state file this version can read");
      }
      Map<String, String> descriptions = new TreeMap<>();
      node.path("vessels")
          .properties()
          .forEach(vessel -> descriptions.put(vessel.getKey(), vessel.getValue().asText()));
      return Optional.of(
          new SavedState(
              Instant.parse(node.path("saved_at").asText()),
              AlarmBookJson.read(node.path("alarms"), settings),
              descriptions));
    } catch (JsonProcessingException | RuntimeException notOurs) {
      throw new IOException(file.getFileName() + " cannot be understood", notOurs);
    }
  }
}

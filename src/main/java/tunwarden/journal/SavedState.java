package tunwarden.journal;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmSettings;
import tunwarden.journal.disk.Disk;

/**
 * What a restart begins with: the alarm book, and how each vessel was described when its readings
 * were taken in. The estimator's memory is not in it: it is had again by taking in the recorded
 * readings.
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

  /** As bytes of JSON. */
  public byte[] bytes() {
    ObjectNode node = JSON.createObjectNode();
    node.put("format", FORMAT);
    node.put("saved_at", savedAt.toString());
    node.set("alarms", AlarmBookJson.write(book));
    ObjectNode all = node.putObject("vessels");
    new TreeMap<>(descriptions).forEach(all::put);
    return node.toPrettyString().getBytes(StandardCharsets.UTF_8);
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

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
 * What a restart begins with: the alarm book, and for each vessel what its estimator remembered.
 *
 * @param savedAt when it was saved
 * @param book the alarms
 * @param vessels by vessel
 */
public record SavedState(Instant savedAt, AlarmBook book, Map<String, Memory> vessels) {
  private static final ObjectMapper JSON = JsonMapper.builder().build();
  private static final int FORMAT = 1;

  /** Keeps its own copy. */
  public SavedState {
    vessels = Map.copyOf(vessels);
  }

  /**
   * What an estimator remembered of a vessel.
   *
   * @param description the vessel's description as text; a memory made under another one is of no
   *     use
   * @param content in the estimator's own words
   */
  public record Memory(String description, String content) {}

  /** As bytes of JSON. */
  public byte[] bytes() {
    ObjectNode node = JSON.createObjectNode();
    node.put("format", FORMAT);
    node.put("saved_at", savedAt.toString());
    node.set("alarms", AlarmBookJson.write(book));
    ObjectNode all = node.putObject("vessels");
    new TreeMap<>(vessels)
        .forEach(
            (vessel, memory) ->
                all.putObject(vessel)
                    .put("description", memory.description())
                    .put("content", memory.content()));
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
      Map<String, Memory> vessels = new TreeMap<>();
      for (Map.Entry<String, JsonNode> entry : node.path("vessels").properties()) {
        JsonNode memory = entry.getValue();
        vessels.put(
            entry.getKey(),
            new Memory(memory.path("description").asText(), memory.path("content").asText()));
      }
      return Optional.of(
          new SavedState(
              Instant.parse(node.path("saved_at").asText()),
              AlarmBookJson.read(node.path("alarms"), settings),
              vessels));
    } catch (JsonProcessingException | RuntimeException notOurs) {
      throw new IOException(file.getFileName() + " cannot be understood", notOurs);
    }
  }
}

package tunwarden.journal;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.DateTimeException;
import java.time.Instant;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** Entries as lines of JSON and back. */
public final class JournalLines {
  private static final ObjectMapper JSON =
      JsonMapper.builder(
              JsonFactory.builder()
                  .streamReadConstraints(
                      StreamReadConstraints.builder()
                          .maxNestingDepth(8)
                          .maxStringLength(10_000)
                          .build())
                  .build())
          .build();

  private JournalLines() {}

  /**
   * A line with its number.
   *
   * @param number counts all lines ever written into this data folder, from 1
   * @param entry what it says
   */
  public record Numbered(long number, JournalEntry entry) {}

  /** One line, without its end. Numbers that are not finite become null. */
  public static String line(Numbered numbered) {
    JournalEntry entry = numbered.entry();
    ObjectNode node = JSON.createObjectNode();
    node.put("n", numbered.number());
    node.put("time", entry.time().toString());
    node.put("vessel", entry.vessel());
    node.put("kind", entry.kind());
    node.put("text", entry.text());
    ObjectNode values = node.putObject("values");
    entry.values().forEach((name, value) -> put(values, name, value));
    return node.toString();
  }

  private static void put(ObjectNode values, String name, Object value) {
    if (value instanceof Double number) {
      if (Double.isFinite(number)) {
        values.put(name, number);
      } else {
        values.putNull(name);
      }
    } else if (value instanceof Long || value instanceof Integer) {
      values.put(name, ((Number) value).longValue());
    } else if (value instanceof Boolean flag) {
      values.put(name, flag);
    } else {
      values.put(name, String.valueOf(value));
    }
  }

  /** Reads a line back; empty when it is not one of ours. */
  public static Optional<Numbered> read(String line) {
    try {
      JsonNode node = JSON.readTree(line);
      if (node == null || !node.path("n").isIntegralNumber() || !node.path("time").isTextual()) {
        return Optional.empty();
      }
      Map<String, Object> values = new TreeMap<>();
      node.path("values").properties().forEach(e -> values.put(e.getKey(), plain(e.getValue())));
      JournalEntry entry =
          new JournalEntry(
              Instant.parse(node.path("time").asText()),
              node.path("vessel").asText(),
              node.path("kind").asText(),
              node.path("text").asText(),
              values);
      return Optional.of(new Numbered(node.path("n").asLong(), entry));
    } catch (JsonProcessingException | DateTimeException notOurs) {
      return Optional.empty();
    }
  }

  private static Object plain(JsonNode value) {
    if (value.isIntegralNumber()) {
      return value.asLong();
    }
    if (value.isNumber()) {
      return value.asDouble();
    }
    return value.isBoolean() ? value.asBoolean() : value.asText();
  }
}

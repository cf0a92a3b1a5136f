package tunwarden.journal;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import tunwarden.alarm.AlarmBook;
import tunwarden.alarm.AlarmCounts;
import tunwarden.alarm.AlarmKind;
import tunwarden.alarm.AlarmMemory;
import tunwarden.alarm.AlarmSettings;
import tunwarden.alarm.Handling;
import tunwarden.alarm.Signal;

/** The alarm book as it is saved across restarts. */
final class AlarmBookJson {
  private AlarmBookJson() {}

  static ObjectNode write(AlarmBook book) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    node.put("raised", book.counts().raised());
    node.put("chattered", book.counts().chattered());
    node.put("floods", book.counts().floods());
    node.put("flood", book.counts().flood());
    times(node.putArray("recent"), book.counts().recent());
    ArrayNode alarms = node.putArray("alarms");
    book.memories().forEach(memory -> alarms.add(write(memory)));
    return node;
  }

  /**
   * Reads a book back; an alarm of a kind that no longer exists is left out.
   *
   * @throws RuntimeException when the node is not of our making
   */
  static AlarmBook read(JsonNode node, AlarmSettings settings) {
    List<AlarmMemory> memories = new ArrayList<>();
    for (JsonNode alarm : node.path("alarms")) {
      AlarmKind.ofId(alarm.path("kind").asText())
          .ifPresent(kind -> memories.add(memory(kind, alarm)));
    }
    AlarmCounts counts =
        new AlarmCounts(
            node.path("raised").asLong(),
            node.path("chattered").asLong(),
            node.path("floods").asLong(),
            node.path("flood").asBoolean(),
            times(node.path("recent")));
    return AlarmBook.restored(settings, memories, counts);
  }

  private static ObjectNode write(AlarmMemory memory) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    Signal signal = memory.signal();
    node.put("kind", memory.kind().id()).put("vessel", memory.vessel()).put("text", memory.text());
    node.put("active", signal.active()).put("blind", signal.blind());
    node.put("since", signal.since().toString());
    signal.pending().ifPresent(pending -> node.put("pending", pending.toString()));
    ArrayNode causes = node.putArray("causes");
    new TreeSet<>(signal.causes()).forEach(causes::add);
    times(node.putArray("raised"), signal.raised());
    Handling handling = memory.handling();
    node.put("acknowledged", handling.acknowledged()).put("suppressed", handling.suppressed());
    node.put("changed", handling.changed().toString()).put("remark", handling.remark());
    handling.outOfService().ifPresent(reason -> node.put("out_of_service", reason));
    handling
        .shelf()
        .ifPresent(
            shelf ->
                node.putObject("shelf")
                    .put("until", shelf.until().toString())
                    .put("reason", shelf.reason()));
    return node;
  }

  private static AlarmMemory memory(AlarmKind kind, JsonNode node) {
    List<String> causes = new ArrayList<>();
    node.path("causes").forEach(cause -> causes.add(cause.asText()));
    Signal signal =
        new Signal(
            node.path("active").asBoolean(),
            node.path("blind").asBoolean(),
            text(node, "pending").map(Instant::parse),
            new TreeSet<>(causes),
            Instant.parse(node.path("since").asText()),
            times(node.path("raised")));
    JsonNode shelf = node.path("shelf");
    Handling handling =
        new Handling(
            node.path("acknowledged").asBoolean(),
            node.path("suppressed").asBoolean(),
            text(shelf, "until")
                .map(
                    until ->
                        new Handling.Shelf(Instant.parse(until), shelf.path("reason").asText())),
            text(node, "out_of_service"),
            Instant.parse(node.path("changed").asText()),
            node.path("remark").asText());
    return new AlarmMemory(
        kind, node.path("vessel").asText(), signal, handling, node.path("text").asText());
  }

  private static Optional<String> text(JsonNode node, String name) {
    return Optional.ofNullable(node.get(name)).map(JsonNode::asText);
  }

  private static void times(ArrayNode array, List<Instant> times) {
    times.forEach(time -> array.add(time.toString()));
  }

  private static List<Instant> times(JsonNode array) {
    List<Instant> times = new ArrayList<>();
    array.forEach(time -> times.add(Instant.parse(time.asText())));
    return times;
  }
}

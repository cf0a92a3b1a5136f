package tunwarden.notice;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tunwarden.alarm.AlarmKind;
import tunwarden.journal.JournalEntry;
import tunwarden.journal.JournalLines;

/**
 * What one person is told at once: one alarm, or many folded into one message.
 *
 * @param made when it was put together
 * @param subject one line
 * @param text several lines
 * @param alarms the alarms as JSON
 */
public record Message(Instant made, String subject, String text, ArrayNode alarms) {
  private static final int MOST_LISTED = 50;

  /** A message about these alarm entries. */
  static Message of(List<JournalLines.Numbered> entries, Instant made) {
    ArrayNode alarms = JsonNodeFactory.instance.arrayNode();
    List<String> lines = new ArrayList<>();
    for (JournalLines.Numbered numbered : entries) {
      if (lines.size() == MOST_LISTED) {
        lines.add("... and " + (entries.size() - MOST_LISTED) + " more; see the journal.");
        break;
      }
      lines.add(lines(numbered.entry()));
      alarms.add(json(numbered));
    }
    JournalEntry first = entries.get(0).entry();
    String subject =
        entries.size() == 1 ? name(first) : entries.size() + " alarms, first " + name(first);
    return new Message(made, "Tunwarden: " + subject, String.join("\n\n", lines), alarms);
  }

  /** A message that only proves that messages arrive. */
  public static Message test(Instant made) {
    return new Message(
        made,
        "Tunwarden: test of the notice",
        "This is a test. If you can read it, alarms will reach you this way.",
        JsonNodeFactory.instance.arrayNode());
  }

  /** As the command and the webhook get it. */
  ObjectNode json() {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    node.put("time", made.toString()).put("subject", subject).put("text", text);
    node.set("alarms", alarms);
    return node;
  }

  private static String name(JournalEntry entry) {
    String alarm = kind(entry).map(AlarmKind::word).orElse("alarm");
    return (entry.vessel().isEmpty() ? "" : entry.vessel() + ": ") + alarm;
  }

  private static String lines(JournalEntry entry) {
    String where = entry.vessel().isEmpty() ? "" : entry.vessel() + ": ";
    String action = kind(entry).map(kind -> "\n  " + kind.action()).orElse("");
    return entry.time()
        + "  "
        + entry.values().get("priority")
        + "\n  "
        + where
        + entry.text()
        + action;
  }

  private static Optional<AlarmKind> kind(JournalEntry entry) {
    return AlarmKind.ofId(String.valueOf(entry.values().get("alarm")));
  }

  private static ObjectNode json(JournalLines.Numbered numbered) {
    JournalEntry entry = numbered.entry();
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    node.put("n", numbered.number());
    node.put("time", entry.time().toString());
    node.put("vessel", entry.vessel());
    node.put("text", entry.text());
    for (Map.Entry<String, Object> value : entry.values().entrySet()) {
      node.put(value.getKey(), String.valueOf(value.getValue()));
    }
    kind(entry).ifPresent(kind -> node.put("action", kind.action()));
    return node;
  }
}
